import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findDigestPreference } from "@/db/repositories/digest-preferences";
import { accessLog } from "@/db/schema/journals";
import { digestPreferences, digests, outbox } from "@/db/schema/mail";
import { DEFAULT_DIGEST_PREFERENCE } from "@/domain/digest/preference";
import type { FindingOf } from "@/domain/digest/week";
import { unsubscribeToken } from "@/lib/secrets";
import { anonymousContext, contextFor, createHelper, createJournal, createPerson } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { composeDigest } from "../queries/digest";
import { digestPreview } from "../queries/digest-preview";
import { saveDigestPreference } from "./save-digest-preference";
import { sendDigestNow } from "./send-digest-now";
import { unsubscribe } from "./unsubscribe";

const noFinding: FindingOf = () => Promise.resolve(null);
const form = { level: "summary" as const, weekday: "7", minuteOfDay: "18:30", isToldOfComments: "on" as const };

describe("choices about weekly mail", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  describe("saveDigestPreference", () => {
    it("keeps the choice of the one who made it", async () => {
      const userId = await createPerson(db);
      const ctx = await contextFor(db, userId);
      expect(await digestPreview(ctx, noFinding)).toMatchObject({ preference: DEFAULT_DIGEST_PREFERENCE, timeZone: "Europe/Oslo", digest: null });
      await saveDigestPreference(ctx, form);
      await saveDigestPreference(ctx, { ...form, isToldOfComments: "" });
      expect((await digestPreview(ctx, noFinding)).preference).toEqual({ level: "summary", weekday: 7, minuteOfDay: 1110, isToldOfComments: false });
    });

    it.each([
      ["level", { level: "all" as "full" }],
      ["weekday", { weekday: "8" }],
      ["minuteOfDay", { minuteOfDay: "25:00" }],
    ])("names %s as amiss, and keeps nothing", async (field, given) => {
      const userId = await createPerson(db);
      await expect(saveDigestPreference(await contextFor(db, userId), { ...form, ...given })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
      expect(await db.select().from(digestPreferences).where(eq(digestPreferences.userId, userId))).toEqual([]);
    });

    it("asks for a signed-in, verified account", async () => {
      await expect(saveDigestPreference(anonymousContext(db), form)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
      await expect(digestPreview(anonymousContext(db), noFinding)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
      const unverified = await createPerson(db, { isVerified: false });
      await expect(saveDigestPreference(await contextFor(db, unverified), form)).rejects.toMatchObject({ code: "FORBIDDEN" });
    });
  });

  describe("unsubscribe", () => {
    it("ends the weekly mails by the link alone, twice as well as once, and leaves the rest of the choice", async () => {
      const userId = await createPerson(db);
      await saveDigestPreference(await contextFor(db, userId), form);
      for (let i = 0; i < 2; i += 1) await unsubscribe(anonymousContext(db), { token: unsubscribeToken(userId) });
      expect(await findDigestPreference(db, userId)).toEqual({ level: "off", weekday: 7, minuteOfDay: 1110, isToldOfComments: true });
    });

    it("works for somebody who never chose", async () => {
      const userId = await createPerson(db);
      await unsubscribe(anonymousContext(db), { token: unsubscribeToken(userId) });
      expect((await findDigestPreference(db, userId)).level).toBe("off");
    });

    it("does nothing for a link that was not made here, and does not say whose it might be", async () => {
      const userId = await createPerson(db);
      const [, mac] = unsubscribeToken(await createPerson(db)).split(".");
      for (const token of [`${userId}.${mac}`, userId, "x", `${userId}.`, unsubscribeToken(crypto.randomUUID())]) {
        await expect(unsubscribe(anonymousContext(db), { token })).rejects.toMatchObject({ code: "NOT_FOUND" });
      }
      expect((await findDigestPreference(db, userId)).level).toBe("links");
    });
  });

  describe("sendDigestNow", () => {
    const mailsOf = (userId: string) => db.select().from(outbox).where(eq(outbox.recipientId, userId));

    it("sends the week up to today and leaves the weekly one alone", async () => {
      const { ownerId } = await createJournal(db);
      await sendDigestNow(await contextFor(db, ownerId), noFinding);
      expect(await mailsOf(ownerId)).toMatchObject([{ kind: "digest-now", subject: "Your week in Notchbook" }]);
      expect(await db.select().from(digests).where(eq(digests.userId, ownerId))).toEqual([]);
    });

    it("notes a helper's read", async () => {
      const journal = await createJournal(db);
      const mentorId = await createHelper(db, { ...journal, role: "mentor" });
      await sendDigestNow(await contextFor(db, mentorId), noFinding);
      expect(await db.select().from(accessLog).where(eq(accessLog.journalId, journal.journalId))).toMatchObject([{ userId: mentorId, what: "digest: the week" }]);
    });

    it("has nothing to send where it is switched off, or there is no notebook", async () => {
      const { ownerId } = await createJournal(db);
      await saveDigestPreference(await contextFor(db, ownerId), { ...form, level: "off" });
      await expect(sendDigestNow(await contextFor(db, ownerId), noFinding)).rejects.toMatchObject({ code: "CONFLICT" });
      await expect(sendDigestNow(await contextFor(db, await createPerson(db)), noFinding)).rejects.toMatchObject({ code: "CONFLICT" });
      await expect(sendDigestNow(anonymousContext(db), noFinding)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
      expect(await mailsOf(ownerId)).toEqual([]);
    });

    it("is limited in number", async () => {
      const { ownerId } = await createJournal(db);
      const ctx = await contextFor(db, ownerId);
      for (let i = 0; i < 6; i += 1) await sendDigestNow(ctx, noFinding);
      await expect(sendDigestNow(ctx, noFinding)).rejects.toMatchObject({ code: "TOO_MANY" });
    });
  });

  it("composes nobody else's week", async () => {
    const { ownerId } = await createJournal(db);
    const other = await contextFor(db, await createPerson(db));
    await expect(composeDigest(other, { userId: ownerId, today: "2026-03-10" }, noFinding)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(composeDigest(anonymousContext(db), { userId: ownerId, today: "2026-03-10" }, noFinding)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
  });
});
