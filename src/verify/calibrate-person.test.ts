import { describe, expect, it } from "vitest";
import { compare } from "@/domain/comparison/compare";
import { changedSettings } from "@/domain/simulator/changed-settings";
import { idealSettings } from "@/domain/simulator/ideal-settings";
import { drawLivedDays } from "@/domain/simulator/lived-days";
import { drawLoopSettings } from "@/domain/simulator/loop-settings";
import { outcomeSeries } from "@/domain/simulator/outcome-series";
import { drawPerson } from "@/domain/simulator/person";
import { seededRandom } from "@/domain/simulator/random";
import { simulate } from "@/domain/simulator/run";
import { CELLS } from "./calibrate-bars";
import { lookAt, lowsOn } from "./calibrate-look";
import { addCounts, calibratePerson, CHANGES_PER_PERSON, NO_COUNTS } from "./calibrate-person";
import { programmedMeans, splice } from "./calibrate-splice";

const random = seededRandom(77);
const parameters = drawPerson(random);
const settings = drawLoopSettings(random, idealSettings(parameters));
const life = drawLivedDays(random, 34, () => false);
const seriesUnder = (inForce: typeof settings) => outcomeSeries(simulate(parameters, life, [{ fromSlot: 0, settings: inForce }]), life.meals, 1000);
const base = seriesUnder(settings);
const stronger = seriesUnder(changedSettings(settings, { nightBasal: 1.3, dayBasal: 1.2, carbRatio: 0.8 }));
const changeDay = 1018;

describe("splice", () => {
  const spliced = splice(base, stronger, changeDay);

  it("takes days before the change from one life and the rest from the other", () => {
    const at = (from: typeof base, day: number) => from.series["day-mean"].find((value) => value.day === day);
    expect(at(spliced, 1017)).toEqual(at(base, 1017));
    expect(at(spliced, 1018)).toEqual(at(stronger, 1018));
    expect(at(stronger, 1020)).not.toEqual(at(base, 1020));
    expect(spliced.series["night-mean"]).toHaveLength(34);
    expect(spliced.insulin.day[20]).toEqual(stronger.insulin.day[20]);
  });
});

describe("lookAt", () => {
  // The look of the calibration is put together from the shipped parts; the shipped whole must agree with it.
  const spliced = splice(base, stronger, changeDay);
  const programmed = programmedMeans(settings);
  const cases = (["night-mean", "breakfast-mean", "day-time-in-range", "correction-in-range"] as const).flatMap((outcome) =>
    [true, false].flatMap((isInsulinLogged) => [3, 5, 9, 14].map((after) => ({ outcome, isInsulinLogged, after }))),
  );

  it.each(cases)("says what the whole comparison says: $outcome, insulin $isInsulinLogged, day $after", ({ outcome, isInsulinLogged, after }) => {
    const lastDay = changeDay + after;
    const days = { changeDay, previousChangeDay: 1002, lastDay, historyStart: null };
    const look = lookAt(spliced, days, { outcome, isInsulinLogged, lows: lowsOn(spliced, days), targetHighMgDl: 110, programmed });
    const whole = compare({
      version: 2, against: 1, changeDay, lastDay, hasVersionEnded: false, outcome, isBundle: false, isAimFewerHighs: true, targetHighMgDl: 110,
      earlierChanges: [{ day: 1002, parts: ["night", "breakfast", "lunch", "dinner", "corrections"] }], systemStartDay: null,
      series: spliced.series, below54Percent: spliced.below54Percent,
      insulin: isInsulinLogged ? spliced.insulin : { night: [], day: [] }, programmed,
    });
    expect({ verdict: look.verdict, effect: look.effect, adjusted: look.adjusted }).toEqual({ verdict: whole.verdict, effect: whole.effect, adjusted: whole.adjusted });
  });
});

describe("calibratePerson", () => {
  const counts = calibratePerson(5, 2, CELLS);

  it("gives the same person the same counts, and another person others", () => {
    expect(calibratePerson(5, 2, CELLS)).toEqual(counts);
    expect(calibratePerson(6, 2, CELLS)).not.toEqual(counts);
  });

  it("asks about every change in every cell and counts no change twice", () => {
    expect(counts).toHaveLength(CELLS.length);
    for (const { changes, better, worse, moreLows, covered, intervals } of counts) {
      expect(changes).toBe(CHANGES_PER_PERSON);
      for (const called of [better, worse, moreLows, intervals]) expect(called).toBeLessThanOrEqual(changes);
      expect(covered).toBeLessThanOrEqual(intervals);
    }
  });

  it("has nothing to say at equal insulin where insulin is not logged", () => {
    counts.forEach(({ lowerAtEqualInsulin }, i) => {
      if (!CELLS[i]!.isInsulinLogged) expect(lowerAtEqualInsulin).toBe(0);
    });
  });
});

describe("addCounts", () => {
  it("adds each count", () => {
    const one = { ...NO_COUNTS, changes: 6, better: 1 };
    expect(addCounts(one, { ...one, better: 2, covered: 3 })).toEqual({ ...NO_COUNTS, changes: 12, better: 3, covered: 3 });
  });
});
