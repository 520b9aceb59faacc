import { describe, expect, it } from "vitest";
import { NOMINAL_PARAMETERS as N } from "./parameters";
import { drawPerson } from "./person";
import { seededRandom } from "./random";
import { steadyStateAt } from "./steady-state";

const PEOPLE = Array.from({ length: 3000 }, (_, i) => drawPerson(seededRandom(11, i)));
const median = (values: number[]) => values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)]!;
const sdOf = (values: number[]) => {
  const mean = values.reduce((a, b) => a + b, 0) / values.length;
  return Math.sqrt(values.reduce((a, b) => a + (b - mean) ** 2, 0) / (values.length - 1));
};

describe("drawPerson", () => {
  // comparison.md 5.1: weight N(75, 10) clipped 50-105; sensitivities a common factor .62, .22 times own 1, .15.
  it("draws weights within bounds around the middle", () => {
    const weights = PEOPLE.map(({ bodyWeightKg }) => bodyWeightKg);
    expect(Math.abs(median(weights) - 75)).toBeLessThan(0.7);
    expect(Math.min(...weights)).toBeGreaterThanOrEqual(50);
    expect(Math.max(...weights)).toBeLessThanOrEqual(105);
  });

  it.each(["transportSensitivity", "disposalSensitivity", "liverSensitivity"] as const)("draws %s around .62 of the published value", (name) => {
    const factors = PEOPLE.map((person) => person[name] / N[name]);
    expect(Math.abs(median(factors) - 0.62)).toBeLessThan(0.015);
    expect(Math.abs(sdOf(factors.map(Math.log)) - Math.hypot(0.22, 0.15))).toBeLessThan(0.01);
  });

  it("lets the three sensitivities of a person hang together", () => {
    const [a, b] = [PEOPLE.map((p) => Math.log(p.transportSensitivity)), PEOPLE.map((p) => Math.log(p.liverSensitivity))];
    // Var(a - b) of two own parts of SD .15 each: .15 * sqrt(2).
    expect(Math.abs(sdOf(a.map((value, i) => value - b[i]!)) - 0.15 * Math.SQRT2)).toBeLessThan(0.04);
  });

  it.each([["returnPerMinute", 0.15], ["disposalActivationPerMinute", 0.2], ["glucoseVolumeLPerKg", 0.1], ["mealPeakMinutes", 0.2], ["insulinPeakMinutes", 0.15], ["liverMmolPerKgMinute", 0.1], ["brainMmolPerKgMinute", 0.08]] as const)(
    "spreads %s by %s around the published value", (name, logSd) => {
      const logs = PEOPLE.map((person) => Math.log(person[name] / N[name]));
      expect(Math.abs(median(logs))).toBeLessThan(0.015);
      expect(Math.abs(sdOf(logs) - logSd)).toBeLessThan(0.01);
    },
  );

  it("leaves the rest as published", () => {
    for (const name of ["eliminationPerMinute", "insulinVolumeLPerKg", "absorbedFraction", "sensorPerMinute"] as const) {
      expect(PEOPLE[0]![name]).toBe(N[name]);
    }
  });

  it("draws people who can live on insulin", () => {
    for (const person of PEOPLE.slice(0, 300)) expect(steadyStateAt(person, 6.2).basalUnitsPerHour).toBeGreaterThan(0);
  });
});
