import { describe, expect, it } from "vitest";
import { defaultExpectation } from "./default-expectation";
import { profileDifference } from "./difference";
import { expectationSchema } from "./expectation";
import type { SettingsProfile } from "./profile";
import { EXAMPLE_PROFILE, exampleProfile } from "./profile.fixture";
import { changeSpan } from "./schedule-edit";

const offered = (parts: Partial<SettingsProfile>) =>
  defaultExpectation(profileDifference(EXAMPLE_PROFILE, exampleProfile(parts)));
const rate = (from: number, to: number, milliUnitsPerHour: number) => ({
  basal: changeSpan(EXAMPLE_PROFILE.basal, from, to, (block) => ({ ...block, milliUnitsPerHour })),
});
const ratio = (from: number, to: number, milligramsPerUnit: number) => ({
  carbRatio: changeSpan(EXAMPLE_PROFILE.carbRatio, from, to, (block) => ({ ...block, milligramsPerUnit })),
});
const factor = (microMgDlPerUnit: number) => ({ sensitivity: [{ startMinute: 0, microMgDlPerUnit }] });

describe("an expectation", () => {
  it("is an outcome, a window and a direction", () => {
    const stated = { outcome: "lows", window: "night", direction: "fall" };
    expect(expectationSchema.parse(stated)).toEqual(stated);
  });

  it.each([
    [{ outcome: "weight" }, "outcome"],
    [{ window: "morning" }, "window"],
    [{ direction: "improve" }, "direction"],
    [{ window: "own" }, "ownPart"],
    [{ ownPart: { fromMinute: 0, toMinute: 60 } }, "ownPart"],
    [{ window: "own", ownPart: { fromMinute: 60, toMinute: 60 } }, "ownPart.toMinute"],
    [{ window: "own", ownPart: { fromMinute: 1440, toMinute: 60 } }, "ownPart.fromMinute"],
  ])("is refused with %j", (parts, path) => {
    const stated = { outcome: "lows", window: "night", direction: "fall", ...parts };
    const result = expectationSchema.safeParse(stated);
    expect(result.error?.issues.map((issue) => issue.path.join("."))).toEqual([path]);
  });

  it("may name a part of the day of its own, over midnight too", () => {
    const stated = { outcome: "lows", window: "own", direction: "same", ownPart: { fromMinute: 1320, toMinute: 120 } };
    expect(expectationSchema.parse(stated)).toEqual(stated);
  });
});

describe("the expectation offered first", () => {
  it.each([
    ["more basal at night", rate(0, 240, 550), "mean-glucose", "night", "fall"],
    ["more basal at night and in the day", rate(0, 600, 750), "time-in-range", "whole-day", "rise"],
    ["less basal at night", rate(0, 240, 450), "lows", "night", "fall"],
    ["more for breakfast", ratio(300, 600, 14_000), "rise-after-meals", "after-breakfast", "fall"],
    ["less for breakfast", ratio(300, 600, 17_000), "lows", "after-breakfast", "fall"],
    ["more for lunch", ratio(660, 840, 14_000), "rise-after-meals", "after-lunch", "fall"],
    ["more for dinner", ratio(1020, 1260, 14_000), "rise-after-meals", "after-dinner", "fall"],
    ["more for every meal", ratio(0, 1440, 14_000), "time-in-range", "whole-day", "rise"],
    ["stronger corrections", factor(50_000_000), "fall-after-correction", "after-corrections", "rise"],
    ["weaker corrections", factor(70_000_000), "lows", "after-corrections", "fall"],
    ["a shorter duration", { durationOfActionMinutes: 200 }, "time-in-range", "whole-day", "rise"],
    ["a switch", { features: [] }, "time-in-range", "whole-day", "rise"],
    ["two families", { ...rate(0, 240, 550), ...factor(50_000_000) }, "time-in-range", "whole-day", "rise"],
  ])("%s", (_what, parts, outcome, window, direction) => {
    const expectation = offered(parts);
    expect(expectation).toEqual({ outcome, window, direction });
    expect(expectationSchema.parse(expectation)).toEqual(expectation);
  });

  it("is none where nothing changed", () => {
    expect(offered({})).toBeNull();
  });
});
