import { describe, expect, it } from "vitest";
import { changedSettings } from "./changed-settings";
import { drawLoopSettings, NIGHT_ENDS_SLOT } from "./loop-settings";
import { seededRandom } from "./random";

const IDEAL = { basalUnitsPerHour: 1, sensitivityMmolPerUnit: 2, carbRatioGramsPerUnit: 10 };

describe("drawLoopSettings", () => {
  // comparison.md 5.1: exp N(m, sd) with day basal (-.03, .10), night basal (-.05, .15), ISF (.10, .15), ICR (.22, .22).
  it("errs as people do, on the cautious side", () => {
    const drawn = Array.from({ length: 4000 }, (_, i) => drawLoopSettings(seededRandom(3, i), IDEAL));
    const logs = (of: (index: number) => number) => drawn.map((_, i) => Math.log(of(i)));
    const check = (values: number[], mean: number, sd: number) => {
      const m = values.reduce((a, b) => a + b, 0) / values.length;
      expect(Math.abs(m - mean)).toBeLessThan(0.015);
      expect(Math.abs(Math.sqrt(values.reduce((a, b) => a + (b - m) ** 2, 0) / values.length) - sd)).toBeLessThan(0.01);
    };
    check(logs((i) => drawn[i]!.basalUnitsPerHour[200]!), -0.03, 0.1);
    check(logs((i) => drawn[i]!.basalUnitsPerHour[0]!), -0.05, 0.15);
    check(logs((i) => drawn[i]!.sensitivityMmolPerUnit[0]! / 2), 0.1, 0.15);
    check(logs((i) => drawn[i]!.carbRatioGramsPerUnit[0]! / 10), 0.22, 0.22);
  });

  it("parts night and day at six", () => {
    const { basalUnitsPerHour } = drawLoopSettings(seededRandom(1), IDEAL);
    expect(NIGHT_ENDS_SLOT).toBe(72);
    expect(new Set(basalUnitsPerHour.slice(0, 72)).size).toBe(1);
    expect(new Set(basalUnitsPerHour.slice(72)).size).toBe(1);
    expect(basalUnitsPerHour[71]).not.toBe(basalUnitsPerHour[72]);
  });
});

describe("changedSettings", () => {
  const settings = drawLoopSettings(seededRandom(1), IDEAL);

  it("multiplies what is named, where it holds, and nothing else", () => {
    const changed = changedSettings(settings, { nightBasal: 1.15, breakfastCarbRatio: 0.8 });
    expect(changed.basalUnitsPerHour[71]).toBeCloseTo(settings.basalUnitsPerHour[71]! * 1.15, 12);
    expect(changed.basalUnitsPerHour[72]).toBe(settings.basalUnitsPerHour[72]);
    expect([59, 60, 119, 120].map((slot) => changed.carbRatioGramsPerUnit[slot]! / settings.carbRatioGramsPerUnit[slot]!)).toEqual([1, 0.8, 0.8, 1].map((f): unknown => expect.closeTo(f, 12)));
    expect(changed.sensitivityMmolPerUnit).toEqual(settings.sensitivityMmolPerUnit);
    expect(changed.aimMmol).toBe(settings.aimMmol);
  });

  it("leaves the first settings as they were", () => {
    const before = settings.basalUnitsPerHour.slice();
    changedSettings(settings, { nightBasal: 2, dayBasal: 2, sensitivity: 2, carbRatio: 2 });
    expect(settings.basalUnitsPerHour).toEqual(before);
  });
});
