import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { listLiveGrants } from "@/db/repositories/grants";
import { insertMail } from "@/db/repositories/outbox";
import { journalEvents } from "@/db/schema/journals";
import { outbox } from "@/db/schema/mail";
import { recordRead } from "@/lib/access";
import { mailConsent } from "@/lib/mail-consent";
import { deliverDueMail } from "@/lib/mailer";
import { anonymousContext, contextFor, createHelper, createJournal, createPerson, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { accessLines } from "../queries/access-log";
import { circle } from "../queries/circle";
import { acceptInvitation } from "./accept-invitation";
import { inviteHelper } from "./invite-helper";
import { leaveCircle } from "./leave-circle";
import { limitHelper } from "./limit-helper";
import { removeHelper } from "./remove-helper";

describe("helpers", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const withMentor = async () => {
    const journal = await createJournal(db);
    return { ...journal, mentorId: await createHelper(db, { ...journal, role: "mentor" }) };
  };
  const eventsOf = (journalId: string) => db.select().from(journalEvents).where(eq(journalEvents.journalId, journalId));

  describe("limitHelper", () => {
    it("counts from the next request on", async () => {
      const { journalId, ownerId, mentorId } = await withMentor();
      await limitHelper(await contextFor(db, ownerId), { journalId, userId: mentorId, scopes: "glucose", until: "2026-03-10" });
      expect(await listLiveGrants(db, mentorId, TEST_NOW)).toEqual([{ journalId, role: "mentor", scopes: ["glucose"] }]);
      expect(await listLiveGrants(db, mentorId, new Date("2026-03-10T23:00:00Z"))).toEqual([]);
      expect((await circle(await contextFor(db, ownerId), { journalId })).helpers).toMatchObject([{ scopes: ["glucose"], until: "2026-03-10" }]);
      expect(await eventsOf(journalId)).toMatchObject([{ action: "circle.manage", details: { step: "limited" } }]);
    });

    it("takes every scope away where none is ticked", async () => {
      const { journalId, ownerId, mentorId } = await withMentor();
      await limitHelper(await contextFor(db, ownerId), { journalId, userId: mentorId, scopes: undefined, until: "" });
      expect(await listLiveGrants(db, mentorId, TEST_NOW)).toMatchObject([{ scopes: [] }]);
    });

    it("refuses what is no scope, a day that is over, the person's own grant, and somebody who is no helper", async () => {
      const { journalId, ownerId, mentorId } = await withMentor();
      const ctx = await contextFor(db, ownerId);
      await expect(limitHelper(ctx, { journalId, userId: mentorId, scopes: ["everything"], until: "" })).rejects.toMatchObject({ name: "ZodError" });
      await expect(limitHelper(ctx, { journalId, userId: mentorId, scopes: [], until: "2026-03-09" })).rejects.toMatchObject({ fields: { until: [expect.any(String)] } });
      await expect(limitHelper(ctx, { journalId, userId: ownerId, scopes: [], until: "" })).rejects.toMatchObject({ code: "NOT_FOUND" });
      await expect(limitHelper(ctx, { journalId, userId: await createPerson(db), scopes: [], until: "" })).rejects.toMatchObject({ code: "NOT_FOUND" });
      expect(await listLiveGrants(db, ownerId, TEST_NOW)).toMatchObject([{ role: "person" }]);
      expect(await eventsOf(journalId)).toEqual([]);
    });
  });

  describe("removeHelper", () => {
    it("shuts the door at the next request, keeps waiting mail back, and takes open invitations along", async () => {
      const { journalId, ownerId } = await createJournal(db);
      const email = "leaves@example.org";
      const mentorId = await createPerson(db, { email });
      const owner = await contextFor(db, ownerId);
      await inviteHelper(owner, { journalId, email, role: "mentor", scopes: ["settings"], until: "" });
      const before = await contextFor(db, mentorId);
      const [sent] = await db.select().from(outbox).where(eq(outbox.toAddress, email));
      const token = /token=([\w-]{43})/.exec(sent?.text ?? "")?.[1] ?? "";
      await acceptInvitation(before, { token });
      await insertMail(db, { kind: "new-comment", journalId, recipientId: mentorId, toAddress: email, subject: "s", html: "h", text: "t", dedupeKey: crypto.randomUUID(), requestId: "", createdAt: TEST_NOW });
      await removeHelper(owner, { journalId, userId: mentorId });
      expect(await listLiveGrants(db, mentorId, TEST_NOW)).toEqual([]);
      await expect(accessLines(await contextFor(db, mentorId), { journalId })).rejects.toMatchObject({ code: "NOT_FOUND" });
      await deliverDueMail(db, () => TEST_NOW, () => Promise.resolve({ providerId: "p" }), mailConsent(db, () => TEST_NOW));
      const mails = await db.select().from(outbox).where(eq(outbox.recipientId, mentorId));
      expect(mails).toMatchObject([{ state: "dropped" }]);
      expect((await circle(owner, { journalId })).helpers).toEqual([]);
    });

    it("can't remove the person, a stranger, or anybody twice", async () => {
      const { journalId, ownerId, mentorId } = await withMentor();
      const ctx = await contextFor(db, ownerId);
      await expect(removeHelper(ctx, { journalId, userId: ownerId })).rejects.toMatchObject({ code: "NOT_FOUND" });
      await removeHelper(ctx, { journalId, userId: mentorId });
      await expect(removeHelper(ctx, { journalId, userId: mentorId })).rejects.toMatchObject({ code: "NOT_FOUND" });
      expect(await listLiveGrants(db, ownerId, TEST_NOW)).toHaveLength(1);
    });
  });

  it("may leave by themselves; the person can't", async () => {
    const { journalId, ownerId, mentorId } = await withMentor();
    await expect(leaveCircle(await contextFor(db, ownerId), { journalId })).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(leaveCircle(await strangerContext(db), { journalId })).rejects.toMatchObject({ code: "NOT_FOUND" });
    await expect(leaveCircle(anonymousContext(db), { journalId })).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    await leaveCircle(await contextFor(db, mentorId), { journalId });
    expect(await listLiveGrants(db, mentorId, TEST_NOW)).toEqual([]);
    expect(await listLiveGrants(db, ownerId, TEST_NOW)).toHaveLength(1);
    expect(await eventsOf(journalId)).toMatchObject([{ action: "circle.leave", actorId: mentorId }]);
  });

  it("are limited and removed by the person alone", async () => {
    const journal = await withMentor();
    const { journalId, mentorId } = journal;
    for (const role of ["mentor", "educator", "family"] as const) {
      const ctx = await contextFor(db, await createHelper(db, { ...journal, role }));
      await expect(limitHelper(ctx, { journalId, userId: mentorId, scopes: [], until: "" })).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expect(removeHelper(ctx, { journalId, userId: mentorId })).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expect(accessLines(ctx, { journalId })).rejects.toMatchObject({ code: "FORBIDDEN" });
    }
    for (const [ctx, code] of [[await strangerContext(db), "NOT_FOUND"], [anonymousContext(db), "UNAUTHENTICATED"]] as const) {
      await expect(limitHelper(ctx, { journalId, userId: mentorId, scopes: [], until: "" })).rejects.toMatchObject({ code });
      await expect(removeHelper(ctx, { journalId, userId: mentorId })).rejects.toMatchObject({ code });
      await expect(accessLines(ctx, { journalId })).rejects.toMatchObject({ code });
      await expect(circle(ctx, { journalId })).rejects.toMatchObject({ code });
    }
    expect(await listLiveGrants(db, mentorId, TEST_NOW)).toHaveLength(1);
  });

  it("leave a line for each look, which the person reads newest first", async () => {
    const { journalId, ownerId, mentorId } = await withMentor();
    const at = (minute: number) => new Date(TEST_NOW.getTime() + minute * 60_000);
    await recordRead(await contextFor(db, mentorId, at(1)), journalId, "changes");
    await recordRead(await contextFor(db, mentorId, at(2)), journalId, "version 3");
    await recordRead(await contextFor(db, ownerId, at(3)), journalId, "changes");
    const lines = await accessLines(await contextFor(db, ownerId), { journalId });
    expect(lines).toMatchObject([
      { name: "A mentor", role: "mentor", what: "version 3", times: 1, when: "Tuesday 10 March, 10:02" },
      { name: "A mentor", role: "mentor", what: "changes", times: 1, when: "Tuesday 10 March, 10:01" },
    ]);
  });

  it("who look at the same again and again on one day stand in one line with a count", async () => {
    const { journalId, ownerId, mentorId } = await withMentor();
    const at = (minute: number) => new Date(TEST_NOW.getTime() + minute * 60_000);
    for (const minute of [1, 2, 3]) await recordRead(await contextFor(db, mentorId, at(minute)), journalId, "changes");
    await recordRead(await contextFor(db, mentorId, at(24 * 60)), journalId, "changes");
    const lines = await accessLines(await contextFor(db, ownerId), { journalId });
    expect(lines.map(({ times, when }) => [times, when])).toEqual([[1, "Wednesday 11 March, 10:00"], [3, "Tuesday 10 March, 10:03"]]);
  });
});
