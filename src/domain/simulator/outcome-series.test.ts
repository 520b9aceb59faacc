import { describe, expect, it } from "vitest";
import type { SimulatedMeal } from "./meals";
import { outcomeSeries } from "./outcome-series";
import type { SimulatedRun } from "./run";

/** Two days at 100 mg/dL, but for what a case writes over it. */
function runOf(write: (glucose: Float64Array) => void = () => undefined): SimulatedRun {
  const glucoseMgDl = new Float64Array(576).fill(100);
  write(glucoseMgDl);
  return {
    days: 2, glucoseMgDl, basalMilliUnits: new Float64Array(576).fill(50),
    bolusMilliUnits: new Float64Array(576), isCorrection: new Uint8Array(576),
  };
}

const breakfast = (slot: number, doseSlot: number | null = slot): SimulatedMeal => ({ name: "breakfast", slot, grams: 40, countedGrams: 35, doseSlot });
const valuesOf = (list: ReadonlyArray<{ day: number; value: number }>) => list.map(({ day, value }) => [day, value]);

describe("outcomeSeries", () => {
  // By hand: 72 of 288 readings at 60 are 25 %; 36 of them at 50 are 12.5 %; the night is the first 72.
  it("counts days and nights", () => {
    const { series, below54Percent } = outcomeSeries(runOf((g) => g.fill(60, 0, 36).fill(50, 36, 72).fill(200, 288, 324)), [], 1000);
    expect(valuesOf(series["day-lows"])).toEqual([[1000, 25], [1001, 0]]);
    expect(valuesOf(below54Percent)).toEqual([[1000, 12.5], [1001, 0]]);
    expect(valuesOf(series["day-time-in-range"])).toEqual([[1000, 75], [1001, 87.5]]);
    expect(valuesOf(series["night-mean"])).toEqual([[1000, 55], [1001, 150]]);
    expect(valuesOf(series["night-time-in-range"])).toEqual([[1000, 0], [1001, 50]]);
    expect(valuesOf(series["day-mean"])).toEqual([[1000, 88.75], [1001, 112.5]]);
  });

  it("means the four hours after a meal, also over midnight, but not past the end", () => {
    const run = runOf((g) => g.fill(200, 280, 300));
    const at = (slot: number) => valuesOf(outcomeSeries(run, [breakfast(slot)], 0).series["breakfast-mean"]);
    expect(at(280)).toEqual([[0, (20 * 200 + 28 * 100) / 48]]);
    expect(at(576 - 48)).toEqual([[1, 100]]);
    expect(at(576 - 20)).toEqual([]);
  });

  it("looks at corrections from two to four hours after, averaged over a day", () => {
    const run = runOf((g) => g.fill(200, 124, 136));
    run.isCorrection[100] = 1; // two to four hours after: slots 124 to 147, half of them high
    run.isCorrection[200] = 1;
    expect(valuesOf(outcomeSeries(run, [], 0).series["correction-in-range"])).toEqual([[0, 75]]);
  });

  it("adds up insulin as delivered and carbohydrate as entered for doses", () => {
    const run = runOf();
    run.bolusMilliUnits[10] = 500;
    run.bolusMilliUnits[100] = 2000;
    const { insulin } = outcomeSeries(run, [breakfast(100), breakfast(120, null)], 0);
    expect(insulin.night[0]).toEqual({ day: 0, glucoseMgDl: 100, insulinUnits: 72 * 0.05 + 0.5, carbohydrateGrams: 0 });
    expect(insulin.day[0]).toEqual({ day: 0, glucoseMgDl: 100, insulinUnits: expect.closeTo(288 * 0.05 + 2.5, 9) as number, carbohydrateGrams: 35 });
  });

  it("leaves out flagged days and days with too few readings", () => {
    const { series } = outcomeSeries(runOf((g) => g.fill(NaN, 288, 288 + 90)), [], 0, new Map([[0, "fever"]]));
    expect(series["day-mean"]).toMatchObject([{ isUsable: false, leftOutReason: "fever" }, { isUsable: false, value: 100 }]);
    expect(series["night-mean"]).toHaveLength(1);
  });
});
