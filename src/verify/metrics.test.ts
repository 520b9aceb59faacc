import { existsSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { readRows } from "./csv-file";
import { figuresOf } from "./metrics";

const FOLDER = "../shared/data/glucose";
const SETS = ["five_people_three", "hall2018_twelve"];

/** Their name, ours, how many of theirs make one of ours, relative tolerance (design page "metrics"). */
const CHECKS: [string, string, number, number][] = [
  ["base_n", "readings", 1, 0],
  ["base_mean", "meanMgDl", 1, 1e-6],
  ["base_sd", "sdMgDl", 1, 1e-6],
  ["base_cv", "cvFraction", 100, 1e-6],
  ["gmi", "gmiPercent", 1, 1e-6],
  ["base_b54", "veryLowFraction", 100, 1e-6],
  ["base_r54_69", "lowFraction", 100, 1e-6],
  ["base_r70_180", "inRangeFraction", 100, 1e-6],
  ["base_r181_250", "highFraction", 100, 1e-6],
  ["base_a250", "veryHighFraction", 100, 1e-6],
  ["base_r70_140", "tightRangeFraction", 100, 1e-6],
  ["gri", "gri", 1, 1e-6],
  ["lbgi_10x1.509sq", "lbgi", 1, 1e-4],
  ["hbgi_10x1.509sq", "hbgi", 1, 1e-4],
  ["modd", "modd", 1, 0.02],
  ["conga_24h", "conga", 1, 0.02],
  ["mage_ma_avg", "mage", 1, 0.05],
  ["active_percent", "sensorActiveFraction", 100, 1e-6],
];

/** Theirs and ours of counts that may differ by one in a span. */
const EPISODES: [string, string][] = [
  ["hypo_lv1", "low"], ["hypo_lv2", "veryLow"], ["hyper_lv1", "high"], ["hyper_lv2", "veryHigh"], ["hypo_extended", "extendedLow"],
];

describe.skipIf(!existsSync(FOLDER))("figures against R 4.2 and iglu 4.3.0 on open data (skipped where ../shared is absent)", () => {
  describe.each(SETS)("%s", (set) => {
    const folder = existsSync(FOLDER);
    const ours = folder ? figuresOf(readRows(`${FOLDER}/${set}.csv`)) : [];
    const theirs = folder ? readRows(`${FOLDER}/${set}_expected.csv`) : [];
    const people = [...new Set(ours.map((row) => row.id))];

    const find = (rows: typeof theirs | typeof ours, id: string, metric: string) => {
      const value = rows.find((row) => row.id === id && row.metric === metric)?.value;
      return value === undefined || value === null || value === "" ? NaN : Number(value);
    };

    it("holds every person of the check file", () => {
      expect(people).toEqual([...new Set(theirs.map((row) => row.id))]);
    });

    it.each(EPISODES)("episodes %s are our %s, give or take one", (theirName, ourName) => {
      for (const id of people) {
        const expected = find(theirs, id, `episode_${theirName}_total_episodes`);
        expect(Math.abs(find(ours, id, `episodes.${ourName}`) - expected), id).toBeLessThanOrEqual(1);
      }
    });

    it.each(CHECKS)("%s is our %s", (theirName, ourName, scale, tolerance) => {
      for (const id of people) {
        const expected = find(theirs, id, theirName) / scale;
        const got = find(ours, id, ourName);
        expect(Math.abs(got - expected), `${id}: ${got} for ${expected}`).toBeLessThanOrEqual(tolerance * Math.abs(expected) + 1e-12);
      }
    });
  });
});
