import { describe, expect, it } from "vitest";
import type { SettingsProfile } from "@/domain/settings/profile";
import { DEMO_MEALS, DEMO_TRUTH, demoDayFactors, demoParameters } from "./demo-person";
import { DEMO_PROFILES } from "./demo-profiles";
import { idealSettings } from "./ideal-settings";
import { drawLivedDays } from "./lived-days";
import { outcomeSeries } from "./outcome-series";
import { programmedProfile } from "./programmed-profile";
import { seededRandom } from "./random";
import { simulate } from "./run";

const DAYS = 200;
const drawn = drawLivedDays(seededRandom(1), DAYS, () => false, { habits: DEMO_MEALS, spread: DEMO_TRUTH.spread, countLogSd: DEMO_TRUTH.countLogSd });
const factors = demoDayFactors(DEMO_TRUTH);
const life = { ...drawn, sensitivity: drawn.sensitivity.map((value, slot) => value * factors[slot % 288]!) };

/** Means over many days lived under one profile, with the same chance for each. */
function longRun(profile: SettingsProfile) {
  const run = simulate(demoParameters(), life, [{ fromSlot: 0, settings: programmedProfile(profile) }], { gain: DEMO_TRUTH.gain, bolusStepMilliUnits: 50 });
  const { series } = outcomeSeries(run, life.meals, 0);
  const mean = (id: keyof typeof series) => series[id].reduce((sum, { value }) => sum + value, 0) / series[id].length;
  return { night: mean("night-mean"), breakfast: mean("breakfast-mean"), lowsPercent: mean("day-lows"), inRange: mean("day-time-in-range") };
}

const [start, second, third, fourth] = [DEMO_PROFILES.start, DEMO_PROFILES.breakfast15, DEMO_PROFILES.night055, DEMO_PROFILES.afternoon50].map(longRun);

describe("what is true behind the demo", () => {
  it("has settings that are about right for the body, a little weak at night", () => {
    const { basalUnitsPerHour, sensitivityMmolPerUnit, carbRatioGramsPerUnit } = idealSettings(demoParameters());
    expect(basalUnitsPerHour).toBeGreaterThan(0.52);
    expect(basalUnitsPerHour).toBeLessThan(0.65);
    expect(Math.abs(sensitivityMmolPerUnit * 18.0156 - 60)).toBeLessThan(6);
    expect(Math.abs(carbRatioGramsPerUnit - 17)).toBeLessThan(2);
  });

  it("lowers breakfasts by the second version, and nothing at night", () => {
    expect(second!.breakfast - start!.breakfast).toBeLessThan(-5);
    expect(Math.abs(second!.night - start!.night)).toBeLessThan(1.5);
  });

  it("lowers nights by the third version without more lows", () => {
    expect(third!.night - second!.night).toBeLessThan(-3.5);
    expect(third!.lowsPercent - second!.lowsPercent).toBeLessThan(0.2);
    expect(third!.inRange).toBeGreaterThan(second!.inRange);
  });

  it("brings more lows by the fourth version, and leaves the nights as they are", () => {
    expect(fourth!.lowsPercent - third!.lowsPercent).toBeGreaterThan(0.2);
    expect(Math.abs(fourth!.night - third!.night)).toBeLessThan(1.5);
  });
});
