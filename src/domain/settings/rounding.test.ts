import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { SETTING_FAMILIES, FAMILY_FACTS } from "./family";
import { compare, fraction, fractionOf, over, toNumber } from "./fraction";
import { publishedRounding, roundToStep, weakerRounding, type RoundingDirection } from "./rounding";

vi.setConfig({ testTimeout: 60_000 });

const at = (value: number, direction: RoundingDirection, step: number) =>
  toNumber(roundToStep(fractionOf(value), { direction, step: fractionOf(step) }));

describe("roundToStep", () => {
  it.each([
    [0.5833, "down", 0.05, 0.55],
    [0.5833, "up", 0.05, 0.6],
    [0.5833, "nearest", 0.05, 0.6],
    [0.575, "nearest", 0.05, 0.6],
    [0.574, "nearest", 0.05, 0.55],
    [0.55, "down", 0.05, 0.55],
    [0.55, "up", 0.05, 0.55],
    [0.55, "nearest", 0.05, 0.55],
    [0.3, "up", 0.1, 0.3],
    [16.67, "up", 1, 17],
    [0, "up", 1, 0],
    [-1.2, "down", 1, -2],
    [-1.2, "up", 1, -1],
    [-1.5, "nearest", 1, -1],
  ] as const)("%s %s to steps of %s is %s", (value, direction, step, expected) => {
    expect(at(value, direction, step)).toBe(expected);
  });

  it.each([0, -0.05])("refuses a step of %s", (step) => {
    expect(() => at(1, "down", step)).toThrow(expect.objectContaining({ code: "INVALID_RANGE" }));
  });

  it("never moves by a whole step, and always lands on one", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: -100_000, max: 100_000 }),
        fc.integer({ min: 1, max: 997 }),
        fc.integer({ min: 1, max: 500 }),
        fc.constantFrom<RoundingDirection>("down", "up", "nearest"),
        (numerator, denominator, stepThousandths, direction) => {
          const value = fraction(BigInt(numerator), BigInt(denominator));
          const step = fraction(BigInt(stepThousandths), 1000n);
          const rounded = roundToStep(value, { direction, step });
          expect(over(rounded, step).denominator).toBe(1n);
          expect(Math.abs(toNumber(rounded) - toNumber(value))).toBeLessThan(toNumber(step));
          if (direction === "down") expect(compare(rounded, value)).toBeLessThanOrEqual(0);
          if (direction === "up") expect(compare(rounded, value)).toBeGreaterThanOrEqual(0);
        },
      ),
      { numRuns: 10_000 },
    );
  });
});

describe("weakerRounding", () => {
  it("goes down where more means more insulin, up where more means less", () => {
    const directions = Object.fromEntries(
      SETTING_FAMILIES.filter((family) => family !== "features").map((family) => [
        family,
        weakerRounding(family, fractionOf(1)).direction,
      ]),
    );
    expect(directions).toEqual({
      basal: "down",
      limits: "down",
      carbRatio: "up",
      sensitivity: "up",
      target: "up",
      durationOfAction: "up",
    });
  });

  it("has no answer for the device's own features", () => {
    expect(FAMILY_FACTS.features.strongerWhen).toBe("unknown");
    expect(() => weakerRounding("features", fractionOf(1))).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
  });

  it("is never stronger than the exact value, in any family", () => {
    fc.assert(
      fc.property(
        fc.constantFrom("basal", "limits", "carbRatio", "sensitivity", "target", "durationOfAction" as const),
        fc.integer({ min: 1, max: 100_000 }),
        fc.integer({ min: 1, max: 997 }),
        fc.constantFrom(0.001, 0.01, 0.025, 0.05, 0.1, 1, 5),
        (family, numerator, denominator, step) => {
          const exact = fraction(BigInt(numerator), BigInt(denominator));
          const rounded = roundToStep(exact, weakerRounding(family, fractionOf(step)));
          const isStronger =
            FAMILY_FACTS[family].strongerWhen === "higher" ? compare(rounded, exact) > 0 : compare(rounded, exact) < 0;
          expect(isStronger).toBe(false);
        },
      ),
      { numRuns: 10_000 },
    );
  });
});

describe("publishedRounding", () => {
  it("may go to the stronger side, as some printed pages did: 13.3 g printed as 13", () => {
    expect(toNumber(roundToStep(fractionOf(13.333), publishedRounding("down", 1)))).toBe(13);
  });
});
