import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { compare, fraction, fractionOf, minus, over, plus, smaller, times, toNumber } from "./fraction";

vi.setConfig({ testTimeout: 60_000 });

const runs = { numRuns: 10_000 };
const decimals = fc.tuple(fc.integer({ min: -1_000_000, max: 1_000_000 }), fc.integer({ min: 0, max: 6 }));
const decimal = decimals.map(([digits, places]) => Number((digits / 10 ** places).toFixed(places)));

describe("fraction", () => {
  it.each([
    [0.4, 2n, 5n],
    [-0.4, -2n, 5n],
    [40, 40n, 1n],
    [0, 0n, 1n],
    [1e21, 10n ** 21n, 1n],
    [2.5e-7, 1n, 4_000_000n],
  ])("reads the typed decimal %s as it stands", (value, numerator, denominator) => {
    expect(fractionOf(value)).toEqual({ numerator, denominator });
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])("refuses %s", (value) => {
    expect(() => fractionOf(value)).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
  });

  it("keeps the sign above the line and the lowest terms", () => {
    expect(fraction(6n, -4n)).toEqual({ numerator: -3n, denominator: 2n });
    expect(fraction(0n, -4n)).toEqual({ numerator: 0n, denominator: 1n });
  });

  it("refuses to divide by zero", () => {
    expect(() => fraction(1n, 0n)).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
    expect(() => over(fractionOf(1), fractionOf(0))).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
  });

  it("does not drift where binary numbers do: 0.1 + 0.2 is 0.3, 0.4 x 33 / 24 is 0.55", () => {
    expect(plus(fractionOf(0.1), fractionOf(0.2))).toEqual(fractionOf(0.3));
    expect(over(times(fractionOf(0.4), fractionOf(33)), fractionOf(24))).toEqual(fractionOf(0.55));
    expect(0.1 + 0.2).not.toBe(0.3);
  });

  it("compares and picks the smaller one", () => {
    expect(compare(fractionOf(0.1), fractionOf(0.2))).toBeLessThan(0);
    expect(compare(fractionOf(-0.1), fractionOf(-0.2))).toBeGreaterThan(0);
    expect(compare(fraction(2n, 6n), fraction(1n, 3n))).toBe(0);
    expect(smaller(fractionOf(30), fractionOf(35.5))).toEqual(fractionOf(30));
    expect(smaller(fractionOf(35.5), fractionOf(30))).toEqual(fractionOf(30));
  });

  it("gives back every typed decimal", () => {
    fc.assert(
      fc.property(decimal, (value) => {
        expect(toNumber(fractionOf(value))).toBe(value === 0 ? 0 : value);
      }),
      runs,
    );
  });

  it("adds and takes away, multiplies and divides, without a trace", () => {
    fc.assert(
      fc.property(decimal, decimal, (a, b) => {
        const [x, y] = [fractionOf(a), fractionOf(b)];
        expect(minus(plus(x, y), y)).toEqual(x);
        if (b !== 0) expect(over(times(x, y), y)).toEqual(x);
      }),
      runs,
    );
  });
});
