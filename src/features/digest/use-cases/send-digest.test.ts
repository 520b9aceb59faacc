import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { accessLog } from "@/db/schema/journals";
import { entries } from "@/db/schema/diary";
import { dailyRollups } from "@/db/schema/glucose";
import { digests, outbox } from "@/db/schema/mail";
import { revokeGrant } from "@/db/repositories/grants";
import { saveDigestPreference } from "@/db/repositories/digest-preferences";
import { addDays, dayNumberOf } from "@/domain/day-start";
import { DEFAULT_DIGEST_PREFERENCE } from "@/domain/digest/preference";
import type { FindingOf } from "@/domain/digest/week";
import { mailConsent } from "@/lib/mail-consent";
import { deliverDueMail } from "@/lib/mailer";
import { contextAs, contextFor, createHelper, createJournal, createPerson, grantRole } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { createVersion } from "@/testing/version-factory";
import { dueReaders } from "../queries/due-readers";
import { sendDigest } from "./send-digest";

/** Monday 16 March 2026, 08:30 in Oslo. */
const MONDAY = new Date("2026-03-16T07:30:00Z");
const BEFORE = new Date("2026-03-01T12:00:00Z");
const noFinding: FindingOf = () => Promise.resolve(null);

describe("sendDigest", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const jobAt = (now: Date) => contextAs(db, { type: "job", job: "weekly-digest" }, now);
  const send = (userId: string, now = MONDAY, findingOf = noFinding) => sendDigest(jobAt(now), { userId }, findingOf);
  const mailsOf = (userId: string) => db.select().from(outbox).where(eq(outbox.recipientId, userId));
  const person = async () => {
    const ownerId = await createPerson(db, { displayName: "Ilka Brandvold", at: BEFORE });
    return createJournal(db, { ownerId, at: BEFORE });
  };

  it("writes one mail for the week, with text, HTML and the headers that end it by one press", async () => {
    const { ownerId } = await person();
    const id = await send(ownerId);
    const [mail, ...others] = await mailsOf(ownerId);
    expect(others).toEqual([]);
    expect(mail).toMatchObject({ id, kind: "weekly-digest", state: "waiting", subject: "Your week in Notchbook", basis: { level: "links" } });
    expect(mail?.headers["List-Unsubscribe-Post"]).toBe("List-Unsubscribe=One-Click");
    expect(mail?.headers["List-Unsubscribe"]).toMatch(/^<http:\/\/\S+\/api\/digest\/unsubscribe\/\S+>$/);
    for (const part of [mail?.text, mail?.html]) expect(part).toContain("No changes this week. That is a good way to learn something.");
    expect(mail?.text).toMatch(/\/unsubscribe\?token=[\w.-]+$/);
    expect(await db.select().from(digests).where(eq(digests.userId, ownerId))).toMatchObject([{ isoWeek: "2026-W12", outboxId: id }]);
  });

  it("is written once, however many workers come at once, and not again that week", async () => {
    const { ownerId } = await person();
    const all = await Promise.all(Array.from({ length: 8 }, () => send(ownerId)));
    expect(all.filter((id) => id !== null)).toHaveLength(1);
    expect(await send(ownerId, new Date("2026-03-18T12:00:00Z"))).toBeNull();
    expect(await mailsOf(ownerId)).toHaveLength(1);
  });

  it("leaves nothing of a crash before the commit, and is written by the next try", async () => {
    const { ownerId } = await person();
    const crashing = new Proxy(db, {
      get: (target, key, receiver) =>
        key === "transaction"
          ? (work: Parameters<Pool["transaction"]>[0]) => target.transaction(async (tx) => { await work(tx); throw new Error("killed"); })
          : Reflect.get(target, key, receiver) as unknown,
    });
    await expect(sendDigest({ ...jobAt(MONDAY), db: crashing }, { userId: ownerId }, noFinding)).rejects.toThrow("killed");
    expect(await mailsOf(ownerId)).toEqual([]);
    expect(await send(ownerId)).not.toBeNull();
    expect(await mailsOf(ownerId)).toHaveLength(1);
  });

  it("tells each reader what was shared with them, and notes for the person that it went out", async () => {
    const { journalId, ownerId } = await person();
    const mentorId = await createHelper(db, { journalId, ownerId, role: "mentor", scopes: ["settings"] });
    await createVersion(db, { journalId, authorId: ownerId, number: 1, at: BEFORE });
    await createVersion(db, { journalId, authorId: ownerId, number: 2, at: new Date("2026-03-11T09:00:00Z"), basalMilliUnitsPerHour: 550 });
    for (const userId of [ownerId, mentorId]) await saveDigestPreference(db, userId, { ...DEFAULT_DIGEST_PREFERENCE, level: "full" }, BEFORE);
    const finding: FindingOf = (_journal, number) => Promise.resolve(`Nights were flatter after version ${number}. Likely between 1 and 2.`);
    await send(ownerId, MONDAY, finding);
    await send(mentorId, MONDAY, finding);
    const [own] = await mailsOf(ownerId);
    const [theirs] = await mailsOf(mentorId);
    expect(own?.text).toContain("Nights were flatter after version 2. Likely between 1 and 2.");
    expect(theirs?.subject).toBe("A week in Ilka Brandvold’s notebook");
    expect(theirs?.text).toContain("0.50 U/h → 0.55 U/h");
    expect(theirs?.text).not.toContain("Nights were flatter");
    expect(await db.select().from(accessLog).where(eq(accessLog.journalId, journalId))).toMatchObject([{ userId: mentorId, what: "digest: the week, full" }]);
  });

  it("adds up the glucose and the log of the seven days before, each on its civil day", async () => {
    const { journalId, ownerId } = await person();
    const educatorId = await createHelper(db, { journalId, ownerId, role: "educator", scopes: ["settings", "glucose"] });
    for (const userId of [ownerId, educatorId]) await saveDigestPreference(db, userId, { ...DEFAULT_DIGEST_PREFERENCE, level: "full" }, BEFORE);
    const day = (isoDate: string, below: number) => ({
      journalId, dayNumber: dayNumberOf(isoDate), part: "day" as const, readings: 288, sumMgDl: 0, sumSquares: 0,
      bandCounts: [0, below, 200, 88 - below, 0], histogram: [], minutesInPart: 1440, intervalMinutes: 5,
    });
    const dates = Array.from({ length: 14 }, (_, i) => addDays("2026-03-02", i));
    await db.insert(dailyRollups).values([...dates.map((date) => day(date, date < "2026-03-09" ? 40 : 10)), day("2026-03-16", 88), day("2026-03-01", 88)]);
    const note = (at: string) => ({ journalId, kind: "note" as const, at: new Date(at), data: { kind: "note" as const, text: "x" }, createdBy: ownerId, createdAt: BEFORE, updatedAt: BEFORE });
    await db.insert(entries).values([note("2026-03-08T22:59:00Z"), note("2026-03-08T23:00:00Z"), note("2026-03-09T10:00:00Z"), note("2026-03-15T22:59:00Z"), note("2026-03-15T23:00:00Z")]);
    await send(ownerId);
    await send(educatorId);
    const [own] = await mailsOf(ownerId);
    expect(own?.text).toContain("Glucose on 7 of 7 days.");
    expect(own?.text).toContain("Something logged on 2 of 7 days.");
    expect(own?.text).toContain("69% of readings were in range, 70 (3.9) to 180 (10.0) mg/dL, and 3.5% below 70 (3.9).");
    const [theirs] = await mailsOf(educatorId);
    expect(theirs?.text).toContain("Ilka Brandvold: 8.7% of 14 days was below 70 (3.9). The usual aim is under 4%.");
  });

  it("goes to nobody who switched it off, is not verified, has no notebook, or came after its moment", async () => {
    const off = (await person()).ownerId;
    await saveDigestPreference(db, off, { ...DEFAULT_DIGEST_PREFERENCE, level: "off" }, BEFORE);
    const unverified = await createPerson(db, { isVerified: false, at: BEFORE });
    await createJournal(db, { ownerId: unverified, at: BEFORE });
    const alone = await createPerson(db, { at: BEFORE });
    const late = (await createJournal(db, { at: new Date("2026-03-16T07:10:00Z") })).ownerId;
    for (const userId of [off, unverified, alone, late]) expect(await send(userId)).toBeNull();
    const due = await dueReaders(jobAt(MONDAY));
    expect(due).not.toContain(off);
    expect(due).not.toContain(unverified);
    expect(due).not.toContain(alone);
    expect(due).not.toContain(late);
  });

  it("refuses everybody but the weekly job", async () => {
    const { ownerId } = await person();
    await expect(sendDigest(await contextFor(db, ownerId, MONDAY), { userId: ownerId }, noFinding)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(sendDigest(contextAs(db, { type: "job", job: "outbox" }, MONDAY), { userId: ownerId }, noFinding)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(dueReaders(contextAs(db, { type: "anonymous" }))).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    expect(await mailsOf(ownerId)).toEqual([]);
  });

  describe("between writing and sending", () => {
    const sent: string[] = [];
    const deliver = (now: Date) =>
      deliverDueMail(db, () => now, (mail) => { sent.push(mail.id); return Promise.resolve({ providerId: `p-${mail.id}` }); }, mailConsent(db, () => now));

    it("a helper who was removed gets none", async () => {
      const { journalId, ownerId } = await person();
      const mentorId = await createHelper(db, { journalId, ownerId, role: "mentor" });
      const id = await send(mentorId);
      await revokeGrant(db, journalId, mentorId, MONDAY);
      await deliver(MONDAY);
      expect(sent).not.toContain(id);
      expect(await mailsOf(mentorId)).toMatchObject([{ state: "dropped" }]);
      expect(await send(mentorId)).toBeNull();
    });

    it("a mentor of two who was removed by one gets it anew, without that one", async () => {
      const first = await person();
      const second = await person();
      const mentorId = await createHelper(db, { ...first, role: "mentor" });
      await grantRole(db, { journalId: second.journalId, userId: mentorId, role: "mentor", grantedBy: second.ownerId, at: BEFORE });
      const id = await send(mentorId);
      await revokeGrant(db, first.journalId, mentorId, MONDAY);
      await deliver(MONDAY);
      expect(sent).not.toContain(id);
      const again = await send(mentorId);
      await deliver(MONDAY);
      expect(sent).toContain(again);
      const mails = await mailsOf(mentorId);
      expect(mails.map(({ state }) => state).sort()).toEqual(["dropped", "sent"]);
      expect(mails.find(({ id: mailId }) => mailId === again)?.html).not.toContain(first.journalId);
    });

    it("somebody who chose less gets it anew, with less", async () => {
      const { ownerId } = await person();
      await saveDigestPreference(db, ownerId, { ...DEFAULT_DIGEST_PREFERENCE, level: "full" }, BEFORE);
      await send(ownerId);
      await saveDigestPreference(db, ownerId, { ...DEFAULT_DIGEST_PREFERENCE, level: "links" }, BEFORE);
      await deliver(MONDAY);
      expect(await mailsOf(ownerId)).toMatchObject([{ state: "dropped" }]);
      await send(ownerId);
      await deliver(MONDAY);
      expect((await mailsOf(ownerId)).find(({ state }) => state === "sent")?.basis?.level).toBe("links");
    });

    it("what may already have left is dropped for good, not written twice", async () => {
      const { ownerId } = await person();
      await saveDigestPreference(db, ownerId, { ...DEFAULT_DIGEST_PREFERENCE, level: "full" }, BEFORE);
      const id = await send(ownerId);
      await deliverDueMail(db, () => MONDAY, () => Promise.resolve({ error: "no answer", isFinal: false }), mailConsent(db, () => MONDAY));
      await saveDigestPreference(db, ownerId, { ...DEFAULT_DIGEST_PREFERENCE, level: "links" }, BEFORE);
      const later = new Date(MONDAY.getTime() + 60_000);
      await deliver(later);
      expect(sent).not.toContain(id);
      expect(await send(ownerId, later)).toBeNull();
    });
  });

  it("comes once in each of 52 weeks, in every zone, on the chosen weekday and hour", async () => {
    const readers = await Promise.all(
      ([["Europe/Oslo", 1, 480], ["America/New_York", 7, 150], ["Australia/Lord_Howe", 7, 105]] as const).map(async ([timeZone, weekday, minuteOfDay]) => {
        const ownerId = await createPerson(db, { timeZone, at: BEFORE });
        await createJournal(db, { ownerId, at: BEFORE });
        await saveDigestPreference(db, ownerId, { ...DEFAULT_DIGEST_PREFERENCE, weekday, minuteOfDay }, BEFORE);
        return ownerId;
      }),
    );
    const start = Date.parse("2026-03-02T00:00:00Z");
    for (let hours = 0; hours < 52 * 7 * 24; hours += 12) {
      const now = new Date(start + hours * 3_600_000);
      for (const userId of readers) await send(userId, now);
    }
    for (const userId of readers) {
      const weeks = await db.select().from(digests).where(eq(digests.userId, userId));
      expect(weeks).toHaveLength(52);
      expect(await mailsOf(userId)).toHaveLength(52);
    }
  }, 120_000);
});
