import { describe, expect, it } from "vitest";
import { exactDailyBasalMilliUnits } from "./basal-total";
import { backUpDoses } from "./fallback";
import { evaluateFormula, type Formula } from "./formula";
import { fractionOf, over, toNumber, type Fraction } from "./fraction";
import { valueOfMethod } from "./methods";
import { publishedRounding, roundToStep, type RoundingDirection } from "./rounding";

/**
 * Worked examples printed by the sources of settings.md 2. `exact` is checked to
 * 1e-3; `printed` is what the page shows, reached with that page's own rounding,
 * which is not the product's. W10 and W21 are arithmetic checks of loose sources.
 */
type Example = {
  id: string;
  source: string;
  exact: () => Fraction | null;
  expected: number;
  printed?: [value: number, direction: RoundingDirection, step: number];
};

const n = fractionOf;
const dose = (totalDailyDose: number) => ({ totalDailyDose: n(totalDailyDose) });
const injections = (units: number) => ({ injectionsDailyDose: n(units) });
const hourly = (perDay: Fraction) => over(perDay, n(24));
const half = (units: number) => valueOfMethod("basal-0.50", dose(units));
const rates = (...pairs: [number, number][]) =>
  over(exactDailyBasalMilliUnits(pairs.map(([hour, rate]) => ({ startMinute: hour * 60, milliUnitsPerHour: rate * 1000 }))), n(1000));
/** A day of 18 U: 0.75 U/h. A day of 20 U: 16 h at 0.75 and 8 h at 1.0 U/h. */
const DAY_18 = [{ startMinute: 0, milliUnitsPerHour: 750 }];
const DAY_20 = [...DAY_18, { startMinute: 960, milliUnitsPerHour: 1000 }];
const backUp = (id: string, basal: typeof DAY_18, total: number | null = null) =>
  n(backUpDoses(basal, total).find((row) => row.id === id)?.units ?? Number.NaN);
const sum = (...units: number[]) => evaluateFormula(units.map((constant) => ({ constant })), {});

/** Rules that the product shows to nobody; here they only hold the interpreter to its sources. */
const BAND_LOW: Formula<"start" | "band"> = [{ constant: 1, times: ["start"] }, { constant: -1, times: ["band"] }];
const BAND_HIGH: Formula<"start" | "band"> = [{ constant: 1, times: ["start"] }, { constant: 1, times: ["band"] }];
const TRAVEL: Formula<"dose" | "hoursWest"> = [
  { constant: 0.9, times: ["dose"] },
  { constant: 1, times: ["dose", "hoursWest"], dividedBy: 24 },
];
const SHARE: Formula<"dose"> = [{ constant: 0.2, times: ["dose"] }];
const MEAL: Formula<"grams" | "ratio"> = [{ constant: 1, times: ["grams"], over: ["ratio"] }];
const pounds = (id: string, weight: number) => valueOfMethod(id, { weightPounds: n(weight) });
const perKg = (id: string, weightKg: number) => valueOfMethod(id, { weightKg: n(weightKg) });

