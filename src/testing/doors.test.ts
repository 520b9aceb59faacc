import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Pool } from "@/db/client";
import type { Context } from "@/lib/context";
import type { ActionResult } from "@/lib/action";
import { DOORS } from "./doors";
import { anonymousContext, contextFor, createHelper, createJournal, createPerson, strangerContext } from "./factories";
import { createTestDb } from "./test-database";

let current: Context & { sessionId: string | null };

vi.mock("@/lib/request-context", () => ({ requestContext: () => Promise.resolve(current) }));
vi.mock("next/headers", () => ({
  headers: () => Promise.resolve(new Headers({ "sec-fetch-site": "same-origin", origin: "http://127.0.0.1:3000", host: "127.0.0.1:3000" })),
  cookies: () => Promise.resolve({ get: () => undefined, set: () => undefined, delete: () => undefined }),
}));
vi.mock("next/cache", () => ({ refresh: () => undefined, revalidatePath: () => undefined }));
vi.mock("next/navigation", () => ({
  redirect: (to: string) => {
    throw new Error(`went on to ${to}`);
  },
  notFound: () => undefined, forbidden: () => undefined, unstable_rethrow: () => undefined,
}));
vi.mock("@/lib/session", () => ({ revokeSession: () => Promise.resolve(), revokeAllSessions: () => Promise.resolve() }));
vi.mock("@/lib/session-cookie", () => ({ startSession: () => Promise.resolve(), dropSessionCookie: () => Promise.resolve() }));

type Action = (previous: null, form: FormData) => Promise<ActionResult>;
const modules = import.meta.glob<Record<string, Action>>("../features/*/actions.ts", { eager: true });
const actions = Object.values(modules).flatMap((module) => Object.entries(module));

const formOf = (sample: Readonly<Record<string, string>>, journalId: string) => {
  const form = new FormData();
  for (const [name, value] of Object.entries(sample)) {
    for (const one of value.split("|")) form.append(name, one === "JOURNAL" ? journalId : one);
  }
  return form;
};

describe("every door has the same lock", () => {
  let db: Pool;
  let journal: { journalId: string; ownerId: string };
  beforeAll(async () => {
    db = await createTestDb();
    journal = await createJournal(db, { startedOn: "2026-03-01" });
  });

  const enter = (ctx: Context) => {
    current = { ...ctx, sessionId: null };
  };
  beforeEach(() => enter(anonymousContext(db)));

  it("has a row for every action, and no row without one", () => {
    expect(actions.map(([name]) => name).sort()).toEqual(Object.keys(DOORS).sort());
  });

  it.each(actions)("%s", async (name, action) => {
    const door = DOORS[name];
    if (!door) throw new Error(`no row for ${name}`);
    const knock = (sample: Readonly<Record<string, string>> = door.sample) => action(null, formOf(sample, journal.journalId));
    const refused = (code: string): unknown => expect.objectContaining({ ok: false, code });

    if (door.opensTo !== "anyone") expect(await knock()).toEqual(refused("UNAUTHENTICATED"));
    if (door.opensTo === "journal") {
      enter(await strangerContext(db));
      expect(await knock()).toEqual(refused("NOT_FOUND"));
    }
    if (door.opensTo === "administrator") {
      enter(await contextFor(db, await createPerson(db)));
      expect(await knock()).toEqual(refused("FORBIDDEN"));
    }
    if (door.weak && door.weak !== "none") {
      const { weak } = door;
      enter(await contextFor(db, weak === "person" ? journal.ownerId : await createHelper(db, { ...journal, role: weak })));
      expect(await knock()).toEqual(refused("FORBIDDEN"));
    }
    if (door.spoilt) {
      const [field, value] = door.spoilt;
      enter(await contextFor(db, journal.ownerId));
      const answer = await knock({ ...door.sample, [field]: value });
      expect(answer).toEqual(refused("INVALID_INPUT"));
      expect(Object.keys(answer.ok ? {} : answer.fields)).toContain(field);
    }
  });
});
