import { describe, expect, it } from "vitest";
import { seededRandom, seedWords, xoshiro128StarStar } from "./random";

const take = (n: number, source: () => number) => Array.from({ length: n }, source);

describe("xoshiro128StarStar", () => {
  // Outputs of the authors' C program (version 1.1) from the state 1, 2, 3, 4, as
  // several public re-implementations carry them in their own tests.
  it("gives the authors' numbers", () => {
    expect(take(10, xoshiro128StarStar([1, 2, 3, 4]))).toEqual([
      11520, 0, 5927040, 70819200, 2031721883, 1637235492, 1287239034, 3734860849, 3729100597, 4258142804,
    ]);
  });
});

describe("seedWords", () => {
  // Expansion of the seed 0, as a public re-implementation computed it apart from its code.
  it("expands a seed as SplitMix32 does", () => {
    expect(seedWords(0)).toEqual([1684164658, 3653269916, 2939563536, 2141751570]);
  });
});

describe("seededRandom", () => {
  it("repeats itself for the same seed and stream, and only then", () => {
    const first = take(5, seededRandom(7, 3));
    expect(take(5, seededRandom(7, 3))).toEqual(first);
    expect(take(5, seededRandom(8, 3))).not.toEqual(first);
    expect(take(5, seededRandom(7, 4))).not.toEqual(first);
    expect(take(5, seededRandom(3, 7))).not.toEqual(first);
  });

  it("is spread evenly from 0 to 1, also over the first numbers of many streams", () => {
    for (const values of [take(20_000, seededRandom(1)), Array.from({ length: 20_000 }, (_, i) => seededRandom(1, i)())]) {
      const mean = values.reduce((a, b) => a + b, 0) / values.length;
      expect(mean).toBeGreaterThan(0.49);
      expect(mean).toBeLessThan(0.51);
      expect(Math.min(...values)).toBeGreaterThanOrEqual(0);
      expect(Math.max(...values)).toBeLessThan(1);
      expect(values.filter((v) => v < 0.1).length / values.length).toBeCloseTo(0.1, 1);
    }
  });

  it.each([-1, 1.5, Number.NaN, 2 ** 32])("refuses the seed %s", (seed) => {
    expect(() => seededRandom(seed)).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
    expect(() => seededRandom(0, seed)).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
  });
});
