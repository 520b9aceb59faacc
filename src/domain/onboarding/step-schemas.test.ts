import { describe, expect, it } from "vitest";
import { GATE_QUESTIONS } from "@/domain/settings/gate-questions";
import { stepSchemas } from "./step-schemas";

const mgDl = stepSchemas("mg/dL");
const pathsOf = (result: { success: boolean; error?: { issues: ReadonlyArray<{ path: ReadonlyArray<PropertyKey> }> } }) => (result.error?.issues ?? []).map(({ path }) => path.join("."));

describe("pages of blocks", () => {
  it("reads rows in any order and gives them in the order of the day", () => {
    const read = mgDl.basal.parse({ blocks: [{ from: "09:00", value: "0,5" }, { from: "00:00", value: "0.45 U/h" }, { from: "", value: "" }] });
    expect(read.blocks).toEqual([{ from: 0, value: 0.45 }, { from: 540, value: 0.5 }]);
  });

  it("takes a page without values as left as it was, a start at 00:00 or none", () => {
    expect(mgDl.basal.parse({})).toEqual({ blocks: [] });
    expect(mgDl.basal.parse({ blocks: [{ from: "00:00", value: "" }] })).toEqual({ blocks: [] });
    expect(mgDl.targets.parse({ blocks: [null, { from: "", low: "", high: "" }] })).toEqual({ blocks: [] });
  });

  it.each([
    ["a half-filled row", [{ from: "00:00", value: "1" }, { from: "04:00", value: "" }], ["blocks.1.value"]],
    ["a row without a start", [{ from: "00:00", value: "1" }, { from: "", value: "2" }], ["blocks.1.from"]],
    ["a day that begins late", [{ from: "05:00", value: "1" }, { from: "04:00", value: "2" }], ["blocks.1.from"]],
    ["a start typed twice", [{ from: "00:00", value: "1" }, { from: "04:00", value: "1" }, { from: "4:00", value: "2" }], ["blocks.2.from"]],
    ["a value out of bounds", [{ from: "00:00", value: "11" }], ["blocks.0.value"]],
    ["a row that is no row", ["x"], []],
    ["rows that are no rows", "x", []],
  ])("names the field of %s", (_, blocks, paths) => expect(pathsOf(mgDl.basal.safeParse({ blocks }))).toEqual(paths));

  it("keeps targets the right way up, and glucose within the unit’s own bounds", () => {
    expect(pathsOf(mgDl.targets.safeParse({ blocks: [{ from: "00:00", low: "130", high: "120" }] }))).toEqual(["blocks.0.high"]);
    expect(pathsOf(mgDl.targets.safeParse({ blocks: [{ from: "00:00", low: "6.7", high: "7.2" }] }))).toEqual(["blocks.0.low", "blocks.0.high"]);
    expect(stepSchemas("mmol/L").targets.parse({ blocks: [{ from: "00:00", low: "6,7", high: "7.2" }] }).blocks).toEqual([{ from: 0, low: 6.7, high: 7.2 }]);
    expect(pathsOf(mgDl.sensitivity.safeParse({ blocks: [{ from: "00:00", value: "1" }] }))).toEqual(["blocks.0.value"]);
  });
});

describe("about you", () => {
  const page = { weightKg: "80", ageYears: "41", totalDailyDoseUnits: "40", hypoProne: "no", largestMealBolusUnits: "" };

  it("asks for a daily dose or the totals of days", () => {
    expect(mgDl["about-you"].parse(page).totalDailyDoseUnits).toBe(40);
    expect(mgDl["about-you"].parse({ ...page, totalDailyDoseUnits: "", dailyTotals: "38\n42,0 U" })).toMatchObject({ totalDailyDoseUnits: null, dailyTotals: { days: 2, meanUnits: 40 } });
    expect(pathsOf(mgDl["about-you"].safeParse({ ...page, totalDailyDoseUnits: "" }))).toEqual(["totalDailyDoseUnits"]);
  });

  it("reads working settings a line each and names the box that can’t be read or lies outside", () => {
    expect(mgDl["about-you"].parse({ ...page, workingBasal: "00:00 0,60\n06:00 0.8 U/h" }).workingBasal).toEqual([{ startMinute: 0, value: 0.6 }, { startMinute: 360, value: 0.8 }]);
    expect(pathsOf(mgDl["about-you"].safeParse({ ...page, workingBasal: "six o’clock", workingCarbRatio: "00:00 900" }))).toEqual(["workingBasal", "workingCarbRatio"]);
  });
});

describe("gate, limits and the way back", () => {
  it("needs an answer to each of the twelve questions", () => {
    expect(Object.keys(GATE_QUESTIONS)).toHaveLength(12);
    expect(pathsOf(mgDl.gate.safeParse({ pregnant: "perhaps" })).toSorted()).toEqual(Object.keys(GATE_QUESTIONS).toSorted());
  });

  it("reads features of three kinds and names the row that can’t be read", () => {
    const typed = [{ label: "Pause before lows", kind: "switch", value: "ON" }, { label: "", kind: "text", value: "" }, { label: "Learning weight", kind: "number", value: "0,8" }, { label: "Mode", value: "quiet" }];
    expect(mgDl.limits.parse({ features: typed }).features).toEqual([
      { label: "Pause before lows", kind: "switch", value: true }, { label: "Learning weight", kind: "number", value: 0.8 }, { label: "Mode", kind: "text", value: "quiet" },
    ]);
    expect(pathsOf(mgDl.limits.safeParse({ features: [{ label: "A", kind: "switch", value: "maybe" }, { label: "B", kind: "number", value: "much" }, { label: "", kind: "text", value: "x" }] }))).toEqual([
      "features.0.value", "features.1.value", "features.2.label",
    ]);
    expect(pathsOf(mgDl.limits.safeParse({ features: [{ label: "A", value: "1" }, { label: "A", value: "2" }] }))).toEqual(["features.1.label"]);
  });

  it("needs a way back, a number and somebody to call", () => {
    const card = { previousSetup: "Pens.", longActingUnits: "", emergencyNumber: "112", contacts: [{ name: "Bo", phone: "1" }, { name: "", phone: "" }] };
    expect(mgDl.fallback.parse(card)).toMatchObject({ contacts: [{ name: "Bo", phone: "1" }], longActingUnits: null, rapidUnits: null });
    expect(pathsOf(mgDl.fallback.safeParse({ ...card, previousSetup: " ", emergencyNumber: "", contacts: [] }))).toEqual(["previousSetup", "emergencyNumber", "contacts.0.name"]);
    expect(pathsOf(mgDl.fallback.safeParse({ ...card, contacts: [{ name: "Bo", phone: "" }] }))).toEqual(["contacts.0.phone"]);
  });
});
