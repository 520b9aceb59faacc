import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { dailyBasalMilliUnits, exactDailyBasalMilliUnits } from "./basal-total";
import { fraction, fractionOf, toNumber } from "./fraction";

vi.setConfig({ testTimeout: 60_000 });

const basal = (...pairs: [number, number][]) =>
  pairs.map(([startMinute, milliUnitsPerHour]) => ({ startMinute, milliUnitsPerHour }));

describe("a day's basal insulin", () => {
  it("is 24 U for 0.5 until 04:00, 1.5 until 08:00, then 1.0 (Hamilton Health Sciences 2014, read)", () => {
    expect(exactDailyBasalMilliUnits(basal([0, 500], [240, 1500], [480, 1000]))).toEqual(fractionOf(24_000));
  });

  it("is 20.4 U at a flat 0.85 U/h (US diabetes charity, backup plan 2020, read)", () => {
    expect(dailyBasalMilliUnits(basal([0, 850]), "down")).toBe(20_400);
  });

  it("is 21.2 U for 0.6, from 04:00 0.8, from 10:00 1.0 (settings.md 1.4, computed there)", () => {
    expect(dailyBasalMilliUnits(basal([0, 600], [240, 800], [600, 1000]), "nearest")).toBe(21_200);
  });

  it("names the rounding of what a minute leaves over: 25 mU/h for one minute", () => {
    const oneMinute = basal([0, 25], [1, 0]);
    expect(exactDailyBasalMilliUnits(oneMinute)).toEqual(fraction(5n, 12n));
    expect(dailyBasalMilliUnits(oneMinute, "down")).toBe(0);
    expect(dailyBasalMilliUnits(oneMinute, "up")).toBe(1);
    expect(dailyBasalMilliUnits(oneMinute, "nearest")).toBe(0);
  });

  it("is zero for a rate of zero", () => {
    expect(dailyBasalMilliUnits(basal([0, 0]), "up")).toBe(0);
  });

  it("lies between the lowest and the highest rate over 24 hours", () => {
    const starts = fc.uniqueArray(fc.integer({ min: 1, max: 1439 }), { maxLength: 8 });
    fc.assert(
      fc.property(starts, fc.array(fc.nat(5000), { minLength: 9, maxLength: 9 }), (cuts, values) => {
        const blocks = basal(
          ...[0, ...cuts.toSorted((a, b) => a - b)].map((start, i): [number, number] => [start, values[i] ?? 0]),
        );
        const used = blocks.map((block) => block.milliUnitsPerHour);
        const total = toNumber(exactDailyBasalMilliUnits(blocks));
        expect(total).toBeGreaterThanOrEqual(Math.min(...used) * 24);
        expect(total).toBeLessThanOrEqual(Math.max(...used) * 24);
      }),
      { numRuns: 10_000 },
    );
  });
});
