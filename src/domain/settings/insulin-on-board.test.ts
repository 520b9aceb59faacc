import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { insulinOnBoardFraction, linearOnBoardFraction, twoCompartmentOnBoardFraction } from "./insulin-on-board";

vi.setConfig({ testTimeout: 60_000 });

const refused = (code: string) => expect.objectContaining({ code }) as Error;

describe("insulin on board", () => {
  it.each([
    [0, 1],
    [60, 0.7024],
    [120, 0.359],
    [180, 0.1619],
    [240, 0.0683],
    [360, 0.0108],
  ])("two compartments, 55 min: after %s min %s of the dose (settings.md 1.8, computed there)", (minutes, expected) => {
    expect(twoCompartmentOnBoardFraction(minutes, 55)).toBeCloseTo(expected, 4);
  });

  it.each([
    [0, 1],
    [60, 0.75],
    [120, 0.5],
    [180, 0.25],
    [240, 0],
    [300, 0],
  ])("a straight line over 4 h: after %s min %s (settings.md 1.8, computed there)", (minutes, expected) => {
    expect(linearOnBoardFraction(minutes, 240)).toBe(expected);
  });

  it.each([120, 180, 240, 300, 390])("leaves 5 %% at a duration of %s min", (durationMinutes) => {
    expect(insulinOnBoardFraction(durationMinutes, durationMinutes)).toBeCloseTo(0.05, 12);
    expect(insulinOnBoardFraction(0, durationMinutes)).toBe(1);
  });

  it.each([
    [-1, 240],
    [Number.NaN, 240],
    [60, 0],
    [60, -240],
    [60, Number.POSITIVE_INFINITY],
  ])("refuses %s minutes over a duration of %s", (minutes, duration) => {
    expect(() => insulinOnBoardFraction(minutes, duration)).toThrow(refused("INVALID_RANGE"));
    expect(() => linearOnBoardFraction(minutes, duration)).toThrow(refused("INVALID_RANGE"));
  });

  it("stays between 0 and 1, only falls with time, and lasts longer with a longer duration", () => {
    const minutes = fc.integer({ min: 0, max: 1440 });
    const duration = fc.integer({ min: 60, max: 700 });
    fc.assert(
      fc.property(minutes, minutes, duration, (a, b, durationMinutes) => {
        const [early, late] = [Math.min(a, b), Math.max(a, b)];
        for (const form of [insulinOnBoardFraction, linearOnBoardFraction]) {
          expect(form(late, durationMinutes)).toBeLessThanOrEqual(form(early, durationMinutes));
          expect(form(late, durationMinutes)).toBeGreaterThanOrEqual(0);
          expect(form(early, durationMinutes)).toBeLessThanOrEqual(1);
          expect(form(a, durationMinutes + 20)).toBeGreaterThanOrEqual(form(a, durationMinutes));
        }
      }),
      { numRuns: 10_000 },
    );
  });
});
