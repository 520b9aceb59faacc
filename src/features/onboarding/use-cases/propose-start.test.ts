import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { listEvents } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { listRevisions, listVersions, moveVersion } from "@/db/repositories/versions";
import { insertDraft, updateDraft } from "@/db/repositories/wizard-drafts";
import { outbox } from "@/db/schema/mail";
import type { DraftAnswers } from "@/domain/onboarding/draft";
import { GATE_QUESTIONS } from "@/domain/settings/gate-questions";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { proposeStart } from "./propose-start";

const FIRST_ROW_VERSION = 1;
const allNo = Object.fromEntries(Object.keys(GATE_QUESTIONS).map((question) => [question, "no"]));
const complete: DraftAnswers = {
  "about-you": { weightKg: "70", ageYears: "34", totalDailyDoseUnits: "40", hypoProne: "no", largestMealBolusUnits: "" },
  gate: allNo,
  device: { basalStepUnits: "0.05", bolusStepUnits: "0.05", durationOfActionHours: "4" },
};

describe("proposeStart", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function drafted(answers: DraftAnswers = complete) {
    const { journalId, ownerId } = await createJournal(db, { gateReasons: null });
    await insertDraft(db, { journalId, updatedAt: TEST_NOW, updatedBy: ownerId });
    const save = (mended: DraftAnswers, since: number) => updateDraft(db, { journalId, answers: mended, rowVersion: since, updatedAt: TEST_NOW, updatedBy: ownerId });
    const rowVersion = await save(answers, FIRST_ROW_VERSION);
    if (rowVersion === null) throw new Error("the draft was not saved");
    return { journalId, ownerId, rowVersion, save, ctx: await contextFor(db, ownerId), input: { journalId, rowVersion } };
  }

  it("makes version 1 with its arithmetic, opens the gate, and asks each educator by mail", async () => {
    const { journalId, ownerId, ctx, input } = await drafted();
    const educatorId = await createHelper(db, { journalId, ownerId, role: "educator" });
    const mentorId = await createHelper(db, { journalId, ownerId, role: "mentor" });
    expect(await proposeStart(ctx, { ...input, note: "Agreed on Monday." })).toEqual({ number: 1 });
    const [version] = await listVersions(db, journalId);
    expect(version).toMatchObject({ number: 1, revision: 1, kind: "starting", state: "proposed", reasonText: "Agreed on Monday.", authorId: ownerId });
    expect(version?.arithmetic).not.toBeNull();
    expect(version?.profile.basal.length).toBeGreaterThan(0);
    expect(await findJournal(db, journalId)).toMatchObject({ gateReasons: [], startedOn: null });
    expect((await listEvents(db, journalId, 9)).map((e) => e.action)).toEqual(["version.propose"]);
    expect(await db.select().from(outbox).where(eq(outbox.recipientId, educatorId))).toMatchObject([{ kind: "review-asked", state: "waiting" }]);
    expect(await db.select().from(outbox).where(eq(outbox.recipientId, mentorId))).toEqual([]);
  });

  it("makes one version of a double press, and one mail", async () => {
    const { journalId, ownerId, ctx, input } = await drafted();
    const educatorId = await createHelper(db, { journalId, ownerId, role: "educator" });
    const outcomes = await Promise.allSettled([proposeStart(ctx, input), proposeStart(ctx, input), proposeStart(ctx, input)]);
    expect(outcomes.filter((o) => o.status === "fulfilled")).toHaveLength(1);
    for (const o of outcomes) if (o.status === "rejected") expect(o.reason).toMatchObject({ code: "CONFLICT" });
    expect(await listVersions(db, journalId)).toHaveLength(1);
    expect(await db.select().from(outbox).where(eq(outbox.recipientId, educatorId))).toHaveLength(1);
  });

  it("refuses a draft saved elsewhere since the review page, and proposes nothing", async () => {
    const { journalId, ctx, input, save, rowVersion } = await drafted();
    await save({ ...complete, basal: { blocks: [{ from: "00:00", value: "0.3" }] } }, rowVersion);
    await expect(proposeStart(ctx, input)).rejects.toMatchObject({ code: "STALE" });
    expect(await listVersions(db, journalId)).toEqual([]);
    expect(await findJournal(db, journalId)).toMatchObject({ gateReasons: null });
  });

  it("writes down why the gate is closed, and still asks the educator", async () => {
    const { journalId, ctx, input } = await drafted({ ...complete, gate: { ...allNo, firstEverPump: "yes", steroids: "not-sure" } });
    await proposeStart(ctx, input);
    const reasons = (await findJournal(db, journalId))?.gateReasons;
    expect(reasons).toEqual(expect.arrayContaining([GATE_QUESTIONS.firstEverPump.reason, GATE_QUESTIONS.steroids.reason]));
    expect(reasons).toHaveLength(2);
    expect(await listVersions(db, journalId)).toMatchObject([{ number: 1, state: "proposed" }]);
  });

  it("makes the mended draft the next wording of a returned version", async () => {
    const { journalId, ctx, input, save, rowVersion } = await drafted();
    await proposeStart(ctx, input);
    await moveVersion(db, { journalId, number: 1, from: "proposed", to: "returned", at: TEST_NOW });
    const mended = await save({ ...complete, basal: { blocks: [{ from: "00:00", value: "0.3" }] } }, rowVersion);
    expect(await proposeStart(ctx, { journalId, rowVersion: mended ?? 0 })).toEqual({ number: 1 });
    expect(await listVersions(db, journalId)).toMatchObject([{ number: 1, revision: 2, state: "proposed", profile: { basal: [{ startMinute: 0, milliUnitsPerHour: 300 }] } }]);
    const [first, second] = await listRevisions(db, journalId, 1);
    expect(first?.contentHash).not.toBe(second?.contentHash);
  });

  it("never sends the preset in place of a page that can’t be read", async () => {
    const { journalId, ctx, input } = await drafted({ ...complete, basal: { blocks: [{ from: "00:00", value: "0.3" }, { from: "05:00", value: "" }] } });
    await expect(proposeStart(ctx, input)).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { form: [expect.stringContaining("Basal")] } });
    expect(await listVersions(db, journalId)).toEqual([]);
  });

  it.each([["about-you"], ["gate"]] as const)("refuses while the page %s is missing, and writes nothing", async (page) => {
    const { [page]: _missing, ...rest } = complete;
    const { journalId, ctx, input } = await drafted(rest);
    await expect(proposeStart(ctx, input)).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { form: [expect.any(String)] } });
    expect(await listVersions(db, journalId)).toEqual([]);
    expect(await listEvents(db, journalId, 9)).toEqual([]);
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, input } = await drafted();
    await expect(proposeStart(await contextFor(db, await createHelper(db, { journalId, ownerId, role })), input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(proposeStart(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await listVersions(db, journalId)).toEqual([]);
  });
});
