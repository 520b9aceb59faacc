import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { automaticRate, bolusUnits, missingUnits, predictedMmol, wantsCorrection } from "./loop";
import { insulinOnBoard } from "./on-board";

const AT = { basalUnitsPerHour: 1, sensitivityMmolPerUnit: 2, carbRatioGramsPerUnit: 10, aimMmol: 6.1, gain: 0.35 };

describe("insulinOnBoard", () => {
  // By hand: (1 + t/90) e^(-t/90) is 2/e at 90 min and 5 e^-4 at 360 min.
  it("remembers (1 + t/90) e^(-t/90) of what was given, for six hours", () => {
    const given = new Float64Array(200);
    given[100] = 2;
    expect(insulinOnBoard(given, 118)).toBeCloseTo(4 / Math.E, 12);
    expect(insulinOnBoard(given, 172)).toBeCloseTo(10 * Math.exp(-4), 12);
    expect(insulinOnBoard(given, 173)).toBe(0);
    expect(insulinOnBoard(given, 100)).toBe(0);
  });

  it("is below zero when less than programmed was given", () => {
    expect(insulinOnBoard(Float64Array.of(-0.1, -0.1, 0), 2)).toBeLessThan(0);
  });
});

describe("predictedMmol", () => {
  it("goes on with the last twenty minutes, within limits", () => {
    expect(predictedMmol(8, 7)).toBeCloseTo(9.5, 12);
    expect(predictedMmol(8, 2)).toBeCloseTo(12.5, 12);
    expect(predictedMmol(8, 20)).toBeCloseTo(3.5, 12);
  });
});

describe("automaticRate", () => {
  const seen = (nowMmol: number, onBoardUnits = 0) => ({ nowMmol, earlierMmol: nowMmol, onBoardUnits });

  // By hand: need (8.1 - 6.1) / 2 = 1 U; 1 + .35 * 1 * 60 / 40 = 1.525 U/h.
  it("adds a share of the need to what is programmed", () => {
    expect(automaticRate(seen(8.1), AT)).toBeCloseTo(1.525, 12);
    expect(automaticRate(seen(8.1, 0.4), AT)).toBeCloseTo(1.315, 12);
    expect(automaticRate(seen(8.1, -3), AT)).toBeCloseTo(1.525, 12);
    expect(automaticRate(seen(6.1), AT)).toBe(1);
  });

  it("is off below 4.6 mmol/L and at most two and a half times what is programmed", () => {
    expect(automaticRate(seen(4.59), AT)).toBe(0);
    expect(automaticRate(seen(4.6), AT)).toBeGreaterThan(0);
    expect(automaticRate(seen(25), AT)).toBe(2.5);
    expect(automaticRate(seen(5, 9), AT)).toBe(0);
  });

  it("never falls when glucose is higher, and stays within its bounds", () => {
    const glucose = fc.double({ min: 2, max: 30, noNaN: true });
    fc.assert(
      fc.property(glucose, glucose, fc.double({ min: -5, max: 10, noNaN: true }), (a, b, onBoardUnits) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)].map((g) => automaticRate(seen(g, onBoardUnits), AT));
        expect(high!).toBeGreaterThanOrEqual(low!);
        expect(low!).toBeGreaterThanOrEqual(0);
        expect(high!).toBeLessThanOrEqual(2.5);
      }),
    );
  });
});

describe("bolusUnits", () => {
  // By hand at 10 g/U, 2 mmol/L per U, aim 6.1: 60 g are 6 U; 8.1 is 1 U more; 4.1 is 1 U less.
  it.each([[60, 6.1, 0, 6], [60, 8.1, 0, 7], [60, 8.1, 0.4, 6.6], [60, 4.1, 3, 5], [0, 10.1, 0.5, 1.5], [5, 3.1, 0, 0], [0, 10.1, 5, 0]])(
    "for %s g at %s mmol/L with %s U on board is %s U", (grams, glucose, onBoard, units) => expect(bolusUnits(grams, glucose, onBoard, AT)).toBeCloseTo(units, 12),
  );

  it("is missingUnits where nothing is eaten", () => expect(bolusUnits(0, 9, 0.2, AT)).toBe(missingUnits(9, 6.1, 2, 0.2)));
});

describe("wantsCorrection", () => {
  const noon = 144;
  it("corrects when high, awake, long after a meal and after the last correction", () => {
    expect(wantsCorrection(noon, 10.6, noon - 31, noon - 37)).toBe(true);
    expect(wantsCorrection(noon, 10.5, noon - 31, noon - 37)).toBe(false);
    expect(wantsCorrection(noon, 10.6, noon - 30, noon - 37)).toBe(false);
    expect(wantsCorrection(noon, 10.6, noon - 31, noon - 36)).toBe(false);
    expect(wantsCorrection(noon + 3, 10.6, noon - 31, noon - 37)).toBe(false);
  });

  it.each([[83, false], [84, true], [275, false], [270, true], [276, false]])("at slot %s of a day: %s", (slot, expected) => {
    expect(wantsCorrection(288 + slot, 15, 0, 0)).toBe(expected);
  });
});
