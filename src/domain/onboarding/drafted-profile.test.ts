import { describe, expect, it } from "vitest";
import { arithmeticOf } from "./arithmetic";
import { draftedProfile } from "./drafted-profile";
import { INJECTIONS, PUMP, PUMP_DRAFT, REFERENCE_DRAFT } from "./draft.fixture";
import { presetOfStep, startOfStep, withoutPreset, type StartFacts } from "./step-start";

const preset = arithmeticOf(REFERENCE_DRAFT, INJECTIONS, false)!.profile!.cautious;
const facts: StartFacts = { preset, unit: "mg/dL", insulin: "rapid", basalStepUnits: 0.05, bolusStepUnits: 0.1 };

describe("draftedProfile", () => {
  it("takes the cautious preset where a page was left, and the person's own edits where it was not", () => {
    const answers = { ...REFERENCE_DRAFT, "carb-ratio": { blocks: [{ from: "11:00", value: "16" }, { from: "00:00", value: "18" }, { from: "05:00", value: "18" }] } };
    expect(draftedProfile(answers, preset, INJECTIONS)).toMatchObject({
      basal: [{ startMinute: 0, milliUnitsPerHour: 500 }],
      carbRatio: [{ startMinute: 0, milligramsPerUnit: 18_000 }, { startMinute: 660, milligramsPerUnit: 16_000 }],
      limits: { maxBolusMilliUnits: 6000, maxBasalMilliUnitsPerHour: null },
    });
  });

  it("keeps a limit empty that the person emptied", () => {
    const answers = { ...REFERENCE_DRAFT, limits: { maxBolusUnits: "", maxBasalUnitsPerHour: "1.2" } };
    expect(draftedProfile(answers, preset, INJECTIONS)?.limits).toEqual({ maxBolusMilliUnits: null, maxBasalMilliUnitsPerHour: 1200, maxInsulinOnBoardMilliUnits: null });
  });

  it("is no profile while a setting has neither", () => {
    expect(draftedProfile(REFERENCE_DRAFT, null, INJECTIONS)).toBeNull();
    expect(draftedProfile({ ...REFERENCE_DRAFT, basal: { blocks: [{ from: "00:00", value: "0.4" }] } }, null, INJECTIONS)).toBeNull();
  });

  it("stores a factor typed in mmol/L without loss", () => {
    const answers = { sensitivity: { blocks: [{ from: "00:00", value: "3,4" }] }, targets: { blocks: [{ from: "00:00", low: "6.7", high: "7.2" }] } };
    const profile = draftedProfile(answers, preset, { ...INJECTIONS, glucoseUnit: "mmol/L" });
    expect(profile?.sensitivity).toEqual([{ startMinute: 0, microMgDlPerUnit: 61_253_040 }]);
    expect(profile?.target).toEqual([{ startMinute: 0, lowMgDl: 121, highMgDl: 130 }]);
  });
});

describe("what a page opens with", () => {
  it("shows a carried-over value to its last digit", () => {
    const carried = arithmeticOf(PUMP_DRAFT, PUMP, false)!.profile!.cautious;
    expect(presetOfStep("basal", { ...facts, preset: carried })).toMatchObject({ "blocks.1.from": "04:00", "blocks.1.value": "0.85", "blocks.2.value": "0.525" });
    expect(presetOfStep("carb-ratio", { ...facts, preset: carried })["blocks.0.value"]).toBe("12.5");
    expect(presetOfStep("sensitivity", { ...facts, preset: carried })["blocks.0.value"]).toBe("42.5");
  });

  it("lets a page that was left as the preset had it follow the preset", () => {
    const kept = withoutPreset("basal", { blocks: [{ from: "00:00", value: "0,5" }] }, facts);
    expect(kept).toEqual({});
    expect(startOfStep("basal", kept, { ...facts, preset: { ...preset, basal: [{ startMinute: 0, unitsPerHour: 0.4 }] } })["blocks.0.value"]).toBe("0.40");
  });

  it("keeps an edit, and an emptied limit, as typed", () => {
    expect(withoutPreset("basal", { blocks: [{ from: "00:00", value: "0.45" }] }, facts)).toEqual({ blocks: [{ from: "00:00", value: "0.45" }] });
    const limits = withoutPreset("limits", { maxBolusUnits: "", maxBasalUnitsPerHour: "", features: [] }, facts);
    expect(limits).toMatchObject({ maxBolusUnits: "" });
    expect(startOfStep("limits", limits, facts).maxBolusUnits).toBe("");
    expect(withoutPreset("limits", { maxBolusUnits: "6,0", maxBasalUnitsPerHour: "" }, facts)).toEqual({ maxBasalUnitsPerHour: "" });
  });

  it("forgets a page of blocks without a value, so that a preset that comes later shows", () => {
    expect(withoutPreset("basal", { blocks: [{ from: "00:00", value: "" }] }, { ...facts, preset: null })).toEqual({});
  });

  it("asks nothing twice: the device page opens with the setup told earlier, then with what was typed", () => {
    expect(startOfStep("device", {}, facts)).toEqual({ insulin: "rapid", basalStepUnits: "0.05", bolusStepUnits: "0.1" });
    expect(startOfStep("device", { basalStepUnits: "0.1", durationOfActionHours: "4" }, facts)).toEqual({ insulin: "rapid", basalStepUnits: "0.1", bolusStepUnits: "0.1", durationOfActionHours: "4" });
  });
});
