import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findJournal } from "@/db/repositories/journals";
import { findDraft, insertDraft } from "@/db/repositories/wizard-drafts";
import { asideOf } from "@/domain/onboarding/draft-pages";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { chooseText } from "./choose-text";
import { saveStep } from "./save-step";

const device = { basalStepUnits: "0.1", bolusStepUnits: "0.1", durationOfActionHours: "" };

describe("chooseText", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  /** Three devices opened the device page at once: 0.1 was saved, 0.05 and 0.025 wait beside it. */
  async function disputed() {
    const { journalId, ownerId } = await createJournal(db);
    await insertDraft(db, { journalId, updatedAt: TEST_NOW, updatedBy: ownerId });
    const ctx = await contextFor(db, ownerId);
    for (const basalStepUnits of ["0.1", "0.05", "0.025"]) await saveStep(ctx, { journalId, step: "device", rowVersion: 1, ...device, basalStepUnits });
    const draftOf = async () => (await findDraft(db, journalId))!;
    const stepOf = async () => (await findJournal(db, journalId))!.setup.basalStepMilliUnits;
    return { journalId, ownerId, ctx, draftOf, stepOf, input: { journalId, step: "device" as const, rowVersion: (await draftOf()).rowVersion, keep: "1" } };
  }

  it("puts the chosen text in place, with what it means for the setup", async () => {
    const { ctx, draftOf, stepOf, input } = await disputed();
    expect(await stepOf()).toBe(100);
    await chooseText(ctx, input);
    expect((await draftOf()).answers.device).toMatchObject({ basalStepUnits: "0.025" });
    expect(asideOf((await draftOf()).answers, "device")).toEqual([]);
    expect(await stepOf()).toBe(25);
  });

  it("keeps the saved text", async () => {
    const { ctx, draftOf, stepOf, input } = await disputed();
    await chooseText(ctx, { ...input, keep: "saved" });
    expect((await draftOf()).answers.device).toMatchObject({ basalStepUnits: "0.1" });
    expect(asideOf((await draftOf()).answers, "device")).toEqual([]);
    expect(await stepOf()).toBe(100);
  });

  it("refuses a choice among texts that are not all of them any more", async () => {
    const { journalId, ctx, draftOf, input } = await disputed();
    await saveStep(ctx, { journalId, step: "device", rowVersion: 1, ...device, basalStepUnits: "0.2" });
    await expect(chooseText(ctx, input)).rejects.toMatchObject({ code: "STALE" });
    expect(asideOf((await draftOf()).answers, "device")).toHaveLength(3);
  });

  it("refuses a text that is not there, and a word that is no choice", async () => {
    const { ctx, draftOf, input } = await disputed();
    await expect(chooseText(ctx, { ...input, keep: "7" })).rejects.toMatchObject({ code: "NOT_FOUND" });
    await expect(chooseText(ctx, { ...input, keep: "both" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["keep"] })] });
    expect(asideOf((await draftOf()).answers, "device")).toHaveLength(2);
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, draftOf, input } = await disputed();
    await expect(chooseText(await contextFor(db, await createHelper(db, { journalId, ownerId, role })), input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(chooseText(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect((await draftOf()).rowVersion).toBe(input.rowVersion);
  });
});
