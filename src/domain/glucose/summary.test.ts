import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { toMetricReading } from "./metric-reading";
import { bloodGlucoseRisk, glycemiaRisk } from "./risk";
import { summarise } from "./summary";

const reading = (glucoseMgDl: number, i = 0) => toMetricReading({ atMs: i * 300_000, value: glucoseMgDl, unit: "mg/dL", glucoseMgDl });

describe("summarise", () => {
  it("counts six readings by hand", () => {
    const summary = summarise([69, 70, 100, 150, 180, 181].map(reading));
    expect(summary).toMatchObject({ meanMgDl: 125, veryLowFraction: 0, lowFraction: 1 / 6, inRangeFraction: 4 / 6, highFraction: 1 / 6, veryHighFraction: 0, tightRangeFraction: 2 / 6 });
    expect(summary?.sdMgDl).toBeCloseTo(52.0999, 4);
    expect(summary?.cvFraction).toBeCloseTo(0.4168, 4);
  });

  it.each([[154, 6.99368], [183, 7.68736]])("gives GMI for a mean of %d mg/dL", (mean, gmi) => {
    expect(summarise([reading(mean)])?.gmiPercent).toBeCloseTo(gmi, 10);
  });

  it("bands a reading in the unit it came in: 10.0 mmol/L in range, 7.8 in tight range", () => {
    const mmol = (value: number) => toMetricReading({ atMs: 0, value, unit: "mmol/L", glucoseMgDl: value * 18.0156 });
    expect(summarise([mmol(10.0), mmol(7.8)])).toMatchObject({ inRangeFraction: 1, tightRangeFraction: 0.5 });
  });

  it("has no spread with one reading and nothing without one", () => {
    expect(summarise([reading(100)])).toMatchObject({ meanMgDl: 100, sdMgDl: null, cvFraction: null });
    expect(summarise([])).toBeNull();
  });

  it("puts every reading in one band", () => {
    fc.assert(fc.property(fc.array(fc.double({ min: 20, max: 600, noNaN: true }), { minLength: 1 }), (values) => {
      const s = summarise(values.map(reading))!;
      expect(s.veryLowFraction + s.lowFraction + s.inRangeFraction + s.highFraction + s.veryHighFraction).toBeCloseTo(1, 10);
      expect(s.tightRangeFraction).toBeLessThanOrEqual(s.inRangeFraction);
    }));
  });
});

describe("glycemiaRisk", () => {
  it("adds up 1 % very low, 3 % low, 5 % very high, 20 % high", () => {
    const risk = glycemiaRisk({ veryLowFraction: 0.01, lowFraction: 0.03, veryHighFraction: 0.05, highFraction: 0.2 });
    expect(risk.gri).toBeCloseTo(34.2, 10);
    expect(risk.griZone).toBe("B");
    expect(risk.hypoPercent).toBeCloseTo(3.4, 10);
    expect(risk.hyperPercent).toBeCloseTo(15, 10);
  });

  it("stops at 100, zone E", () => {
    expect(glycemiaRisk({ veryLowFraction: 1, lowFraction: 0, veryHighFraction: 0, highFraction: 0 })).toMatchObject({ gri: 100, griZone: "E" });
  });
});

describe("bloodGlucoseRisk", () => {
  it("is near zero at 112.5 mg/dL and about 22.5 at 50", () => {
    const middle = bloodGlucoseRisk([112.5])!;
    expect(middle.lbgi + middle.hbgi).toBeLessThan(1e-4);
    expect(bloodGlucoseRisk([50])?.lbgi).toBeCloseTo(22.5, 1);
  });
});
