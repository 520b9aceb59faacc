import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { listEvents } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { findVersion, insertVersion, listVersions, moveVersion } from "@/db/repositories/versions";
import { exampleProfile } from "@/domain/settings/profile.fixture";
import { hashProfile } from "@/lib/content-hash";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { createVersion } from "@/testing/version-factory";
import { putIntoEffect } from "./put-into-effect";
import { withdrawVersion } from "./withdraw-version";

const DAY_MS = 86_400_000;
const daysAgo = (days: number) => new Date(TEST_NOW.getTime() - days * DAY_MS);

describe("putIntoEffect", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  /** Version `number`, approved for its own content so many days ago. */
  async function approved({ approvedDaysAgo = 1, hasEarlier = false } = {}) {
    const { journalId, ownerId } = await createJournal(db);
    const number = hasEarlier ? 2 : 1;
    if (hasEarlier) await createVersion(db, { journalId, authorId: ownerId, number: 1, at: daysAgo(20) });
    const profile = exampleProfile();
    const contentHash = hashProfile(profile);
    const at = daysAgo(approvedDaysAgo);
    await insertVersion(
      db,
      {
        journalId, number, revision: 1, parentNumber: hasEarlier ? 1 : null, kind: hasEarlier ? "change" : "starting", profile, contentHash, reasonCode: "other",
        reasonText: "a start", evidenceDays: [], revertRule: "", guardrails: [], authorId: ownerId, createdAt: at,
      },
      "proposed",
    );
    await moveVersion(db, { journalId, number, from: "proposed", to: "approved", at }, { approvedHash: contentHash });
    return { journalId, ownerId, number, ctx: await contextFor(db, ownerId), input: { journalId, number, contentHash } };
  }

  const states = async (journalId: string) => (await listVersions(db, journalId)).map((v) => [v.number, v.state]);

  it("makes the local day of the first version day 1, with one event", async () => {
    const { journalId, ctx, input } = await approved();
    // 00:30 in Oslo is still the day before in UTC.
    expect(await putIntoEffect(ctx, { ...input, effectiveFrom: "2026-03-10T00:30" })).toEqual({ number: 1, effectiveFrom: new Date("2026-03-09T23:30:00Z") });
    expect(await findJournal(db, journalId)).toMatchObject({ startedOn: "2026-03-10" });
    expect((await listEvents(db, journalId, 9)).map((e) => e.action)).toEqual(["version.effect"]);
  });

  it("ends the version before at the very moment it begins, and leaves day 1 alone", async () => {
    const { journalId, ctx, input } = await approved({ hasEarlier: true });
    await putIntoEffect(ctx, { ...input, effectiveFrom: "" });
    expect(await listVersions(db, journalId)).toMatchObject([
      { number: 2, state: "in-effect", effectiveFrom: TEST_NOW, effectiveUntil: null },
      { number: 1, state: "superseded", effectiveUntil: TEST_NOW },
    ]);
  });

  it("has one winner of a double press", async () => {
    const { journalId, ctx, input } = await approved({ hasEarlier: true });
    const presses = await Promise.allSettled(Array.from({ length: 10 }, () => putIntoEffect(ctx, input)));
    expect(presses.filter((p) => p.status === "fulfilled")).toHaveLength(1);
    for (const p of presses) if (p.status === "rejected") expect(p.reason).toMatchObject({ code: "CONFLICT" });
    expect(await states(journalId)).toEqual([[2, "in-effect"], [1, "superseded"]]);
  });

  it.each([
    ["lies ahead", "2026-03-10T12:00", "lies ahead"],
    ["is before the version before began", "2026-02-01T12:00", "before the version"],
    ["is no time", "noon", "Type the date"],
  ])("refuses a moment that %s, beside its field, and changes nothing", async (_what, effectiveFrom, words) => {
    const { journalId, ctx, input } = await approved({ hasEarlier: true });
    const error: unknown = await putIntoEffect(ctx, { ...input, effectiveFrom }).then(() => null, (reason: unknown) => reason);
    expect(error).toSatisfy((e: { fields?: Record<string, string[]>; issues?: { path: string[]; message: string }[] }) => {
      const sentences = e.fields?.effectiveFrom ?? e.issues?.filter((i) => i.path[0] === "effectiveFrom").map((i) => i.message) ?? [];
      return sentences.some((sentence) => sentence.includes(words));
    });
    expect(await states(journalId)).toEqual([[2, "approved"], [1, "in-effect"]]);
  });

  it.each([
    ["skips", "2026-03-29T02:30", "2026-03-29T09:00:00Z"],
    ["shows twice", "2026-10-25T02:30", "2026-10-25T09:00:00Z"],
  ])("refuses an hour that the clock %s", async (_what, effectiveFrom, now) => {
    const at = new Date(now);
    const { journalId, ownerId, input } = await approved({ approvedDaysAgo: 1 + (TEST_NOW.getTime() - at.getTime()) / DAY_MS });
    await expect(putIntoEffect(await contextFor(db, ownerId, at), { ...input, effectiveFrom })).rejects.toMatchObject({ fields: { effectiveFrom: [expect.stringContaining("clock")] } });
    expect(await states(journalId)).toEqual([[1, "approved"]]);
  });

  it("refuses content other than what was shown or approved", async () => {
    const shown = await approved();
    await expect(putIntoEffect(shown.ctx, { ...shown.input, contentHash: "b".repeat(64) })).rejects.toMatchObject({ code: "STALE" });
    const other = await approved();
    await moveVersion(db, { journalId: other.journalId, number: 1, from: "approved", to: "approved", at: TEST_NOW }, { approvedHash: "c".repeat(64) });
    await expect(putIntoEffect(other.ctx, other.input)).rejects.toMatchObject({ code: "STALE" });
    expect([await states(shown.journalId), await states(other.journalId)]).toEqual([[[1, "approved"]], [[1, "approved"]]]);
  });

  it("takes an approval of fourteen days, and none that is older", async () => {
    const last = await approved({ approvedDaysAgo: 14 });
    expect(await putIntoEffect(last.ctx, last.input)).toMatchObject({ number: 1 });
    const lapsed = await approved({ approvedDaysAgo: 14.01 });
    await expect(putIntoEffect(lapsed.ctx, lapsed.input)).rejects.toMatchObject({ code: "CONFLICT" });
    expect(await findJournal(db, lapsed.journalId)).toMatchObject({ startedOn: null });
  });

  it("can’t bring a withdrawn version into effect, nor withdraw one that is in effect", async () => {
    const withdrawn = await approved();
    await withdrawVersion(withdrawn.ctx, { journalId: withdrawn.journalId, number: 1 });
    await expect(putIntoEffect(withdrawn.ctx, withdrawn.input)).rejects.toMatchObject({ code: "CONFLICT" });
    const inEffect = await approved();
    await putIntoEffect(inEffect.ctx, inEffect.input);
    await expect(withdrawVersion(inEffect.ctx, { journalId: inEffect.journalId, number: 1 })).rejects.toMatchObject({ code: "CONFLICT" });
    expect(await findVersion(db, inEffect.journalId, 1)).toMatchObject({ state: "in-effect" });
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s both acts, and hides from a stranger", async (role) => {
    const { journalId, ownerId, number, input } = await approved();
    const helper = await contextFor(db, await createHelper(db, { journalId, ownerId, role }));
    const stranger = await strangerContext(db);
    await expect(putIntoEffect(helper, input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(withdrawVersion(helper, { journalId, number })).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(putIntoEffect(stranger, input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    await expect(withdrawVersion(stranger, { journalId, number })).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await states(journalId)).toEqual([[1, "approved"]]);
  });
});
