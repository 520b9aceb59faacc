import { describe, expect, it } from "vitest";
import { profileFromApi } from "@/domain/settings/profile-api";
import { arithmeticOf } from "./arithmetic";
import { checkFactsOf } from "./check-facts";
import { INJECTIONS, REFERENCE_DRAFT } from "./draft.fixture";
import { pageChecks } from "./page-checks";

const arithmetic = arithmeticOf(REFERENCE_DRAFT, INJECTIONS, false)!;
const cautious = profileFromApi(arithmetic.profile!.cautious);
const facts = checkFactsOf(REFERENCE_DRAFT, INJECTIONS, arithmetic.totalDailyDose.cautious);

describe("checkFactsOf", () => {
  it("hands on what the person told", () => {
    expect(facts).toEqual({ totalDailyDoseUnits: 30, weightKg: 80, basalStepMilliUnits: 50, bolusStepMilliUnits: 50, largestRecentBolusMilliUnits: 6030 });
    expect(checkFactsOf({}, INJECTIONS, null)).toMatchObject({ totalDailyDoseUnits: null, weightKg: null, largestRecentBolusMilliUnits: null });
  });
});

describe("pageChecks", () => {
  it("says of the cautious start that it is one", () => {
    expect(pageChecks("basal", cautious, facts, cautious)).toEqual(["Covers 24 hours without a gap.", "Every rate is on the device's step of 0.05 U/h.", "Basal is the cautious start."]);
    expect(pageChecks("carb-ratio", cautious, facts, cautious)).toEqual(["Covers 24 hours without a gap.", "The ratio is the cautious start."]);
  });

  it("says where an edit is stronger, weaker, or off the device's step", () => {
    const edited = { ...cautious, basal: [{ startMinute: 0, milliUnitsPerHour: 450 }, { startMinute: 300, milliUnitsPerHour: 620 }] };
    const said = pageChecks("basal", edited, facts, cautious).join(" ");
    expect(said).toContain("From 05:00".toLowerCase());
    expect(said).toContain("stronger than the cautious start in one part of the day and weaker in another");
    expect(said).not.toContain("Every rate");
    expect(pageChecks("carb-ratio", edited, facts, cautious).at(-1)).toBe("The ratio is the cautious start.");
  });

  it("says nothing on pages that set nothing, and compares with nothing while the gate is closed", () => {
    expect(pageChecks("gate", cautious, facts, cautious)).toEqual([]);
    expect(pageChecks("targets", cautious, facts, null)).toEqual(["Covers 24 hours without a gap."]);
  });
});
