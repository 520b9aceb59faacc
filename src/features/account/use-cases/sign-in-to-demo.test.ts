import { afterEach, beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { env } from "@/env";
import { anonymousContext, createJournal, createPerson } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { DEMO_ADDRESSES } from "../constants";
import { signInToDemo } from "./sign-in-to-demo";

const ROLES = ["person", "mentor", "educator", "family", "administrator"] as const;
const isDemoOutside = env.isDemo;

describe("signInToDemo", () => {
  let db: Pool;
  const ids = new Map<string, string>();
  let journalId: string;
  beforeAll(async () => {
    db = await createTestDb();
    for (const role of ROLES) ids.set(role, await createPerson(db, { email: DEMO_ADDRESSES[role] }));
    ({ journalId } = await createJournal(db, { ownerId: ids.get("person") }));
  });
  afterEach(() => {
    env.isDemo = isDemoOutside;
  });

  it.each(ROLES)("lets nobody in as the %s where no demo runs, though there is such an account", async (role) => {
    env.isDemo = false;
    await expect(signInToDemo(anonymousContext(db), { role })).rejects.toMatchObject({ code: "NOT_FOUND" });
  });

  it.each([
    ["person", () => `/j/${journalId}/today`],
    ["mentor", () => "/journals"],
    ["educator", () => "/review"],
    ["family", () => "/journals"],
    ["administrator", () => "/administration"],
  ])("takes the %s to their own first page where one runs", async (role, next) => {
    env.isDemo = true;
    expect(await signInToDemo(anonymousContext(db), { role })).toEqual({ userId: ids.get(role), next: next() });
  });

  it("knows no other role", async () => {
    env.isDemo = true;
    await expect(signInToDemo(anonymousContext(db), { role: "owner" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["role"] })] });
  });
});
