import { describe, expect, it } from "vitest";
import { DEMO_PROFILES } from "./demo-profiles";
import { programmedProfile } from "./programmed-profile";

describe("programmedProfile", () => {
  it("lays a stored profile out by the slot in the loop's units", () => {
    const { basalUnitsPerHour, carbRatioGramsPerUnit, sensitivityMmolPerUnit, aimMmol } = programmedProfile(DEMO_PROFILES.afternoon50);
    expect([0, 47, 48, 287].map((slot) => basalUnitsPerHour[slot])).toEqual([0.55, 0.55, 0.5, 0.5]);
    expect([59, 60, 119, 120].map((slot) => carbRatioGramsPerUnit[slot])).toEqual([17, 15, 15, 17]);
    expect([143, 144, 215, 216].map((slot) => sensitivityMmolPerUnit[slot]! * 18.0156)).toEqual([60, 50, 50, 60].map((v): unknown => expect.closeTo(v, 9)));
    expect(aimMmol * 18.0156).toBeCloseTo(125, 9);
  });

  it("lets a block that starts inside a slot begin with the next", () => {
    const basal = [{ startMinute: 0, milliUnitsPerHour: 400 }, { startMinute: 7, milliUnitsPerHour: 600 }];
    expect([...programmedProfile({ ...DEMO_PROFILES.start, basal }).basalUnitsPerHour.slice(0, 3)]).toEqual([0.4, 0.4, 0.6]);
  });
});
