import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { findJournal } from "@/db/repositories/journals";
import { findDraft, insertDraft } from "@/db/repositories/wizard-drafts";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import type { SaveStepInput } from "../schema";
import { saveStep } from "./save-step";

const aboutYou = { weightKg: "70", ageYears: "34", totalDailyDoseUnits: "40", hypoProne: "no", largestMealBolusUnits: "" };

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
    return { journalId, ownerId, ctx: await contextFor(db, ownerId), input, rowVersion };
  }

  it("keeps a page as typed, counts on, and names the page that follows", async () => {
    const { journalId, ctx, input, rowVersion } = await drafting();
    expect(await saveStep(ctx, { ...input, weightKg: "70,5", returnTo: "review" })).toEqual({ next: "gate", rowVersion: rowVersion + 1 });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion: rowVersion + 1, answers: { "about-you": { ...aboutYou, weightKg: "70,5" } } });
  });

  it("refuses a draft that was saved elsewhere, and loses nothing of either page", async () => {
    const { journalId, ctx, input, rowVersion } = await drafting();
    await saveStep(ctx, input);
    await expect(saveStep(ctx, { ...input, weightKg: "80" })).rejects.toMatchObject({ code: "STALE" });
    await expect(saveStep(ctx, { journalId, rowVersion, step: "device", basalStepUnits: "0.1", bolusStepUnits: "0.1", durationOfActionHours: "" })).rejects.toMatchObject({ code: "STALE" });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion: rowVersion + 1, answers: { "about-you": aboutYou } });
    expect((await findJournal(db, journalId))?.setup.basalStepMilliUnits).toBe(50);
  });

  it("has one winner among ten devices that save at once", async () => {
    const { journalId, ctx, input, rowVersion } = await drafting();
    const weights = Array.from({ length: 10 }, (_, i) => String(60 + i));
    const outcomes = await Promise.allSettled(weights.map((weightKg) => saveStep(ctx, { ...input, weightKg })));
    const won = outcomes.flatMap((o, i) => (o.status === "fulfilled" ? [weights[i]] : []));
    expect(won).toHaveLength(1);
    for (const o of outcomes) if (o.status === "rejected") expect(o.reason).toMatchObject({ code: "STALE" });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion: rowVersion + 1, answers: { "about-you": { weightKg: won[0] } } });
  });

  it("writes the device’s steps into the journal and the way back onto its card", async () => {
    const { journalId, ctx, rowVersion } = await drafting();
    const device = await saveStep(ctx, { journalId, rowVersion, step: "device", basalStepUnits: "0,025", bolusStepUnits: "0.1", durationOfActionHours: "4" });
    await saveStep(ctx, {
      journalId, rowVersion: device.rowVersion, step: "fallback", previousSetup: "Two pens.", longActingUnits: "18.5", emergencyNumber: "112", contacts: [{ name: "Bo", phone: "12345" }, { name: "", phone: "" }],
    });
    expect((await findJournal(db, journalId))?.setup).toMatchObject({ basalStepMilliUnits: 25, bolusStepMilliUnits: 100 });
    expect(await findFallbackCard(db, journalId)).toMatchObject({ previousSetup: "Two pens.", longActingMilliUnits: 18_500, emergencyNumber: "112", contacts: [{ name: "Bo", phone: "12345" }] });
  });

  it.each([
    ["weightKg", { weightKg: "heavy" }],
    ["ageYears", { ageYears: "34.5" }],
    ["hypoProne", { hypoProne: "maybe" }],
  ])("refuses a page whose %s is amiss, and keeps the draft as it was", async (field, wrong) => {
    const { journalId, ctx, input, rowVersion } = await drafting();
    await expect(saveStep(ctx, { ...input, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion, answers: {} });
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, input, rowVersion } = await drafting();
    await expect(saveStep(await contextFor(db, await createHelper(db, { journalId, ownerId, role })), input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(saveStep(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await findDraft(db, journalId)).toMatchObject({ rowVersion, answers: {} });
  });
});
