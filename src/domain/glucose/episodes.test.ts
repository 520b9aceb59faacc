import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { countEpisodes } from "./episodes";

const of = (...values: (number | null)[]) => countEpisodes({ intervalMinutes: 5, startMs: 0, values });

describe("countEpisodes", () => {
  it("needs three points beyond the threshold to start", () => {
    expect(of(100, 69, 69, 100, 100, 100).low).toBe(0);
    expect(of(100, 69, 69, 69, 100).low).toBe(1);
    expect(of(70, 70, 70, 180, 180, 180)).toMatchObject({ low: 0, high: 0 });
  });

  it("needs three points back to end", () => {
    expect(of(60, 60, 60, 80, 80, 60, 60, 60).low).toBe(1);
    expect(of(60, 60, 60, 80, 80, 80, 60, 60, 60).low).toBe(2);
  });

  it("counts a very low episode as low too, and a very high one as high", () => {
    expect(of(50, 50, 50)).toEqual({ low: 1, veryLow: 1, high: 0, veryHigh: 0, extendedLow: 0 });
    expect(of(260, 260, 260)).toEqual({ low: 0, veryLow: 0, high: 1, veryHigh: 1, extendedLow: 0 });
  });

  it("calls a low extended from 24 five-minute points on", () => {
    expect(of(...Array<number>(23).fill(60)).extendedLow).toBe(0);
    expect(of(...Array<number>(24).fill(60))).toMatchObject({ low: 1, extendedLow: 1 });
  });

  it("ends an episode at a gap", () => {
    expect(of(60, 60, 60, null, 60, 60).low).toBe(1);
    expect(of(60, 60, null, 60).low).toBe(0);
  });

  it("never counts more than one episode per three points", () => {
    fc.assert(fc.property(fc.array(fc.option(fc.integer({ min: 40, max: 400 }))), (values) => {
      const counts = of(...values);
      expect(Math.max(...Object.values(counts))).toBeLessThanOrEqual(values.length / 3);
      expect(counts.extendedLow).toBeLessThanOrEqual(counts.low);
    }));
  });
});
