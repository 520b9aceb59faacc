import { describe, expect, it } from "vitest";
import { seededRandom, type RandomSource } from "./random";
import { gammaDraw, lognormalDraw, normalDraw } from "./random-draws";

const N = 40_000;

function moments(draw: (random: RandomSource) => number) {
  const random = seededRandom(2024);
  const values = Array.from({ length: N }, () => draw(random));
  const mean = values.reduce((a, b) => a + b, 0) / N;
  const sd = Math.sqrt(values.reduce((a, b) => a + (b - mean) ** 2, 0) / (N - 1));
  return { values, mean, sd };
}

describe("normalDraw", () => {
  it("has the mean and spread it was asked for", () => {
    const { values, mean, sd } = moments((random) => normalDraw(random, 75, 10));
    expect(Math.abs(mean - 75)).toBeLessThan(0.2);
    expect(Math.abs(sd - 10)).toBeLessThan(0.15);
    // 68.27 % of a normal distribution lies within one standard deviation.
    expect(values.filter((v) => Math.abs(v - 75) < 10).length / N).toBeCloseTo(0.6827, 2);
  });

  it("takes two numbers whatever the spread", () => {
    const count = (sd: number) => {
      let taken = 0;
      normalDraw(() => ((taken += 1), 0.5), 0, sd);
      return taken;
    };
    expect([count(0), count(3)]).toEqual([2, 2]);
  });

  it("is finite at the lowest number of the source", () => expect(normalDraw(() => 0, 5, 2)).toBe(5));
});

describe("lognormalDraw", () => {
  it("has the median and the spread of logarithms it was asked for", () => {
    const { values } = moments((random) => lognormalDraw(random, 0.62, 0.22));
    const sorted = values.toSorted((a, b) => a - b);
    expect(Math.abs(sorted[N / 2]! - 0.62)).toBeLessThan(0.01);
    const logs = moments((random) => Math.log(lognormalDraw(random, 0.62, 0.22)));
    expect(Math.abs(logs.sd - 0.22)).toBeLessThan(0.005);
  });
});

describe("gammaDraw", () => {
  // Mean k*theta and variance k*theta^2, the textbook moments of the gamma distribution.
  it.each([[1.2, 5], [1, 2], [4, 0.5]])("has the mean and spread of shape %s, scale %s", (shape, scale) => {
    const { values, mean, sd } = moments((random) => gammaDraw(random, shape, scale));
    expect(Math.abs(mean / (shape * scale) - 1)).toBeLessThan(0.03);
    expect(Math.abs(sd / (Math.sqrt(shape) * scale) - 1)).toBeLessThan(0.03);
    expect(Math.min(...values)).toBeGreaterThan(0);
  });

  it("is the exponential distribution at shape 1", () => {
    const { values } = moments((random) => gammaDraw(random, 1, 1));
    expect(values.filter((v) => v > 1).length / N).toBeCloseTo(Math.exp(-1), 2);
  });

  it("refuses a shape below 1", () => {
    expect(() => gammaDraw(seededRandom(1), 0.5, 1)).toThrow(expect.objectContaining({ code: "INVALID_RANGE" }));
  });
});
