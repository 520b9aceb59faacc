import { describe, expect, it } from "vitest";
import { percentileProfile, quantile } from "./percentiles";

const day = (n: number, hour: number, glucoseMgDl: number) => ({ atMs: Date.UTC(2026, 2, n, hour), glucoseMgDl });

describe("quantile", () => {
  it("draws a straight line between neighbours, as R type 7: 1..5", () => {
    expect([0.05, 0.25, 0.5, 0.95].map((f) => quantile([1, 2, 3, 4, 5], f))).toEqual([1.2, 2, 3, 4.8]);
    expect(quantile([], 0.5)).toBeNull();
  });
});

describe("percentileProfile", () => {
  const fiveDays = [100, 110, 120, 130, 140].map((value, i) => day(i + 1, 0, value));

  it("needs five days", () => {
    expect(percentileProfile(fiveDays.slice(1), "UTC")).toBeNull();
  });

  it("gathers the surrounding hour across midnight and leaves the rest of the day empty", () => {
    const profile = percentileProfile(fiveDays, "UTC")!;
    expect(profile).toHaveLength(96);
    expect(profile.filter((step) => step.p50 !== null).map((step) => step.minute)).toEqual([0, 15, 30, 1425]);
    expect(profile[0]).toEqual({ minute: 0, p5: 102, p25: 110, p50: 120, p75: 130, p95: 138 });
  });

  it("reads the clocks of the zone", () => {
    expect(percentileProfile(fiveDays, "Europe/Oslo")?.[4]).toMatchObject({ minute: 60, p50: 120 });
  });
});
