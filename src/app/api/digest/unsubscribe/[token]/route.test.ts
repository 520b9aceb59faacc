import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findDigestPreference } from "@/db/repositories/digest-preferences";
import { digestPreferences } from "@/db/schema/mail";
import { unsubscribeToken } from "@/lib/secrets";
import { createPerson } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { GET, POST } from "./route";

const FROM_ELSEWHERE = { origin: "https://mail.example", "sec-fetch-site": "cross-site" };
const params = (token: string) => ({ params: Promise.resolve({ token }) });

describe("the one-press address of a digest", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
    (globalThis as { notchbookPool?: Pool }).notchbookPool = db;
  });

  const press = (token: string, body: BodyInit | null, headers: Record<string, string> = FROM_ELSEWHERE) =>
    POST(new Request(`http://127.0.0.1/api/digest/unsubscribe/${token}`, { method: "POST", headers, body }), params(token));
  const oneClick = () => new URLSearchParams({ "List-Unsubscribe": "One-Click" });
  const levelOf = async (userId: string) => (await findDigestPreference(db, userId)).level;

  it("ends the mails for a mail program, without cookie, from any origin, as form or multipart, again and again", async () => {
    const userId = await createPerson(db);
    const multipart = new FormData();
    multipart.set("List-Unsubscribe", "One-Click");
    for (const body of [oneClick(), multipart, oneClick()]) {
      const answer = await press(unsubscribeToken(userId), body);
      expect(answer.status).toBe(200);
      expect(answer.headers.get("cache-control")).toBe("no-store");
      expect(await levelOf(userId)).toBe("off");
    }
  });

  it("ends nothing by being opened: a person is led to the page with the button", async () => {
    const userId = await createPerson(db);
    const token = unsubscribeToken(userId);
    const answer = await GET(new Request(`http://127.0.0.1/api/digest/unsubscribe/${token}`), params(token));
    expect(answer.status).toBe(303);
    expect(answer.headers.get("location")).toBe(`/unsubscribe?token=${token}`);
    expect(await levelOf(userId)).toBe("links");
  });

  it("refuses a press without the agreed body, and a link that was not made here, and changes nothing", async () => {
    const userId = await createPerson(db);
    for (const body of [null, new URLSearchParams({ "List-Unsubscribe": "maybe" }), "{}"]) {
      expect((await press(unsubscribeToken(userId), body)).status).toBe(400);
    }
    const before = await db.select().from(digestPreferences);
    const answer = await press(`${userId}.forged`, oneClick());
    expect(answer.status).toBe(404);
    expect(await answer.json()).toMatchObject({ status: 404, title: "NOT_FOUND" });
    expect(await db.select().from(digestPreferences)).toEqual(before);
  });
});
