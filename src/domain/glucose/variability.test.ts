import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Grid } from "./grid";
import { toGrid } from "./grid";
import { meanAmplitude } from "./mage";
import { conga, meanOfDailyDifferences } from "./variability";

const hourly = (values: (number | null)[]): Grid => ({ intervalMinutes: 60, startMs: 0, values });
const flatDays = (...days: number[]) => days.flatMap((mgDl) => Array<number>(24).fill(mgDl));
/** Twelve hours of five-minute steps each, alternating. */
const square = (...levels: number[]): Grid => ({ intervalMinutes: 5, startMs: 0, values: levels.flatMap((v) => Array<number>(144).fill(v)) });

describe("toGrid", () => {
  const at = (minute: number, glucoseMgDl: number) => ({ atMs: Date.UTC(2026, 2, 1, 0, minute), glucoseMgDl });

  it("draws a line between neighbours and nothing across more than 45 minutes", () => {
    const grid = toGrid([at(2, 100), at(7, 110), at(12, 120), at(57, 165), at(103, 90), at(108, 95)], "UTC");
    expect(grid?.intervalMinutes).toBe(5);
    expect(grid?.values.slice(0, 4)).toEqual([null, 106, 116, 123]);
    expect(grid?.values.slice(11, 22)).toEqual([163, ...Array<null>(9).fill(null), 92]);
  });

  it("needs two instants", () => {
    expect(toGrid([at(1, 100), at(1, 120)], "UTC")).toBeNull();
  });
});

describe("differences a day apart", () => {
  it("counts three flat days of 100, 120, 110 by hand", () => {
    const grid = hourly(flatDays(100, 120, 110));
    expect(meanOfDailyDifferences(grid)).toBe(15);
    // 24 differences of +20 and 24 of -10: mean 5, each 15 away, n - 1 = 47.
    expect(conga(grid)).toBeCloseTo(Math.sqrt((48 * 225) / 47), 10);
  });

  it("has none within one day, and leaves out pairs with a gap", () => {
    expect(meanOfDailyDifferences(hourly(flatDays(100)))).toBeNull();
    expect(conga(hourly(flatDays(100)))).toBeNull();
    expect(meanOfDailyDifferences(hourly([null, ...Array<number>(23).fill(100), 500, 110]))).toBe(10);
  });

  it("does not move when every value rises by the same", () => {
    fc.assert(fc.property(fc.array(fc.integer({ min: 40, max: 300 }), { minLength: 50, maxLength: 100 }), (values) => {
      expect(conga(hourly(values.map((v) => v + 50)))).toBeCloseTo(conga(hourly(values))!, 8);
    }));
  });
});

describe("meanAmplitude", () => {
  it("is the height of a square wave", () => {
    expect(meanAmplitude(square(100, 200, 100, 200, 100))).toBe(100);
  });

  it("has no swing in a flat trace and no figure below 32 points", () => {
    expect(meanAmplitude(square(100, 100))).toBeNull();
    expect(meanAmplitude({ intervalMinutes: 5, startMs: 0, values: [100, 200, 100, 200] })).toBeNull();
  });

  it("joins nothing across a gap longer than three hours", () => {
    const half = square(100, 200).values;
    const apart = (steps: number) => meanAmplitude({ intervalMinutes: 5, startMs: 0, values: [...half, ...Array<null>(steps).fill(null), ...square(50, 150).values] });
    expect(apart(37)).toBe(100);
    expect(apart(20)).toBe(125);
  });
});
