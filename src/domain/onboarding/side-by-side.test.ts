import { describe, expect, it } from "vitest";
import { profileFromApi } from "@/domain/settings/profile-api";
import { arithmeticOf } from "./arithmetic";
import { draftedProfile } from "./drafted-profile";
import { INJECTIONS, PUMP, PUMP_DRAFT, REFERENCE_DRAFT } from "./draft.fixture";
import { basalDayText, sideBySide } from "./side-by-side";

describe("sideBySide", () => {
  it("lays the arithmetic beside the start, from injections", () => {
    const arithmetic = arithmeticOf(REFERENCE_DRAFT, INJECTIONS, false)!;
    const start = draftedProfile(REFERENCE_DRAFT, arithmetic.profile!.cautious, INJECTIONS)!;
    // 0.5833 to 0.50 is 14% less basal; 14.29 to 17 is 19% more grams; 51.43 to 60 is 17% more.
    expect(sideBySide(start, null, arithmetic, "mg/dL")).toEqual([
      { name: "basal rate", fromMinute: 0, toMinute: 1440, now: null, arithmetic: "0.583 U/h", start: "0.50 U/h", against: "14% weaker" },
      { name: "carb ratio", fromMinute: 0, toMinute: 1440, now: null, arithmetic: "14.3 g/U", start: "17 g/U", against: "19% weaker" },
      { name: "sensitivity factor", fromMinute: 0, toMinute: 1440, now: null, arithmetic: "51 mg/dL per U", start: "60 mg/dL per U", against: "17% weaker" },
    ]);
    expect(basalDayText(start.basal)).toBe("12.0 U");
  });

  it("shows each block of either profile, from a pump", () => {
    const arithmetic = arithmeticOf(PUMP_DRAFT, PUMP, false)!;
    const now = profileFromApi(arithmetic.profile!.cautious);
    const start = { ...now, basal: [{ startMinute: 0, milliUnitsPerHour: 500 }, { startMinute: 360, milliUnitsPerHour: 700 }] };
    const rows = sideBySide(start, now, arithmetic, "mg/dL").filter(({ name }) => name === "basal rate");
    expect(rows.map(({ fromMinute, toMinute, now: present, start: careful }) => [fromMinute, toMinute, present, careful])).toEqual([
      [0, 240, "0.60 U/h", "0.50 U/h"], [240, 360, "0.85 U/h", "0.50 U/h"], [360, 540, "0.85 U/h", "0.70 U/h"], [540, 1440, "0.525 U/h", "0.70 U/h"],
    ]);
  });

  it("says nothing of an arithmetic that may not be shown", () => {
    const start = draftedProfile(PUMP_DRAFT, arithmeticOf(PUMP_DRAFT, PUMP, false)!.profile!.cautious, PUMP)!;
    expect(sideBySide(start, null, null, "mg/dL").every(({ arithmetic, against }) => arithmetic === null && against === null)).toBe(true);
  });
});
