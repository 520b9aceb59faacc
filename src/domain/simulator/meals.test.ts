import { describe, expect, it } from "vitest";
import { drawMeals, USUAL_MEALS } from "./meals";
import { seededRandom } from "./random";

const DAYS = 4000;
const meals = drawMeals(seededRandom(21), DAYS, (day) => day % 7 >= 5);
const named = (name: string, isOff: boolean) => meals.filter((meal) => meal.name === name && Math.floor(meal.slot / 288) % 7 >= 5 === isOff);
const mean = (values: number[]) => values.reduce((a, b) => a + b, 0) / values.length;
const minuteOf = ({ slot }: { slot: number }) => (slot % 288) * 5;

describe("drawMeals", () => {
  // comparison.md 5.1, the table of meals.
  it.each(USUAL_MEALS)("keeps the habit of $name", ({ name, minute, grams, shareOfDays }) => {
    const found = named(name, false);
    expect(Math.abs(mean(found.map(minuteOf)) - minute)).toBeLessThan(3);
    expect(Math.abs(mean(found.map((meal) => meal.grams)) - grams)).toBeLessThan(1);
    expect(Math.abs(found.length / (DAYS * (5 / 7)) - shareOfDays)).toBeLessThan(0.03);
  });

  it("has breakfast an hour later and a larger dinner on days off", () => {
    expect(Math.abs(mean(named("breakfast", true).map(minuteOf)) - 525)).toBeLessThan(3);
    expect(Math.abs(mean(named("lunch", true).map(minuteOf)) - 765)).toBeLessThan(4);
    expect(Math.abs(mean(named("dinner", true).map((meal) => meal.grams)) - 75 / 0.93)).toBeLessThan(2);
  });

  it("counts with an error of 30 percent either way, in whole grams", () => {
    const logs = meals.filter(({ name }) => name !== "snack").map(({ grams, countedGrams }) => Math.log(countedGrams / grams));
    expect(Math.abs(mean(logs))).toBeLessThan(0.01);
    expect(Math.abs(Math.sqrt(mean(logs.map((log) => log ** 2))) - 0.3)).toBeLessThan(0.01);
    expect(meals.every(({ countedGrams }) => Number.isInteger(countedGrams))).toBe(true);
  });

  it("forgets 6 in 100 doses and gives the rest from ten minutes before on", () => {
    const large = meals.filter(({ countedGrams }) => countedGrams >= 5);
    expect(Math.abs(large.filter(({ doseSlot }) => doseSlot === null).length / large.length - 0.06)).toBeLessThan(0.01);
    const delays = large.filter(({ doseSlot }) => doseSlot !== null).map(({ slot, doseSlot }) => (doseSlot! - slot) * 5);
    expect(Math.min(...delays)).toBe(-10);
    // Mean of the delay: gamma 1.2 * 5 = 6 min, less 10.
    expect(Math.abs(mean(delays) + 4)).toBeLessThan(0.5);
  });

  it("gives no dose for what is counted below 5 g", () => {
    expect(meals.some(({ countedGrams }) => countedGrams < 5)).toBe(true);
    expect(meals.filter(({ countedGrams }) => countedGrams < 5).every(({ doseSlot }) => doseSlot === null)).toBe(true);
  });

  it("stays within the run and within 0 to 160 g", () => {
    for (const { slot, grams, doseSlot } of meals) {
      expect(slot).toBeLessThan(DAYS * 288);
      expect(doseSlot ?? 0).toBeLessThan(DAYS * 288);
      expect(grams).toBeGreaterThan(0);
      expect(grams).toBeLessThanOrEqual(160);
    }
  });
});
