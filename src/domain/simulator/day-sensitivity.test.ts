import { describe, expect, it } from "vitest";
import { correlatedRow, drawSensitivity } from "./day-sensitivity";
import { seededRandom } from "./random";

const lag1 = (row: ArrayLike<number>) => {
  const values = Array.from(row);
  const mean = values.reduce((a, b) => a + b, 0) / values.length;
  const variance = values.reduce((a, b) => a + (b - mean) ** 2, 0) / values.length;
  const product = values.slice(1).reduce((a, b, i) => a + (b - mean) * (values[i]! - mean), 0) / values.length;
  return { sd: Math.sqrt(variance), lag1: product / variance };
};

describe("correlatedRow", () => {
  it.each([[0.3, 0.16], [0.9, 0.07], [0, 0.24]])("leans on the value before by %s with a spread of %s", (correlation, sd) => {
    const found = lag1(correlatedRow(seededRandom(5), 60_000, correlation, sd));
    expect(Math.abs(found.lag1 - correlation)).toBeLessThan(0.02);
    expect(Math.abs(found.sd / sd - 1)).toBeLessThan(0.03);
  });

  it("has its full spread from the first value on", () => {
    const firsts = Array.from({ length: 5000 }, (_, i) => correlatedRow(seededRandom(2, i), 1, 0.93, 0.08)[0]!);
    expect(Math.abs(lag1(firsts).sd / 0.08 - 1)).toBeLessThan(0.04);
  });
});

describe("drawSensitivity", () => {
  const days = 4000;
  const factors = drawSensitivity(seededRandom(9), days);
  const atMinute = (minute: number) => Float64Array.from({ length: days }, (_, day) => Math.log(factors[day * 288 + minute / 5]!));

  // comparison.md 5.1: s = exp(a + b), nights exp(a/2 + b + N(0, .24)).
  it("varies from day to day and more from night to night", () => {
    expect(Math.abs(lag1(atMinute(720)).sd - Math.hypot(0.16, 0.08))).toBeLessThan(0.01);
    expect(Math.abs(lag1(atMinute(120)).sd - Math.hypot(0.08, 0.08, 0.24))).toBeLessThan(0.015);
    // Lag 1 of the sum: (.3 * .16^2 + .93 * .08^2) / (.16^2 + .08^2) = .426.
    expect(Math.abs(lag1(atMinute(720)).lag1 - 0.426)).toBeLessThan(0.05);
  });

  it("is a tenth less from half past four to nine, and steps at midnight and six", () => {
    const day = factors.slice(288, 576);
    expect(day[54]! / day[53]!).toBeCloseTo(0.9, 12);
    expect(day[108]! / day[107]!).toBeCloseTo(1 / 0.9, 12);
    expect(new Set(day.slice(0, 54)).size).toBe(1);
    expect(new Set(day.slice(108)).size).toBe(1);
  });
});
