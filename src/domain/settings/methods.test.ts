import { describe, expect, it } from "vitest";
import { fractionOf, toNumber } from "./fraction";
import { evaluateMethod } from "./method";
import { METHODS, methodById, methodsFor, valueOfMethod } from "./methods";
import { PROVENANCE } from "./provenance";

/** The reference person of settings.md 1.9: 80 kg, 176.37 lb, 40 U a day. */
const REFERENCE = {
  weightKg: fractionOf(80),
  weightPounds: fractionOf(176.37),
  injectionsDailyDose: fractionOf(40),
  pumpDailyDose: fractionOf(40),
  totalDailyDose: fractionOf(40),
  basalDailyDose: fractionOf(16),
  carbRatio: fractionOf(12.5),
};

const value = (id: string) => toNumber(valueOfMethod(id, REFERENCE));

describe("the published rules", () => {
  it.each([
    ["injections-0.75", 30],
    ["weight-0.5", 40],
    ["mean-of-two", 35],
    ["weight-0.23-pounds", 40.57],
    ["basal-0.30", 12],
    ["basal-0.345", 13.8],
    ["basal-0.40", 16],
    ["basal-0.476", 19.04],
    ["basal-0.50", 20],
    ["basal-0.2-per-kg", 16],
    ["basal-0.232-per-kg", 18.56],
    ["ratio-300-breakfast", 7.5],
    ["ratio-314", 7.85],
    ["ratio-217-plus-3", 8.43],
    ["ratio-400", 10],
    ["ratio-450", 11.25],
    ["ratio-2.6-pounds", 11.46],
    ["ratio-6-kg", 12],
    ["ratio-2.8-pounds", 12.35],
    ["ratio-500", 12.5],
    ["sensitivity-1500", 37.5],
    ["sensitivity-1076-plus-12", 38.9],
    ["sensitivity-1700", 42.5],
    ["sensitivity-1800", 45],
    ["sensitivity-1960", 49],
  ])("%s gives %s for the reference person (settings.md 1.9, computed there)", (id, expected) => {
    expect(Math.abs(value(id) - expected)).toBeLessThanOrEqual(0.00501);
  });

  it.each([
    ["sensitivity-1500", 2.08],
    ["sensitivity-1700", 2.36],
    ["sensitivity-1800", 2.5],
    ["sensitivity-1960", 2.72],
  ])("%s is %s mmol/L for one unit when divided by 18 (settings.md 1.6)", (id, expected) => {
    expect(value(id) / 18).toBeCloseTo(expected, 2);
  });

  it("has the kg form of 2.6 x pounds at 5.73 and of 2.8 x pounds at 6.17 (settings.md 1.5, computed there)", () => {
    expect((value("ratio-2.6-pounds") * 40) / 80).toBeCloseTo(5.73, 2);
    expect((value("ratio-2.8-pounds") * 40) / 80).toBeCloseTo(6.17, 2);
  });

  it("disagrees by design: 7.5 to 12.5 g/U for one person (settings.md, read this first, 2)", () => {
    const ratios = methodsFor("carbRatio", "adult").map(({ id }) => value(id));
    expect(Math.max(...ratios)).toBe(12.5);
    expect(Math.min(...ratios)).toBeLessThanOrEqual(7.5);
  });
});

describe("the table of rules", () => {
  it("has every id once", () => {
    const ids = METHODS.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it.each(METHODS)("$id has words, a source and a known provenance", ({ label, source, provenance }) => {
    expect(label).not.toBe("");
    expect(source).not.toBe("");
    expect(Object.keys(PROVENANCE)).toContain(provenance);
  });

  it.each(METHODS)("$id gives a positive number for the reference person", (method) => {
    const result = evaluateMethod(method, REFERENCE);
    expect(result && toNumber(result)).toBeGreaterThan(0);
  });

  it("shows an adult none of the rules for children, pregnancy, type 2 or regular insulin", () => {
    const shown = methodsFor("carbRatio", "adult").map(({ id }) => id);
    expect(shown).not.toContain("ratio-300-child");
    expect(shown).not.toContain("ratio-365-type-2");
    expect(shown).not.toContain("ratio-450-regular");
  });

  it("leaves the three figures out whose original was not seen (settings.md 1.5)", () => {
    const constants = METHODS.flatMap(({ formula }) => formula.map(({ constant }) => constant));
    for (const constant of [301, 309, 317, 331, 362, 376]) expect(constants).not.toContain(constant);
  });

  it("gives no value while an input is missing", () => {
    expect(evaluateMethod(methodById("ratio-500"), {})).toBeNull();
    expect(() => valueOfMethod("ratio-500", {})).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
  });

  it("does not know a rule that is in no table", () => {
    expect(() => methodById("ratio-1")).toThrow(expect.objectContaining({ code: "NOT_FOUND" }));
  });
});
