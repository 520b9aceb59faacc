import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { upsertFallbackCard } from "@/db/repositories/fallback-cards";
import { listEvents } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { moveVersion } from "@/db/repositories/versions";
import { insertDraft, updateDraft } from "@/db/repositories/wizard-drafts";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import { REFERENCE_DRAFT } from "@/domain/onboarding/draft.fixture";
import type { DraftAnswers } from "@/domain/onboarding/draft";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { planStart } from "./plan-start";
import { proposeStart } from "./propose-start";
import { startJournal } from "./start-journal";

const TODAY = "2026-03-10";
const card = { previousSetup: "Pens.", emergencyNumber: "112", contacts: [{ name: "Bo", phone: "1" }], updatedAt: TEST_NOW };

describe("the start day", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function waiting(given: { state?: VersionState; answers?: DraftAnswers; card?: Partial<typeof card & { longActingMilliUnits: number }> | null } = {}) {
    const { journalId, ownerId } = await createJournal(db, { gateReasons: null });
    const ctx = await contextFor(db, ownerId);
    await insertDraft(db, { journalId, updatedAt: TEST_NOW, updatedBy: ownerId });
    const rowVersion = (await updateDraft(db, { journalId, answers: given.answers ?? REFERENCE_DRAFT, rowVersion: 1, updatedAt: TEST_NOW, updatedBy: ownerId }))!;
    await proposeStart(ctx, { journalId, rowVersion });
    if (given.state !== "proposed") await moveVersion(db, { journalId, number: 1, from: "proposed", to: given.state ?? "approved", at: TEST_NOW });
    if (given.card !== null) await upsertFallbackCard(db, { journalId, ...card, ...given.card });
    const startedOn = async () => (await findJournal(db, journalId))!.startedOn;
    return { journalId, ownerId, ctx, startedOn, input: { journalId, startedOn: TODAY, hasKetoneStrips: "on", hasFastCarbohydrate: "on" } as const };
  }

  it("opens once everything is there, and not twice", async () => {
    const { journalId, ctx, input, startedOn } = await waiting();
    expect(await startJournal(ctx, input)).toEqual({ startedOn: TODAY });
    expect(await startedOn()).toBe(TODAY);
    expect((await listEvents(db, journalId, 9)).filter(({ action }) => action === "journal.start")).toHaveLength(1);
    await expect(startJournal(ctx, { ...input, startedOn: "2026-03-09" })).rejects.toMatchObject({ code: "CONFLICT" });
    expect(await startedOn()).toBe(TODAY);
  });

  it("has one day 1 after two presses at once", async () => {
    const { journalId, ctx, input } = await waiting();
    const outcomes = await Promise.allSettled([startJournal(ctx, input), startJournal(ctx, { ...input, startedOn: "2026-03-09" })]);
    expect(outcomes.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
    expect((await listEvents(db, journalId, 9)).filter(({ action }) => action === "journal.start")).toHaveLength(1);
  });

  const closed: DraftAnswers = { ...REFERENCE_DRAFT, gate: { ...REFERENCE_DRAFT.gate, steroids: "yes" } };
  it.each([
    ["a proposal that waits", { state: "proposed" as const }, "waits for your educator"],
    ["a proposal sent back", { state: "returned" as const }, "came back with remarks"],
    ["no fallback card", { card: null }, "go back to"],
    ["a card without a way back", { card: { previousSetup: "" } }, "go back to"],
    ["nobody to call", { card: { contacts: [] } }, "Nobody who can be called"],
    ["a closed gate without a back-up dose", { answers: closed }, "No back-up dose"],
  ])("stays closed with %s, whatever is posted", async (_, given, sentence) => {
    const { ctx, input, startedOn } = await waiting(given);
    await expect(startJournal(ctx, input)).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { form: expect.arrayContaining([expect.stringContaining(sentence)]) as string[] } });
    expect(await startedOn()).toBeNull();
  });

  it("opens with a closed gate once a back-up dose is written down", async () => {
    const { ctx, input } = await waiting({ answers: closed, card: { longActingMilliUnits: 12_000 } });
    expect(await startJournal(ctx, input)).toEqual({ startedOn: TODAY });
  });

  it.each([["2026-03-11", "lies ahead"], ["2026-02-23", "14 days back"]])("refuses %s as day 1", async (day, sentence) => {
    const { ctx, input, startedOn } = await waiting();
    await expect(startJournal(ctx, { ...input, startedOn: day })).rejects.toMatchObject({ fields: { startedOn: [expect.stringContaining(sentence)] } });
    expect(await startedOn()).toBeNull();
  });

  it.each(["hasKetoneStrips", "hasFastCarbohydrate"])("needs the tick %s", async (tick) => {
    const { ctx, input } = await waiting();
    await expect(startJournal(ctx, { ...input, [tick]: "" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [tick] })] });
  });

  it("plans a day, moves it, clears it, and opens nothing by that", async () => {
    const { journalId, ctx, startedOn } = await waiting({ state: "proposed" });
    await planStart(ctx, { journalId, plannedStartOn: "2026-04-01" });
    expect(await findJournal(db, journalId)).toMatchObject({ plannedStartOn: "2026-04-01", startedOn: null });
    await planStart(ctx, { journalId, plannedStartOn: "" });
    expect(await findJournal(db, journalId)).toMatchObject({ plannedStartOn: null });
    expect(await startedOn()).toBeNull();
    await expect(planStart(ctx, { journalId, plannedStartOn: "soon" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["plannedStartOn"] })] });
  });

  it("plans no day once day 1 has been", async () => {
    const { journalId, ctx, input } = await waiting();
    await startJournal(ctx, input);
    await expect(planStart(ctx, { journalId, plannedStartOn: "2026-04-01" })).rejects.toMatchObject({ code: "CONFLICT" });
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, input, startedOn } = await waiting();
    const helper = await contextFor(db, await createHelper(db, { journalId, ownerId, role }));
    for (const work of [(c: typeof helper) => startJournal(c, input), (c: typeof helper) => planStart(c, { journalId, plannedStartOn: TODAY })]) {
      await expect(work(helper)).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expect(work(await strangerContext(db))).rejects.toMatchObject({ code: "NOT_FOUND" });
    }
    expect(await startedOn()).toBeNull();
  });
});
