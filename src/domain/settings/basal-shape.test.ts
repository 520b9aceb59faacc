import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { EARLY_MORNING_SHAPE, FLAT_SHAPE, spreadDailyBasal } from "./basal-shape";
import { exactDailyBasalMilliUnits } from "./basal-total";
import { compare, fractionOf, times } from "./fraction";
import { scheduleFault } from "./schedule";

vi.setConfig({ testTimeout: 60_000 });

describe("spreading a day's basal insulin", () => {
  it.each([
    [12, 50, 500],
    [14, 50, 550],
    [14, 25, 575],
    [14, 1, 583],
    [13.1, 50, 500],
    [13.2, 50, 550],
  ])("%s U flat on a step of %s mU/h is %s mU/h", (units, step, expected) => {
    expect(spreadDailyBasal(fractionOf(units), FLAT_SHAPE, step)).toEqual([
      { startMinute: 0, milliUnitsPerHour: expected },
    ]);
  });

  it("brings the published three blocks back to 24 hours: 24.2 U there are 24.2 U here", () => {
    // h = 1 U/h: as printed 4 x 0.8 + 5 x 1.2 + 15 x 1 = 24.2 U (settings.md 1.4, computed there).
    const blocks = spreadDailyBasal(fractionOf(24.2), EARLY_MORNING_SHAPE.shape, 1);
    expect(blocks).toEqual([
      { startMinute: 0, milliUnitsPerHour: 800 },
      { startMinute: 240, milliUnitsPerHour: 1200 },
      { startMinute: 540, milliUnitsPerHour: 1000 },
    ]);
    expect(exactDailyBasalMilliUnits(blocks)).toEqual(fractionOf(24_200));
  });

  it("refuses a step of zero", () => {
    expect(() => spreadDailyBasal(fractionOf(12), FLAT_SHAPE, 0)).toThrow(
      expect.objectContaining({ code: "INVALID_RANGE" }),
    );
  });

  it("covers the day and never sums to more than what was spread", () => {
    const shape = fc
      .tuple(fc.uniqueArray(fc.integer({ min: 1, max: 1439 }), { maxLength: 6 }), fc.array(fc.integer({ min: 1, max: 20 }), { minLength: 7, maxLength: 7 }))
      .map(([cuts, weights]) =>
        [0, ...cuts.toSorted((a, b) => a - b)].map((startMinute, i) => ({ startMinute, weight: (weights[i] ?? 1) / 10 })),
      );
    const dailyMilliUnits = fc.integer({ min: 1000, max: 60_000 });
    fc.assert(
      fc.property(shape, dailyMilliUnits, fc.constantFrom(1, 5, 10, 25, 50, 100), (weights, milliUnits, step) => {
        const daily = fractionOf(milliUnits / 1000);
        const blocks = spreadDailyBasal(daily, weights, step);
        expect(scheduleFault(blocks)).toBeNull();
        expect(blocks.every(({ milliUnitsPerHour }) => milliUnitsPerHour % step === 0)).toBe(true);
        expect(compare(exactDailyBasalMilliUnits(blocks), times(daily, fractionOf(1000)))).toBeLessThanOrEqual(0);
      }),
      { numRuns: 10_000 },
    );
  });
});
