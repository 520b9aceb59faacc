import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { changedSettings } from "./changed-settings";
import { idealSettings } from "./ideal-settings";
import { drawLivedDays } from "./lived-days";
import { drawLoopSettings } from "./loop-settings";
import { drawPerson } from "./person";
import { seededRandom } from "./random";
import { simulate, type SimulatedRun } from "./run";

const DAYS = 3;

function someone(seed: number) {
  const random = seededRandom(seed);
  const parameters = drawPerson(random);
  const settings = drawLoopSettings(random, idealSettings(parameters));
  return { parameters, settings, life: drawLivedDays(random, DAYS, () => false) };
}

const seeds = fc.integer({ min: 0, max: 1_000_000 });
const total = (values: Float64Array) => values.reduce((a, b) => a + b, 0);

describe("whoever is drawn", () => {
  it("has readings a sensor could show, delivered amounts in whole milli-units, and corrections only where there is a bolus", () => {
    fc.assert(
      fc.property(seeds, (seed) => {
        const { parameters, settings, life } = someone(seed);
        const run: SimulatedRun = simulate(parameters, life, [{ fromSlot: 0, settings }]);
        for (let slot = 0; slot < DAYS * 288; slot++) {
          expect(run.glucoseMgDl[slot]).toBeGreaterThanOrEqual(39);
          expect(run.glucoseMgDl[slot]).toBeLessThan(800);
          expect(Number.isInteger(run.basalMilliUnits[slot]) && run.basalMilliUnits[slot]! >= 0).toBe(true);
          expect(run.basalMilliUnits[slot]).toBeLessThanOrEqual(Math.round((2.5 * settings.basalUnitsPerHour[slot % 288]! * 1000) / 12));
          if (run.isCorrection[slot] === 1) expect(run.bolusMilliUnits[slot]).toBeGreaterThan(0);
        }
      }),
      { numRuns: 15 },
    );
  });

  it("has lower glucose when every setting is much stronger, with the same days", () => {
    fc.assert(
      fc.property(seeds, (seed) => {
        const { parameters, settings, life } = someone(seed);
        const stronger = changedSettings(settings, { nightBasal: 1.5, dayBasal: 1.5, carbRatio: 0.6, sensitivity: 0.6 });
        const [one, two] = [settings, stronger].map((inForce) => total(simulate(parameters, life, [{ fromSlot: 0, settings: inForce }]).glucoseMgDl));
        expect(two!).toBeLessThan(one!);
      }),
      { numRuns: 15 },
    );
  });

  it("does not depend on the sensor's error where nothing reads it: without a loop, meals or lows", () => {
    fc.assert(
      fc.property(seeds, (seed) => {
        const { parameters, settings, life } = someone(seed);
        const off = { ...settings, basalUnitsPerHour: new Float64Array(288) };
        const quiet = { ...life, meals: [], sleepsThrough: new Uint8Array(DAYS * 48).fill(1) };
        const shown = simulate(parameters, quiet, [{ fromSlot: 0, settings: off }], { bolusStepMilliUnits: 1_000_000 }).glucoseMgDl;
        const exact = simulate(parameters, { ...quiet, sensorFactors: new Float64Array(DAYS * 288).fill(1) }, [{ fromSlot: 0, settings: off }], { bolusStepMilliUnits: 1_000_000 }).glucoseMgDl;
        shown.forEach((value, slot) => expect(value).toBeCloseTo(exact[slot]! * life.sensorFactors[slot]!, 6));
      }),
      { numRuns: 5 },
    );
  });
});
