import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { derivativeOf, STATE_SIZE } from "./model";
import { NOMINAL_PARAMETERS } from "./parameters";
import { steadyStateAt } from "./steady-state";

const FILE = join(process.cwd(), "../shared/data/simulator/steady_states.csv");

describe("steadyStateAt", () => {
  // comparison.md 5: steady basal at G = 6 of the 70 kg reference person, from scipy.
  it("finds the published basal of the reference person", () => {
    expect(steadyStateAt(NOMINAL_PARAMETERS, 6).basalUnitsPerHour).toBeCloseTo(0.385718, 6);
  });

  it("is a state in which nothing moves, at any glucose that can be held", () => {
    const out = new Float64Array(STATE_SIZE);
    fc.assert(
      fc.property(fc.double({ min: 0.5, max: 20, noNaN: true }), fc.double({ min: 0.3, max: 3, noNaN: true }), (glucoseMmol, factor) => {
        const parameters = { ...NOMINAL_PARAMETERS, disposalSensitivity: NOMINAL_PARAMETERS.disposalSensitivity * factor };
        const { basalUnitsPerHour, state } = steadyStateAt(parameters, glucoseMmol);
        derivativeOf(parameters)(state, (basalUnitsPerHour * 1000) / 60, 1, out);
        for (const rate of out) expect(Math.abs(rate)).toBeLessThan(1e-9);
      }),
    );
  });

  it("needs less insulin to hold a higher glucose above 4.5 mmol/L", () => {
    const basal = [5, 6, 8, 10].map((g) => steadyStateAt(NOMINAL_PARAMETERS, g).basalUnitsPerHour);
    expect(basal).toEqual(basal.toSorted((a, b) => b - a));
  });

  it.each([0, -1, Number.NaN, 40])("has none at %s mmol/L", (glucoseMmol) => {
    expect(() => steadyStateAt(NOMINAL_PARAMETERS, glucoseMmol)).toThrow(expect.objectContaining({ code: "INVALID_RANGE" }));
  });
});

describe.skipIf(!existsSync(FILE))("steadyStateAt against shared/data/simulator (skipped where it is absent)", () => {
  const rows = existsSync(FILE) ? readFileSync(FILE, "utf8").trim().split("\n").slice(1).map((line) => line.split(",").map(Number)) : [];
  it.each(rows)("agrees with scipy at %s mmol/L", (glucoseMmol, basal, ...state) => {
    const found = steadyStateAt(NOMINAL_PARAMETERS, glucoseMmol);
    expect(found.basalUnitsPerHour).toBeCloseTo(basal, 9);
    state.forEach((value, i) => expect(Math.abs(found.state[i]! - value)).toBeLessThan(1e-8 * Math.max(1, value)));
  });
});
