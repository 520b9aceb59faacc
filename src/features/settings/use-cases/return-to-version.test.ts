import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { insertEntry } from "@/db/repositories/entries";
import { replaceRollups, type RollupRow } from "@/db/repositories/rollups";
import { listVersions, moveVersion } from "@/db/repositories/versions";
import { dayNumberOf } from "@/domain/day-start";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { createVersion } from "@/testing/version-factory";
import { returnToVersion } from "./return-to-version";

const DAY_MS = 86_400_000;
const daysAgo = (days: number) => new Date(TEST_NOW.getTime() - days * DAY_MS);

describe("returnToVersion", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  /** Version 1 was superseded by version 2 yesterday. */
  async function twice(gateReasons: string[] | null = [], basal = { first: 500, second: 1000 }) {
    const { journalId, ownerId } = await createJournal(db, { gateReasons });
    await createVersion(db, { journalId, authorId: ownerId, number: 1, at: daysAgo(10), basalMilliUnitsPerHour: basal.first });
    await moveVersion(db, { journalId, number: 1, from: "in-effect", to: "superseded", at: daysAgo(1) }, { effectiveUntil: daysAgo(1) });
    await createVersion(db, { journalId, authorId: ownerId, number: 2, at: daysAgo(1), basalMilliUnitsPerHour: basal.second });
    return { journalId, ownerId, ctx: await contextFor(db, ownerId) };
  }

  const states = async (journalId: string) => (await listVersions(db, journalId)).map((v) => [v.number, v.state]);

  it("goes back at once where the gate is open, however soon and large the step", async () => {
    const { journalId, ctx } = await twice();
    expect(await returnToVersion(ctx, { journalId, number: "1", reasonText: "Two lows last night." })).toEqual({ number: 3, state: "in-effect" });
    expect(await listVersions(db, journalId)).toMatchObject([
      { number: 3, state: "in-effect", kind: "undo", parentNumber: 2, reasonCode: "undo", reasonText: "Two lows last night.", profile: { basal: [{ milliUnitsPerHour: 500 }] } },
      { number: 2, state: "superseded", effectiveUntil: TEST_NOW },
      { number: 1, state: "superseded" },
    ]);
  });

  it.each([[["A first pump."]], [null]])("asks the educator where the gate is not open (%j)", async (gateReasons) => {
    const { journalId, ctx } = await twice(gateReasons);
    expect(await returnToVersion(ctx, { journalId, number: 1 })).toEqual({ number: 3, state: "proposed" });
    expect(await states(journalId)).toEqual([[3, "proposed"], [2, "in-effect"], [1, "superseded"]]);
  });

  it("asks first where ketones were noted and insulin would be less, and keeps the answer", async () => {
    const { journalId, ownerId, ctx } = await twice();
    await insertEntry(db, { journalId, kind: "ketones", at: daysAgo(0.2), data: { kind: "ketones", ketonesMicroMolPerL: 1800 }, createdBy: ownerId, createdAt: daysAgo(0.2), updatedAt: daysAgo(0.2) });
    await expect(returnToVersion(ctx, { journalId, number: 1 })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { "answers.weaker-and-ketones": [expect.stringContaining("sick-day plan")] } });
    expect(await states(journalId)).toEqual([[2, "in-effect"], [1, "superseded"]]);
    await returnToVersion(ctx, { journalId, number: 1, answers: { "weaker-and-ketones": "My educator is on the phone." } });
    const [back] = await listVersions(db, journalId);
    expect(back).toMatchObject({ number: 3, state: "in-effect" });
    expect(back?.guardrails).toContainEqual(expect.objectContaining({ code: "weaker-and-ketones", answer: "My educator is on the phone." }));
  });

  it("answers no question about lows by itself where insulin would be more", async () => {
    const { journalId, ctx } = await twice([], { first: 1000, second: 500 });
    const day: RollupRow = {
      journalId, dayNumber: dayNumberOf("2026-03-09"), part: "day", readings: 288, sumMgDl: 288 * 90, sumSquares: 288 * 90 * 90, bandCounts: [10, 30, 248, 0, 0], histogram: [],
      minutesInPart: 1440, intervalMinutes: 5,
    };
    await replaceRollups(db, journalId, [day.dayNumber], [day]);
    await expect(returnToVersion(ctx, { journalId, number: 1 })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { "answers.stronger-after-lows": [expect.stringContaining("educator")] } });
    expect(await states(journalId)).toEqual([[2, "in-effect"], [1, "superseded"]]);
    expect(await returnToVersion(ctx, { journalId, number: 1, answers: { "stronger-after-lows": "Asked her this morning." } })).toEqual({ number: 3, state: "in-effect" });
  });

  it("goes back once on a double press", async () => {
    const { journalId, ctx } = await twice();
    const presses = await Promise.allSettled(Array.from({ length: 5 }, () => returnToVersion(ctx, { journalId, number: 1 })));
    expect(presses.filter((p) => p.status === "fulfilled")).toHaveLength(1);
    for (const p of presses) if (p.status === "rejected") expect(p.reason).toMatchObject({ code: "CONFLICT" });
    expect(await states(journalId)).toEqual([[3, "in-effect"], [2, "superseded"], [1, "superseded"]]);
  });

  it("refuses the version in effect, one that never was, and one that is not there", async () => {
    const { journalId, ownerId, ctx } = await twice();
    await createVersion(db, { journalId, authorId: ownerId, number: 3, state: "declined" });
    await expect(returnToVersion(ctx, { journalId, number: 2 })).rejects.toMatchObject({ code: "CONFLICT" });
    await expect(returnToVersion(ctx, { journalId, number: 3 })).rejects.toMatchObject({ code: "CONFLICT" });
    await expect(returnToVersion(ctx, { journalId, number: 9 })).rejects.toMatchObject({ code: "NOT_FOUND" });
    await expect(returnToVersion(ctx, { journalId, number: 0 })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["number"] })] });
    expect(await states(journalId)).toEqual([[3, "declined"], [2, "in-effect"], [1, "superseded"]]);
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId } = await twice();
    const helper = await contextFor(db, await createHelper(db, { journalId, ownerId, role }));
    await expect(returnToVersion(helper, { journalId, number: 1 })).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(returnToVersion(await strangerContext(db), { journalId, number: 1 })).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await states(journalId)).toEqual([[2, "in-effect"], [1, "superseded"]]);
  });
});
