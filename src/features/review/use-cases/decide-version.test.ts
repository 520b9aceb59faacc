import { sql } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findVersion } from "@/db/repositories/versions";
import { listReviews } from "@/db/repositories/version-reviews";
import { exampleProfile } from "@/domain/settings/profile.fixture";
import { contextFor, createHelper, createJournal, strangerContext } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { insertVersion } from "@/db/repositories/versions";
import { hashProfile } from "@/lib/content-hash";
import { TEST_NOW } from "@/testing/factories";

import { putIntoEffect } from "@/features/settings/use-cases/put-into-effect";
import { REVIEW_CHECKLIST } from "../constants";
import type { ApproveVersionInput } from "../schema";
import { approveVersion } from "./approve-version";
import { declineVersion } from "./decline-version";
import { returnVersion } from "./return-version";

const checklist = Object.keys(REVIEW_CHECKLIST) as (keyof typeof REVIEW_CHECKLIST)[];

describe("an educator's decision", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function proposed() {
    const { journalId, ownerId } = await createJournal(db);
    const profile = exampleProfile();
    const contentHash = hashProfile(profile);
    await insertVersion(
      db,
      {
        journalId, number: 1, revision: 1, kind: "starting", profile, contentHash, reasonCode: "other", reasonText: "a start", evidenceDays: [], revertRule: "",
        guardrails: [], authorId: ownerId, createdAt: TEST_NOW,
      },
      "proposed",
    );
    const educatorId = await createHelper(db, { journalId, ownerId, role: "educator" });
    const input: ApproveVersionInput = { journalId, number: 1, contentHash, checklist, reviewOn: "2099-01-01", remarks: "", isSigned: "on" };
    return { journalId, ownerId, educatorId, contentHash, input };
  }

  it("approves exactly what was shown, signed, and the person can put it into effect", async () => {
    const { journalId, ownerId, educatorId, contentHash, input } = await proposed();
    expect(await approveVersion(await contextFor(db, educatorId), input)).toEqual({ number: 1, state: "approved" });
    expect(await listReviews(db, journalId)).toMatchObject([{ decision: "approved", contentHash, signOffText: expect.stringContaining(contentHash.slice(0, 12)) as string }]);
    await putIntoEffect(await contextFor(db, ownerId), { journalId, number: 1, contentHash, effectiveFrom: "2026-03-10T08:00" });
    expect(await findVersion(db, journalId, 1)).toMatchObject({ state: "in-effect", approvedHash: contentHash });
  });

  it("has one winner among fifty that decide at once", async () => {
    const { educatorId, input } = await proposed();
    const ctx = await contextFor(db, educatorId);
    const outcomes = await Promise.allSettled(Array.from({ length: 50 }, () => approveVersion(ctx, input)));
    expect(outcomes.filter((o) => o.status === "fulfilled")).toHaveLength(1);
    for (const o of outcomes) if (o.status === "rejected") expect(o.reason).toMatchObject({ code: "CONFLICT" });
  });

  it("refuses a mentor, the person, an educator without a live licence, and hides from a stranger", async () => {
    const { journalId, ownerId, input } = await proposed();
    const mentor = await createHelper(db, { journalId, ownerId, role: "mentor" });
    const unlicensed = await createHelper(db, { journalId, ownerId, role: "educator", isLicensed: false });
    for (const userId of [mentor, ownerId, unlicensed]) {
      await expect(approveVersion(await contextFor(db, userId), input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    }
    await expect(approveVersion(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await listReviews(db, journalId)).toEqual([]);
  });

  it("refuses content other than what was shown", async () => {
    const { educatorId, input } = await proposed();
    await expect(approveVersion(await contextFor(db, educatorId), { ...input, contentHash: "b".repeat(64) })).rejects.toMatchObject({ code: "STALE" });
  });

  it("sends back with remarks, or declines, and neither can come into effect", async () => {
    for (const decide of [returnVersion, declineVersion]) {
      const { journalId, ownerId, educatorId, contentHash } = await proposed();
      await decide(await contextFor(db, educatorId), { journalId, number: 1, contentHash, reason: "other", remarks: "One thing at a time." });
      await expect(putIntoEffect(await contextFor(db, ownerId), { journalId, number: 1, contentHash })).rejects.toMatchObject({ code: "CONFLICT" });
    }
  });

  it("can't be rewritten by the application's own database role", async () => {
    await proposed();
    for (const statement of ["update settings_versions set reason_text = 'x'", "delete from version_reviews", "truncate journal_events"]) {
      await expect(db.execute(sql.raw(statement))).rejects.toMatchObject({ cause: { code: "42501" } });
    }
  });
});