const WORKBOOK = "DEN UK insulin pump workbook p. 12";
const EXAMPLES: Example[] = [
  { id: "W1 injections", source: WORKBOOK, exact: () => sum(24, 20), expected: 44 },
  { id: "W1 pump dose", source: WORKBOOK, exact: () => valueOfMethod("injections-0.70", injections(44)), expected: 30.8, printed: [30, "down", 1] },
  { id: "W1 basal of a day", source: WORKBOOK, exact: () => half(30.8), expected: 15.4, printed: [15, "down", 1] },
  { id: "W1 basal rate", source: WORKBOOK, exact: () => hourly(half(30.8)), expected: 0.6417, printed: [0.6, "down", 0.1] },
  { id: "W2", source: "UK pump e-learning, CHO ratio topic", exact: () => valueOfMethod("ratio-400", dose(30)), expected: 13.333, printed: [13, "down", 1] },
  { id: "W3 pump dose", source: "supplier nurse leaflet 2025", exact: () => valueOfMethod("injections-0.75", injections(40)), expected: 30, printed: [30, "nearest", 1] },
  { id: "W3 basal rate", source: "supplier nurse leaflet 2025", exact: () => hourly(half(30)), expected: 0.625, printed: [0.6, "nearest", 0.1] },
  { id: "W4 dose", source: "RCH, understanding the dose settings", exact: () => sum(20, 10, 10, 10), expected: 50 },
  { id: "W4 ratio", source: "RCH, understanding the dose settings", exact: () => valueOfMethod("ratio-500", dose(50)), expected: 10 },
  { id: "W4 for 15 g", source: "RCH, understanding the dose settings", exact: () => evaluateFormula(MEAL, { grams: n(15), ratio: n(10) }), expected: 1.5 },
  { id: "W5", source: "Hamilton Health Sciences 2014", exact: () => rates([0, 0.5], [4, 1.5], [8, 1]), expected: 24 },
  { id: "W6", source: "UK e-learning pump-failure plan", exact: () => backUp("back-up-1.0", DAY_18), expected: 18 },
  { id: "W7", source: "Finnish Health Village backup page 2023", exact: () => backUp("back-up-1.2", DAY_20), expected: 24 },
  { id: "W8", source: "US diabetes charity, backup plan 2020", exact: () => rates([0, 0.85]), expected: 20.4, printed: [20, "nearest", 1] },
  { id: "W9 active", source: "textbook chapter", exact: () => perKg("weight-0.3-active", 70), expected: 21 },
  { id: "W9 sedentary", source: "textbook chapter", exact: () => perKg("weight-0.5-sedentary", 70), expected: 35 },
  { id: "W9 large meals", source: "textbook chapter", exact: () => perKg("weight-0.6-large-meals", 70), expected: 42 },
  { id: "W10 dose", source: "family-practice notebook", exact: () => perKg("weight-0.3-active", 110), expected: 33, printed: [35, "nearest", 5] },
  { id: "W10 ratio", source: "family-practice notebook", exact: () => valueOfMethod("ratio-500", dose(35)), expected: 14.286, printed: [14, "down", 1] },
  { id: "W10 sensitivity", source: "family-practice notebook", exact: () => valueOfMethod("sensitivity-1800", dose(35)), expected: 51.429, printed: [50, "nearest", 5] },
  { id: "W11", source: "family-practice notebook", exact: () => valueOfMethod("sensitivity-4.5-ratio", { carbRatio: n(6) }), expected: 27 },
  { id: "W12", source: "Children with Diabetes team, 2001", exact: () => evaluateFormula(MEAL, { grams: n(38), ratio: n(15) }), expected: 2.533, printed: [2.5, "nearest", 0.1] },
  { id: "W13", source: "textbook excerpt", exact: () => valueOfMethod("ratio-500", dose(50)), expected: 10 },
  { id: "W14 low end", source: "Alberta Health basal test", exact: () => evaluateFormula(BAND_LOW, { start: n(7), band: n(1.7) }), expected: 5.3 },
  { id: "W14 high end", source: "Alberta Health basal test", exact: () => evaluateFormula(BAND_HIGH, { start: n(7), band: n(1.7) }), expected: 8.7 },
  { id: "W15 low end", source: "Joslin blog 2013", exact: () => evaluateFormula(BAND_LOW, { start: n(100), band: n(40) }), expected: 60 },
  { id: "W15 high end", source: "Joslin blog 2013", exact: () => evaluateFormula(BAND_HIGH, { start: n(100), band: n(40) }), expected: 140 },
  { id: "W16", source: "Alder Hey leaflet", exact: () => evaluateFormula(SHARE, { dose: n(50) }), expected: 10 },
  { id: "W17, a fifth of a dose of 100 U", source: "ICMR table I, after ISPAD 2018", exact: () => evaluateFormula(SHARE, { dose: n(100) }), expected: 20 },
  { id: "W18", source: "ICMR travel box", exact: () => evaluateFormula(TRAVEL, { dose: n(30), hoursWest: n(-6) }), expected: 19.5 },
  { id: "W19", source: "ICMR travel box", exact: () => evaluateFormula(TRAVEL, { dose: n(30), hoursWest: n(6) }), expected: 34.5 },
  { id: "W20", source: "Pumping Insulin workspace 9.1", exact: () => over(n(210), n(7)), expected: 30 },
  { id: "W21 ratio", source: "parent mailing list", exact: () => valueOfMethod("ratio-500", dose(16)), expected: 31.25 },
  { id: "W21 sensitivity", source: "parent mailing list", exact: () => valueOfMethod("sensitivity-1800", dose(16)), expected: 112.5 },
  { id: "W22", source: "teaching centre, quoted", exact: () => pounds("weight-pounds-over-4", 160), expected: 40 },
  { id: "W23", source: "quoted", exact: () => valueOfMethod("ratio-450", dose(36)), expected: 12.5, printed: [12, "down", 1] },
  { id: "W24", source: "RCH line failure (example computed)", exact: () => backUp("back-up-sixth", DAY_18, 42), expected: 7 },
  { id: "W25 dose", source: "general health article", exact: () => pounds("weight-pounds-over-4", 280), expected: 70 },
  { id: "W25 basal", source: "general health article", exact: () => half(52), expected: 26 },
];

