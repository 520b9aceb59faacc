import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { withMargin } from "./margin";

/** Standard figures of settings.md 3.2 (computed): TDD 35, 14 U of basal, 500 / 35, 1800 / 35. */
const plain = { unitsPerHour: 14 / 24, gramsPerUnit: 500 / 35, mgDlPerUnit: 1800 / 35 };
const steps = { basalUnits: 0.05 };

describe("withMargin", () => {
  it("rounds the plain arithmetic to its weaker side, as settings.md 3.2 does", () => {
    expect(withMargin(plain, 0, steps, "mg/dL")).toEqual({ marginPercent: 0, unitsPerHour: 0.55, unitsPerDay: 13.2, gramsPerUnit: 15, sensitivity: 52 });
    expect(withMargin(plain, 0, steps, "mmol/L").sensitivity).toBe(2.9);
  });

  it("makes all of it weaker by 20%, by hand: 0.4667 U/h, 17.86 g/U, 64.29 mg/dL", () => {
    expect(withMargin(plain, 20, steps, "mg/dL")).toMatchObject({ unitsPerHour: 0.45, gramsPerUnit: 18, sensitivity: 65 });
  });

  it("is never stronger with a larger margin, nor stronger than exact", () => {
    const amount = (max: number) => fc.integer({ min: 1, max: max * 1000 }).map((n) => n / 1000);
    fc.assert(
      fc.property(amount(3), amount(100), amount(300), fc.integer({ min: 0, max: 60 }), fc.integer({ min: 0, max: 30 }), (unitsPerHour, gramsPerUnit, mgDlPerUnit, margin, more) => {
        const given = { unitsPerHour, gramsPerUnit, mgDlPerUnit };
        const [less, greater] = [withMargin(given, margin, steps, "mg/dL"), withMargin(given, margin + more, steps, "mg/dL")];
        expect(greater.unitsPerHour).toBeLessThanOrEqual(less.unitsPerHour);
        expect(greater.gramsPerUnit).toBeGreaterThanOrEqual(less.gramsPerUnit);
        expect(greater.sensitivity).toBeGreaterThanOrEqual(less.sensitivity);
        expect(less.unitsPerHour).toBeLessThanOrEqual(unitsPerHour + 1e-9);
        expect(less.gramsPerUnit).toBeGreaterThanOrEqual(gramsPerUnit - 1e-9);
      }),
      { numRuns: 2000 },
    );
  });
});
