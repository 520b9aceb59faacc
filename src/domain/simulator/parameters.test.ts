import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { GLUCOSE_GRAMS_PER_MOL, NOMINAL_PARAMETERS as P } from "./parameters";

const FILE = join(process.cwd(), "../shared/data/simulator/parameters.csv");

// The symbols of the paper, as two public re-implementations of it have them.
const OF_SYMBOL: Record<string, number> = {
  k12: P.returnPerMinute, ka1: P.transportActivationPerMinute, ka2: P.disposalActivationPerMinute,
  ka3: P.liverActivationPerMinute, ke: P.eliminationPerMinute, VI: P.insulinVolumeLPerKg, VG: P.glucoseVolumeLPerKg,
  AG: P.absorbedFraction, tmaxG: P.mealPeakMinutes, tmaxI: P.insulinPeakMinutes, SIT: P.transportSensitivity,
  SID: P.disposalSensitivity, SIE: P.liverSensitivity, EGP0: P.liverMmolPerKgMinute, F01: P.brainMmolPerKgMinute,
  kaint: P.sensorPerMinute, BW_reference: P.bodyWeightKg, molar_mass_glucose: GLUCOSE_GRAMS_PER_MOL,
};

describe("NOMINAL_PARAMETERS", () => {
  it("are all above zero", () => expect(Object.values(P).every((value) => value > 0)).toBe(true));
});

describe.skipIf(!existsSync(FILE))("NOMINAL_PARAMETERS against shared/data/simulator (skipped where it is absent)", () => {
  it("are the published values", () => {
    const rows = readFileSync(FILE, "utf8").trim().split("\n").slice(1).map((line) => line.split(","));
    expect(rows).toHaveLength(18);
    for (const [symbol, value] of rows) expect(OF_SYMBOL[symbol!], symbol).toBe(Number(value));
  });
});
