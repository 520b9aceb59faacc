import { describe, expect, it } from "vitest";
import { drawLivedDays } from "./lived-days";
import { seededRandom } from "./random";
import { drawSensorFactors } from "./sensor";

const never = () => false;

describe("drawLivedDays", () => {
  it("is the same for the same source", () => {
    expect(drawLivedDays(seededRandom(4), 3, never)).toEqual(drawLivedDays(seededRandom(4), 3, never));
  });

  it("sleeps through four lows in ten at night and none by day", () => {
    const { sleepsThrough } = drawLivedDays(seededRandom(4), 500, never);
    const share = (halfHours: number[]) => {
      const chances = [...sleepsThrough].filter((_, i) => halfHours.includes(i % 48));
      return chances.reduce((a, b) => a + b, 0) / chances.length;
    };
    const night = [46, 47, ...Array.from({ length: 14 }, (_, i) => i)];
    expect(share(night)).toBeCloseTo(0.4, 1);
    expect(share(Array.from({ length: 32 }, (_, i) => 14 + i))).toBe(0);
  });

  it("takes a person's own meals and spreads", () => {
    const habits = [{ name: "lunch", minute: 700, minuteSd: 0, grams: 50, gramsSd: 0, shareOfDays: 1 }] as const;
    const spread = { dayCorrelation: 0, dayLogSd: 0, slowCorrelation: 0, slowLogSd: 0, nightLogSd: 0 };
    const { meals, sensitivity } = drawLivedDays(seededRandom(4), 2, never, { habits, countLogSd: 0, spread });
    expect(meals.map(({ slot, grams, countedGrams }) => [slot, grams, countedGrams])).toEqual([[140, 50, 50], [428, 50, 50]]);
    expect(new Set(sensitivity)).toEqual(new Set([1, 0.9]));
  });
});

describe("drawSensorFactors", () => {
  it("is around one with a spread of 7 percent, each like the one before", () => {
    const errors = drawSensorFactors(seededRandom(8), 200).map((factor) => factor - 1);
    const square = (shift: number) => errors.subarray(shift).reduce((sum, error, i) => sum + error * errors[i]!, 0) / errors.length;
    expect(Math.sqrt(square(0))).toBeCloseTo(0.07, 2);
    expect(square(1) / square(0)).toBeCloseTo(0.9, 1);
  });
});
