import { describe, expect, it } from "vitest";
import lastRun from "@/domain/comparison/calibration-last-run.json";
import { CELLS, judge, ratesOf } from "./calibrate-bars";
import { NO_COUNTS, type CellCounts } from "./calibrate-person";
import { calibrationRun, calibrationText } from "./calibrate-report";

const counts = (some: Partial<CellCounts>): CellCounts => ({ ...NO_COUNTS, changes: 100, intervals: 100, covered: 90, ...some });
const FACTS = { seed: 3, people: 20, date: "2026-01-02" };
const asHoped = CELLS.map(({ bars }) => counts({ better: 3, lowerAtEqualInsulin: bars.foundAtLeast === undefined ? 2 : 85 }));

describe("judge", () => {
  const plain = CELLS.find(({ condition, isInsulinLogged }) => condition === "nothing" && !isInsulinLogged)!;
  const logged = CELLS.find(({ condition, isInsulinLogged }) => condition === "nothing" && isInsulinLogged)!;
  const night = CELLS.find(({ condition, isInsulinLogged }) => condition === "night basal 15% stronger" && isInsulinLogged)!;
  const all = CELLS.find(({ condition, isInsulinLogged }) => condition === "all settings 10-20% stronger" && isInsulinLogged)!;

  // The bars: false better at most 5 %, coverage 87 to 97 %, night basal found in 45 %, all settings in 80 %.
  it.each([
    [plain, { better: 5 }, true], [plain, { better: 6 }, false],
    [plain, { covered: 87 }, true], [plain, { covered: 86 }, false], [plain, { covered: 97 }, true], [plain, { covered: 98 }, false],
    [logged, { lowerAtEqualInsulin: 5 }, true], [logged, { lowerAtEqualInsulin: 6 }, false],
    [night, { lowerAtEqualInsulin: 45 }, true], [night, { lowerAtEqualInsulin: 44 }, false],
    [all, { lowerAtEqualInsulin: 80 }, true], [all, { lowerAtEqualInsulin: 79 }, false],
  ])("case %#", (cell, some, isMet) => {
    expect(judge(cell, ratesOf(cell, counts(some))).every((bar) => bar.isMet)).toBe(isMet);
  });

  it("misses coverage where there is no interval at all", () => {
    expect(judge(plain, ratesOf(plain, counts({ intervals: 0, covered: 0 }))).every((bar) => bar.isMet)).toBe(false);
  });
});

describe("calibrationRun", () => {
  it("passes only when every bar is met", () => {
    expect(calibrationRun(FACTS, asHoped).areAllBarsMet).toBe(true);
    const spoiled = asHoped.with(2, counts({ better: 9 }));
    expect(calibrationRun(FACTS, spoiled).areAllBarsMet).toBe(false);
    expect(calibrationText(calibrationRun(FACTS, spoiled))).toContain("MISSED: \"better\" 9.0%, at most 5.0%");
  });

  it("prints a line for each cell", () => {
    const text = calibrationText(calibrationRun(FACTS, asHoped));
    for (const { condition, outcome } of CELLS) expect(text).toMatch(new RegExp(`^${condition} +${outcome} `, "m"));
    expect(text).toContain("20 simulated people, seed 3");
    expect(text).toContain("All bars met.");
  });
});

describe("the last run kept with the product", () => {
  it("has the cells and bars of today, and met them", () => {
    expect(lastRun.cells.map(({ condition, outcome, isInsulinLogged, bars }) => ({ condition, outcome, isInsulinLogged, bars }))).toEqual(CELLS);
    expect(lastRun.people).toBeGreaterThanOrEqual(300);
    expect(lastRun.areAllBarsMet).toBe(true);
  });

  it("follows from its own counts", () => {
    const { seed, people, date } = lastRun;
    expect(calibrationRun({ seed, people, date }, lastRun.cells.map(({ counts: kept }) => kept))).toEqual(lastRun);
  });
});
