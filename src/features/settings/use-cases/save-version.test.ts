import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { listEvents } from "@/db/repositories/journal-events";
import { listVersions } from "@/db/repositories/versions";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { createVersion } from "@/testing/version-factory";
import type { ChangeSettingInput } from "../schema";
import { changeSetting } from "./change-setting";
import { returnToVersion } from "./return-to-version";
import { withdrawVersion } from "./withdraw-version";

const DAY_MS = 86_400_000;

describe("changing a setting", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function started(gateReasons: string[] = []) {
    const { journalId, ownerId } = await createJournal(db, { gateReasons });
    await createVersion(db, { journalId, authorId: ownerId, number: 1, at: new Date(TEST_NOW.getTime() - 10 * DAY_MS) });
    const input: ChangeSettingInput = {
      journalId, baseVersion: 1, setting: "basal", from: "00:00", to: "04:00", value: "0,55", targetLow: "", targetHigh: "", reason: "pattern-high", reasonText: "",
      expectedOutcome: "mean-glucose", expectedWindow: "night", expectedDirection: "fall", evidenceDays: ["2026-03-07", "2026-03-08", "2026-03-09"], lookAgainOn: "", revertRule: "",
    };
    return { journalId, ownerId, ctx: await contextFor(db, ownerId), input };
  }

  const states = async (journalId: string) => (await listVersions(db, journalId)).map((v) => [v.number, v.state]);

  it("proposes the next number with what is hoped for, and writes one event", async () => {
    const { journalId, ctx, input } = await started();
    expect(await changeSetting(ctx, input)).toEqual({ number: 2, state: "proposed" });
    const [version] = await listVersions(db, journalId);
    expect(version).toMatchObject({
      parentNumber: 1, expectation: { outcome: "mean-glucose", window: "night", direction: "fall" },
      profile: { basal: [{ startMinute: 0, milliUnitsPerHour: 550 }, { startMinute: 240, milliUnitsPerHour: 500 }] },
    });
    expect((await listEvents(db, journalId, 9)).map((e) => e.action)).toEqual(["version.propose"]);
  });

  it("makes one version of a double press", async () => {
    const { journalId, ctx, input } = await started();
    const outcomes = await Promise.allSettled([changeSetting(ctx, input), changeSetting(ctx, input)]);
    expect(outcomes.filter((o) => o.status === "fulfilled")).toHaveLength(1);
    expect(await states(journalId)).toEqual([[2, "proposed"], [1, "in-effect"]]);
  });

  it("asks before a large step, keeps the answer, and then goes on", async () => {
    const { ctx, input } = await started();
    await expect(changeSetting(ctx, { ...input, value: "0.75" })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { "answers.too-big": [expect.stringContaining("50%")] } });
    expect(await changeSetting(ctx, { ...input, value: "0.75", answers: { "too-big": "Agreed with my educator on the phone." } })).toMatchObject({ number: 2 });
  });

  it("blocks a value that the device can’t be set to, beside its field", async () => {
    const { ctx, input } = await started();
    await expect(changeSetting(ctx, { ...input, value: "0.52" })).rejects.toMatchObject({ fields: { value: [expect.stringContaining("0.05")] } });
  });

  it("records without review only where the gate is open, and supersedes the one before", async () => {
    const open = await started();
    expect(await changeSetting(open.ctx, { ...open.input, action: "record" })).toEqual({ number: 2, state: "in-effect" });
    expect(await states(open.journalId)).toEqual([[2, "in-effect"], [1, "superseded"]]);
    const closed = await started(["A first pump."]);
    await expect(changeSetting(closed.ctx, { ...closed.input, action: "record" })).rejects.toMatchObject({ code: "GATE_CLOSED" });
    expect(await states(closed.journalId)).toEqual([[1, "in-effect"]]);
  });

  it("goes back with one press, as a version of its own", async () => {
    const { journalId, ctx, input } = await started();
    await changeSetting(ctx, { ...input, action: "record" });
    expect(await returnToVersion(ctx, { journalId, number: 1 })).toEqual({ number: 3, state: "in-effect" });
    const [back, , first] = await listVersions(db, journalId);
    expect(back?.profile).toEqual(first?.profile);
  });

  it("can be withdrawn while it waits, and stays in the journal", async () => {
    const { journalId, ctx, input } = await started();
    await changeSetting(ctx, input);
    await withdrawVersion(ctx, { journalId, number: 2 });
    expect(await states(journalId)).toEqual([[2, "withdrawn"], [1, "in-effect"]]);
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, input } = await started();
    const helper = await contextFor(db, await createHelper(db, { journalId, ownerId, role }));
    await expect(changeSetting(helper, input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(changeSetting(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await states(journalId)).toEqual([[1, "in-effect"]]);
  });
});
