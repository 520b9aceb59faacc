import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { insertDayFlag } from "@/db/repositories/entries";
import { listEvents } from "@/db/repositories/journal-events";
import { listVersions } from "@/db/repositories/versions";
import { dayNumberOf } from "@/domain/day-start";
import { exampleProfile } from "@/domain/settings/profile.fixture";
import { anonymousContext, contextFor, createJournal, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { createVersion } from "@/testing/version-factory";
import type { ChangeSettingInput, SaveVersionInput } from "../schema";
import { changeSetting } from "./change-setting";
import { saveVersion } from "./save-version";

const TEN_DAYS_AGO = new Date(TEST_NOW.getTime() - 10 * 86_400_000);

describe("a change that is refused", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function started() {
    const { journalId, ownerId } = await createJournal(db);
    await createVersion(db, { journalId, authorId: ownerId, number: 1, at: TEN_DAYS_AGO, basalMilliUnitsPerHour: 500 });
    const form: ChangeSettingInput = {
      journalId, baseVersion: 1, setting: "basal", from: "00:00", to: "04:00", value: "0.55", targetLow: "", targetHigh: "", reason: "pattern-high", reasonText: "",
      expectedOutcome: "lows", expectedWindow: "night", expectedDirection: "fall", evidenceDays: ["2026-03-07", "2026-03-08", "2026-03-09"], lookAgainOn: "", revertRule: "",
    };
    const whole: SaveVersionInput = {
      journalId, baseVersion: 1, profile: exampleProfile({ basal: [{ startMinute: 0, milliUnitsPerHour: 450 }] }), reason: { code: "educator-said", text: "" },
      expectation: null, evidenceDays: [], action: "record",
    };
    return { journalId, ownerId, form, whole, ctx: await contextFor(db, ownerId) };
  }

  async function expectUntouched(journalId: string) {
    expect((await listVersions(db, journalId)).map((v) => [v.number, v.state])).toEqual([[1, "in-effect"]]);
    expect(await listEvents(db, journalId, 9)).toEqual([]);
  }

  it.each([
    ["setting", { setting: "luck" as never }],
    ["from", { from: "noon" }],
    ["to", { from: "05:00", to: "04:00" }],
    ["value", { value: "" }],
    ["value", { value: "1,234" }],
    ["targetLow", { setting: "target" as const, targetHigh: "130" }],
    ["targetHigh", { setting: "target" as const, targetLow: "120" }],
    ["reason", { reason: "mood" as never }],
    ["reasonText", { reason: "other" as const, reasonText: " " }],
    ["evidenceDays.0", { evidenceDays: ["yesterday"] }],
    ["lookAgainOn", { lookAgainOn: "soon" }],
  ])("names %s where it is amiss (%j)", async (field, wrong) => {
    const { journalId, ctx, form } = await started();
    const error: unknown = await changeSetting(ctx, { ...form, ...wrong }).then(() => null, (reason: unknown) => reason);
    expect((error as { issues: { path: (string | number)[] }[] }).issues.map((i) => i.path.join("."))).toContain(field);
    await expectUntouched(journalId);
  });

  it("names the value where nothing would differ", async () => {
    const { journalId, ctx, form } = await started();
    await expect(changeSetting(ctx, { ...form, value: "0.5" })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { value: [expect.stringContaining("already")] } });
    await expectUntouched(journalId);
  });

  it("asks for a pattern of days", async () => {
    const { journalId, ctx, form } = await started();
    await expect(changeSetting(ctx, { ...form, evidenceDays: ["2026-03-09"] })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { "answers.no-pattern": [expect.any(String)] } });
    await expectUntouched(journalId);
  });

  it("mentions flagged days without holding the change up", async () => {
    const { journalId, ownerId, ctx, form } = await started();
    const day = dayNumberOf("2026-03-10"); // a fever leaves out the day before it, too
    await insertDayFlag(db, { journalId, code: "illness-fever", firstDay: day, lastDay: day, strength: 2, note: "", isGraphSeen: false, setBy: ownerId, setAt: TEST_NOW });
    await changeSetting(ctx, form);
    const [version] = await listVersions(db, journalId);
    expect(version?.guardrails.map((g) => [g.code, g.severity])).toEqual([["flagged-days", "informs"]]);
  });

  it("starts from the version in effect only, and from one that is there", async () => {
    const { journalId, ctx, form, whole } = await started();
    for (const save of [(baseVersion: number) => changeSetting(ctx, { ...form, baseVersion }), (baseVersion: number) => saveVersion(ctx, { ...whole, baseVersion })]) {
      await expect(save(9)).rejects.toMatchObject({ code: "NOT_FOUND" });
    }
    await expectUntouched(journalId);
    await saveVersion(ctx, whole);
    await expect(saveVersion(ctx, whole)).rejects.toMatchObject({ code: "CONFLICT" });
    expect((await listVersions(db, journalId)).map((v) => [v.number, v.state])).toEqual([[2, "in-effect"], [1, "superseded"]]);
  });

  it("refuses a whole profile that holds nothing new, and whoever is signed out", async () => {
    const { journalId, ctx, whole } = await started();
    const same = exampleProfile({ basal: [{ startMinute: 0, milliUnitsPerHour: 500 }] });
    await expect(saveVersion(ctx, { ...whole, profile: same })).rejects.toMatchObject({ code: "CONFLICT" });
    await expect(saveVersion(anonymousContext(db), whole)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    await expectUntouched(journalId);
  });

  it("numbers without a gap and keeps one in effect while twenty record at once", async () => {
    const { journalId, ctx, whole } = await started();
    const sends = await Promise.allSettled(Array.from({ length: 20 }, () => saveVersion(ctx, whole)));
    expect(sends.filter((s) => s.status === "fulfilled")).toHaveLength(1);
    for (const s of sends) if (s.status === "rejected") expect(s.reason).toMatchObject({ code: "CONFLICT" });
    expect((await listVersions(db, journalId)).map((v) => [v.number, v.state])).toEqual([[2, "in-effect"], [1, "superseded"]]);
    expect((await listEvents(db, journalId, 9)).map((e) => e.action)).toEqual(["version.record"]);
  });
});
