import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { upsertFallbackCard } from "@/db/repositories/fallback-cards";
import { listEvents } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { listVersions, moveVersion } from "@/db/repositories/versions";
import { insertDraft, updateDraft } from "@/db/repositories/wizard-drafts";
import { REFERENCE_DRAFT } from "@/domain/onboarding/draft.fixture";
import type { DraftAnswers } from "@/domain/onboarding/draft";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { RECORDED_TEXT } from "../constants";
import { proposeStart } from "./propose-start";
import { recordStart } from "./record-start";

const ticks = { isKnowing: "on", hasKetoneStrips: "on", hasFastCarbohydrate: "on" } as const;

describe("recordStart", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function drafted(answers: DraftAnswers = REFERENCE_DRAFT, hasCard = true) {
    const { journalId, ownerId } = await createJournal(db, { gateReasons: null });
    await insertDraft(db, { journalId, updatedAt: TEST_NOW, updatedBy: ownerId });
    const rowVersion = (await updateDraft(db, { journalId, answers, rowVersion: 1, updatedAt: TEST_NOW, updatedBy: ownerId }))!;
    if (hasCard) await upsertFallbackCard(db, { journalId, previousSetup: "Pens.", emergencyNumber: "112", contacts: [{ name: "Bo", phone: "1" }], updatedAt: TEST_NOW });
    const untouched = async () => {
      expect(await listVersions(db, journalId)).toEqual([]);
      expect(await findJournal(db, journalId)).toMatchObject({ startedOn: null, gateReasons: null });
      expect(await listEvents(db, journalId, 9)).toEqual([]);
    };
    return { journalId, ownerId, ctx: await contextFor(db, ownerId), untouched, input: { journalId, rowVersion, ...ticks } };
  }

  it("puts version 1 into effect at once, marked as recorded, and makes its day day 1", async () => {
    const { journalId, ctx, input } = await drafted();
    expect(await recordStart(ctx, { ...input, effectiveFrom: "2026-03-09T23:30", note: "No educator near." })).toEqual({ number: 1 });
    const [version] = await listVersions(db, journalId);
    expect(version).toMatchObject({ number: 1, state: "in-effect", kind: "starting", approvedHash: null, reasonText: "No educator near.", effectiveFrom: new Date("2026-03-09T22:30:00Z") });
    expect(version?.guardrails[0]).toMatchObject({ code: "recorded-without-review", text: RECORDED_TEXT });
    expect(await findJournal(db, journalId)).toMatchObject({ startedOn: "2026-03-09", gateReasons: [] });
    expect((await listEvents(db, journalId, 9)).map(({ action }) => action)).toEqual(["version.record"]);
  });

  it("makes one version of a double press", async () => {
    const { journalId, ctx, input } = await drafted();
    const outcomes = await Promise.allSettled([recordStart(ctx, input), recordStart(ctx, input), recordStart(ctx, input)]);
    expect(outcomes.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
    for (const o of outcomes) if (o.status === "rejected") expect(o.reason).toMatchObject({ code: "CONFLICT" });
    expect(await listVersions(db, journalId)).toHaveLength(1);
  });

  it("stays shut while the gate is closed", async () => {
    const { ctx, input, untouched } = await drafted({ ...REFERENCE_DRAFT, gate: { ...REFERENCE_DRAFT.gate, firstEverPump: "not-sure" } });
    await expect(recordStart(ctx, input)).rejects.toMatchObject({ code: "GATE_CLOSED" });
    await untouched();
  });

  it.each(["isKnowing", "hasKetoneStrips", "hasFastCarbohydrate"])("needs the tick %s", async (tick) => {
    const { ctx, input, untouched } = await drafted();
    await expect(recordStart(ctx, { ...input, [tick]: "" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [tick] })] });
    await untouched();
  });

  it("needs the way back and somebody to call, a draft that nobody moved, and a time that has come", async () => {
    const without = await drafted(REFERENCE_DRAFT, false);
    await expect(recordStart(without.ctx, without.input)).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { form: [expect.stringContaining("way back")] } });
    await without.untouched();
    const { ctx, input, untouched } = await drafted();
    await expect(recordStart(ctx, { ...input, rowVersion: input.rowVersion - 1 })).rejects.toMatchObject({ code: "STALE" });
    await expect(recordStart(ctx, { ...input, effectiveFrom: "2026-03-11T08:00" })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { effectiveFrom: [expect.any(String)] } });
    await untouched();
  });

  it("is no way round an educator who sent the proposal back", async () => {
    const { journalId, ctx, input } = await drafted();
    await proposeStart(ctx, { journalId, rowVersion: input.rowVersion });
    await expect(recordStart(ctx, input)).rejects.toMatchObject({ code: "CONFLICT" });
    await moveVersion(db, { journalId, number: 1, from: "proposed", to: "returned", at: TEST_NOW });
    await expect(recordStart(ctx, input)).rejects.toMatchObject({ code: "CONFLICT" });
    expect(await listVersions(db, journalId)).toMatchObject([{ number: 1, state: "returned" }]);
    expect((await findJournal(db, journalId))?.startedOn).toBeNull();
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, input, untouched } = await drafted();
    await expect(recordStart(await contextFor(db, await createHelper(db, { journalId, ownerId, role })), input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(recordStart(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    await untouched();
  });
});
