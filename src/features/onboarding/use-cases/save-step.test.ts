import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { findJournal } from "@/db/repositories/journals";
import { moveVersion } from "@/db/repositories/versions";
import { findDraft, insertDraft } from "@/db/repositories/wizard-drafts";
import { asideOf, savedCountOf } from "@/domain/onboarding/draft-pages";
import { OPEN_GATE } from "@/domain/settings/starting-profile.fixture";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import type { SaveStepInput } from "../schema";
import { proposeStart } from "./propose-start";
import { saveStep } from "./save-step";

const aboutYou = { weightKg: "70", ageYears: "34", totalDailyDoseUnits: "40", hypoProne: "no", largestMealBolusUnits: "" };
const device = { basalStepUnits: "0.1", bolusStepUnits: "0.1", durationOfActionHours: "" };

describe("saveStep", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function drafting() {
    const { journalId, ownerId } = await createJournal(db);
    await insertDraft(db, { journalId, updatedAt: TEST_NOW, updatedBy: ownerId });
    const rowVersion = (await findDraft(db, journalId))!.rowVersion;
    const input: SaveStepInput = { journalId, step: "about-you", rowVersion, ...aboutYou };
    const answersOf = async () => (await findDraft(db, journalId))!.answers;
    return { journalId, ownerId, ctx: await contextFor(db, ownerId), input, rowVersion, answersOf };
  }

  it("keeps a page as typed, counts on, names the page that follows, and drops what is no field of it", async () => {
    const { journalId, ctx, input, rowVersion } = await drafting();
    expect(await saveStep(ctx, { ...input, weightKg: "70,5", returnTo: "review", planted: "x" })).toEqual({ next: "gate", rowVersion: rowVersion + 1, isAside: false });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion: rowVersion + 1, answers: { "about-you": { ...aboutYou, weightKg: "70,5" } } });
    expect((await findDraft(db, journalId))!.answers["about-you"]).not.toHaveProperty("planted");
  });

  it("keeps both texts of a page that another device saved meanwhile, and overwrites nothing", async () => {
    const { ctx, input, rowVersion, answersOf } = await drafting();
    await saveStep(ctx, input);
    expect(await saveStep(ctx, { ...input, weightKg: "80" })).toEqual({ next: "about-you", rowVersion: rowVersion + 2, isAside: true });
    const answers = await answersOf();
    expect(answers["about-you"]).toMatchObject({ weightKg: "70" });
    expect(asideOf(answers, "about-you")).toEqual([{ ...aboutYou, weightKg: "80" }]);
  });

  it("saves a page that only other pages moved on from", async () => {
    const { journalId, ctx, input, rowVersion, answersOf } = await drafting();
    await saveStep(ctx, input);
    expect(await saveStep(ctx, { journalId, rowVersion, step: "device", ...device })).toMatchObject({ next: "basal", isAside: false });
    expect(await answersOf()).toMatchObject({ "about-you": aboutYou, device });
  });

  it("makes one save of a double press", async () => {
    const { ctx, input, rowVersion, answersOf } = await drafting();
    await saveStep(ctx, input);
    expect(await saveStep(ctx, input)).toEqual({ next: "gate", rowVersion: rowVersion + 1, isAside: false });
    expect(asideOf(await answersOf(), "about-you")).toEqual([]);
  });

  it("loses none of ten texts that are saved at once", async () => {
    const { ctx, input, answersOf } = await drafting();
    const weights = Array.from({ length: 10 }, (_, i) => String(60 + i));
    const outcomes = await Promise.all(weights.map((weightKg) => saveStep(ctx, { ...input, weightKg })));
    expect(outcomes.filter(({ isAside }) => !isAside)).toHaveLength(1);
    const answers = await answersOf();
    const kept = [answers["about-you"], ...asideOf(answers, "about-you")].map((page) => page?.weightKg);
    expect(kept.toSorted()).toEqual(weights);
  });

  it("lets a page left as the cautious preset follow it when an earlier page changes", async () => {
    const { journalId, ctx, input, rowVersion, answersOf } = await drafting();
    await saveStep(ctx, { ...input, weightKg: "80" });
    await saveStep(ctx, { journalId, rowVersion, step: "gate", ...OPEN_GATE });
    await saveStep(ctx, { journalId, rowVersion, step: "basal", blocks: [{ from: "00:00", value: "0,50" }] });
    await saveStep(ctx, { journalId, rowVersion, step: "carb-ratio", blocks: [{ from: "00:00", value: "18" }] });
    const answers = await answersOf();
    expect(answers.basal).toEqual({});
    expect(answers["carb-ratio"]).toEqual({ blocks: [{ from: "00:00", value: "18" }] });
    expect(savedCountOf(answers, "basal")).toBeGreaterThan(0);
  });

  it("writes the device’s steps into the journal and the way back onto its card", async () => {
    const { journalId, ctx, rowVersion } = await drafting();
    const saved = await saveStep(ctx, { journalId, rowVersion, step: "device", insulin: "rapid, U100", basalStepUnits: "0,025", bolusStepUnits: "0.1", durationOfActionHours: "4" });
    await saveStep(ctx, {
      journalId, rowVersion: saved.rowVersion, step: "fallback", previousSetup: "Two pens.", longActingUnits: "18.5", rapidUnits: "", emergencyNumber: "112", contacts: [{ name: "Bo", phone: "12345" }, { name: "", phone: "" }],
    });
    expect((await findJournal(db, journalId))?.setup).toMatchObject({ insulin: "rapid, U100", basalStepMilliUnits: 25, bolusStepMilliUnits: 100 });
    expect(await findFallbackCard(db, journalId)).toMatchObject({ previousSetup: "Two pens.", longActingMilliUnits: 18_500, rapidMilliUnits: null, emergencyNumber: "112", contacts: [{ name: "Bo", phone: "12345" }] });
  });

  it.each([
    ["weightKg", { weightKg: "heavy" }],
    ["ageYears", { ageYears: "34.5" }],
    ["hypoProne", { hypoProne: "maybe" }],
    ["totalDailyDoseUnits", { totalDailyDoseUnits: "" }],
  ])("refuses a page whose %s is amiss, and keeps the draft as it was", async (field, wrong) => {
    const { journalId, ctx, input, rowVersion } = await drafting();
    await expect(saveStep(ctx, { ...input, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion, answers: {} });
  });

  it("is closed once the draft was sent, and open again after a return", async () => {
    const { journalId, ctx, input, rowVersion } = await drafting();
    const { rowVersion: second } = await saveStep(ctx, input);
    const { rowVersion: third } = await saveStep(ctx, { journalId, rowVersion: second, step: "gate", ...OPEN_GATE });
    await proposeStart(ctx, { journalId, rowVersion: third });
    await expect(saveStep(ctx, { ...input, rowVersion: third, weightKg: "71" })).rejects.toMatchObject({ code: "CONFLICT" });
    await moveVersion(db, { journalId, number: 1, from: "proposed", to: "returned", at: TEST_NOW });
    expect(await saveStep(ctx, { ...input, rowVersion: third, weightKg: "71" })).toMatchObject({ isAside: false });
    expect(rowVersion).toBeLessThan(third);
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, input, rowVersion } = await drafting();
    await expect(saveStep(await contextFor(db, await createHelper(db, { journalId, ownerId, role })), input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(saveStep(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion, answers: {} });
  });
});