describe("worked examples of settings.md 2", () => {
  it.each(EXAMPLES)("$id is $expected ($source)", ({ exact, expected, printed }) => {
    const value = exact();
    if (value === null) throw new Error("an input is missing");
    expect(Math.abs(toNumber(value) - expected)).toBeLessThanOrEqual(1e-3);
    if (!printed) return;
    const [shown, direction, step] = printed;
    expect(toNumber(roundToStep(value, publishedRounding(direction, step)))).toBe(shown);
  });

  it("covers W1 to W25", () => {
    const covered = new Set(EXAMPLES.map(({ id }) => Number(/^W(\d+)/.exec(id)?.[1])));
    expect([...covered].toSorted((a, b) => a - b)).toEqual(Array.from({ length: 25 }, (_, i) => i + 1));
  });

  it("W1 as the booklet does it, cutting off at each step: 44, 30, 15, 0.6", () => {
    const down = (value: Fraction, step: number) => roundToStep(value, publishedRounding("down", step));
    const pumpDose = down(valueOfMethod("injections-0.70", injections(44)), 1);
    const basalOfADay = down(valueOfMethod("basal-0.50", { totalDailyDose: pumpDose }), 1);
    expect([pumpDose, basalOfADay, down(hourly(basalOfADay), 0.1)].map(toNumber)).toEqual([30, 15, 0.6]);
  });

  it("does not repeat the source errors: 18 x (0.9 + 12/24) is 25.2, not the printed 7.2", () => {
    const value = evaluateFormula(TRAVEL, { dose: n(18), hoursWest: n(12) });
    expect(value && toNumber(value)).toBe(25.2);
  });
});

/** The machine-readable core of settings.md 2, as it stands there; tolerance 1e-3. */
const CORE = [
  { id: "REF35", kg: 80, tddInj: 40, m1: 30, m2: 40, avg: 35, basal40: 14, basal40Hr: 0.5833, icr500: 14.286, isf1800: 51.429, isf100: 2.857, isf1960: 56.0 },
  { id: "REF30", tdd: 30, basal40: 12, basal40Hr: 0.5, basal50Hr: 0.625, icr500: 16.667, isf1800: 60, isf100: 3.333, isf1960: 65.333 },
] as const;

describe("the machine-readable core of settings.md 2", () => {
  it.each(CORE)("$id", (row) => {
    const total = "avg" in row ? row.avg : row.tdd;
    const at = (id: string) => toNumber(valueOfMethod(id, dose(total)));
    const perHour = (id: string) => toNumber(hourly(valueOfMethod(id, dose(total))));
    expect(at("basal-0.40")).toBeCloseTo(row.basal40, 3);
    expect(Math.abs(perHour("basal-0.40") - row.basal40Hr)).toBeLessThanOrEqual(1e-3);
    expect(Math.abs(at("ratio-500") - row.icr500)).toBeLessThanOrEqual(1e-3);
    expect(Math.abs(at("sensitivity-1800") - row.isf1800)).toBeLessThanOrEqual(1e-3);
    expect(Math.abs(at("sensitivity-1800") / 18 - row.isf100)).toBeLessThanOrEqual(1e-3);
    expect(Math.abs(at("sensitivity-1960") - row.isf1960)).toBeLessThanOrEqual(1e-3);
    if ("basal50Hr" in row) expect(perHour("basal-0.50")).toBe(row.basal50Hr);
    if ("m1" in row) {
      const inputs = { injectionsDailyDose: n(row.tddInj), weightKg: n(row.kg) };
      expect(toNumber(valueOfMethod("injections-0.75", inputs))).toBe(row.m1);
      expect(toNumber(valueOfMethod("weight-0.5", inputs))).toBe(row.m2);
      expect(toNumber(valueOfMethod("mean-of-two", inputs))).toBe(row.avg);
    }
  });
});
