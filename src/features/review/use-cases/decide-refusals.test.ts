import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { listEvents } from "@/db/repositories/journal-events";
import { listReviews } from "@/db/repositories/version-reviews";
import { findVersion, insertVersion } from "@/db/repositories/versions";
import { outbox } from "@/db/schema/mail";
import { exampleProfile } from "@/domain/settings/profile.fixture";
import { hashProfile } from "@/lib/content-hash";
import { anonymousContext, contextFor, createHelper, createJournal, createPerson, giveLicence, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { REVIEW_CHECKLIST } from "../constants";
import type { ApproveVersionInput, ReturnVersionInput } from "../schema";
import { approveVersion } from "./approve-version";
import { declineVersion } from "./decline-version";
import { returnVersion } from "./return-version";

const checklist = Object.keys(REVIEW_CHECKLIST) as (keyof typeof REVIEW_CHECKLIST)[];

describe("a decision that is refused", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  /** A proposal that waits, written by the person unless an author is given. */
  async function proposed(writtenBy: "person" | "educator" = "person") {
    const { journalId, ownerId } = await createJournal(db);
    const educatorId = await createHelper(db, { journalId, ownerId, role: "educator" });
    const profile = exampleProfile();
    const contentHash = hashProfile(profile);
    await insertVersion(
      db,
      {
        journalId, number: 1, revision: 1, kind: "starting", profile, contentHash, reasonCode: "other", reasonText: "a start", evidenceDays: [], revertRule: "",
        guardrails: [], authorId: writtenBy === "person" ? ownerId : educatorId, createdAt: TEST_NOW,
      },
      "proposed",
    );
    const approval: ApproveVersionInput = { journalId, number: 1, contentHash, checklist, reviewOn: "2099-01-01", remarks: "", isSigned: "on" };
    const answer: ReturnVersionInput & { reason: "other" } = { journalId, number: 1, contentHash, reason: "other", remarks: "One thing at a time." };
    return { journalId, ownerId, educatorId, approval, answer, ctx: await contextFor(db, educatorId) };
  }
  type Proposed = Awaited<ReturnType<typeof proposed>>;

  const decisions = [
    ["approve", (ctx: Proposed["ctx"], p: Proposed, over: { contentHash?: string } = {}) => approveVersion(ctx, { ...p.approval, ...over })],
    ["return", (ctx: Proposed["ctx"], p: Proposed, over: { contentHash?: string } = {}) => returnVersion(ctx, { ...p.answer, ...over })],
    ["decline", (ctx: Proposed["ctx"], p: Proposed, over: { contentHash?: string } = {}) => declineVersion(ctx, { ...p.answer, ...over })],
  ] as const;

  async function expectUntouched({ journalId, ownerId }: Proposed) {
    expect(await findVersion(db, journalId, 1)).toMatchObject({ state: "proposed", approvedHash: null });
    expect(await listReviews(db, journalId)).toEqual([]);
    expect(await listEvents(db, journalId, 9)).toEqual([]);
    expect(await db.select().from(outbox).where(eq(outbox.recipientId, ownerId))).toEqual([]);
  }

  describe.each(decisions)("%s", (_name, decide) => {
    it("is closed to every role but a licensed educator, and to strangers and the signed out", async () => {
      const p = await proposed();
      const { journalId, ownerId } = p;
      const unlicensed = await createHelper(db, { journalId, ownerId, role: "educator", isLicensed: false });
      const blind = await createHelper(db, { journalId, ownerId, role: "educator", scopes: ["glucose"] });
      const mentor = await createHelper(db, { journalId, ownerId, role: "mentor" });
      const family = await createHelper(db, { journalId, ownerId, role: "family" });
      for (const userId of [unlicensed, blind, mentor, family, ownerId]) {
        await expect(decide(await contextFor(db, userId), p)).rejects.toMatchObject({ code: "FORBIDDEN" });
      }
      const elsewhere = await createPerson(db);
      await giveLicence(db, elsewhere);
      await expect(decide(await contextFor(db, elsewhere), p)).rejects.toMatchObject({ code: "NOT_FOUND" });
      await expect(decide(await strangerContext(db), p)).rejects.toMatchObject({ code: "NOT_FOUND" });
      await expect(decide(anonymousContext(db), p)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
      await expectUntouched(p);
    });

    it("is not the proposer’s, even where the proposer is a licensed educator", async () => {
      const p = await proposed("educator");
      await expect(decide(p.ctx, p)).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expectUntouched(p);
      const second = await createHelper(db, { journalId: p.journalId, ownerId: p.ownerId, role: "educator" });
      expect(await decide(await contextFor(db, second), p)).toMatchObject({ number: 1 });
    });

    it("binds what was shown", async () => {
      const p = await proposed();
      await expect(decide(p.ctx, p, { contentHash: "b".repeat(64) })).rejects.toMatchObject({ code: "STALE" });
      await expectUntouched(p);
    });

    it("is made once, and mailed once", async () => {
      const p = await proposed();
      await decide(p.ctx, p);
      for (const [, again] of decisions) await expect(again(p.ctx, p)).rejects.toMatchObject({ code: "CONFLICT" });
      expect(await listReviews(db, p.journalId)).toHaveLength(1);
      expect((await listEvents(db, p.journalId, 9)).map((e) => e.action)).toEqual(["version.review"]);
      expect(await db.select().from(outbox).where(eq(outbox.recipientId, p.ownerId))).toMatchObject([{ kind: "decision" }]);
    });

    it("needs a licence that has not run out", async () => {
      const p = await proposed();
      const afterwards = await contextFor(db, p.educatorId, new Date("2100-01-02T09:00:00Z"));
      await expect(decide(afterwards, p)).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expectUntouched(p);
    });
  });

  it.each([
    ["checklist", { checklist: checklist.slice(1) }],
    ["reviewOn", { reviewOn: "soon" }],
    ["isSigned", { isSigned: undefined }],
    ["remarks", { remarks: "x".repeat(2001) }],
  ])("names %s where the form to approve is amiss", async (field, wrong) => {
    const p = await proposed();
    await expect(approveVersion(p.ctx, { ...p.approval, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    await expectUntouched(p);
  });

  it("names the next review where it does not lie ahead, and remarks where there are none", async () => {
    const p = await proposed();
    await expect(approveVersion(p.ctx, { ...p.approval, reviewOn: "2026-03-10" })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { reviewOn: [expect.any(String)] } });
    for (const decide of [returnVersion, declineVersion]) {
      await expect(decide(p.ctx, { ...p.answer, remarks: " " })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["remarks"] })] });
    }
    await expectUntouched(p);
  });
});
