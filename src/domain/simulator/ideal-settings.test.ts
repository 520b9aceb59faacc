import { describe, expect, it } from "vitest";
import { idealSettings } from "./ideal-settings";
import { NOMINAL_PARAMETERS } from "./parameters";
import { referenceRun } from "./reference-run";
import { steadyStateAt } from "./steady-state";

describe("idealSettings", () => {
  const ideal = idealSettings(NOMINAL_PARAMETERS);

  it("takes the basal that holds 6.2 mmol/L", () => {
    expect(ideal.basalUnitsPerHour).toBe(steadyStateAt(NOMINAL_PARAMETERS, 6.2).basalUnitsPerHour);
  });

  // The same question asked of the run that is held to outside values.
  it("takes the fall 240 min after 0.2 U for the sensitivity, and fall over rise for the ratio", () => {
    const at240 = (kind: "bolus" | "meal", value: number) =>
      referenceRun(NOMINAL_PARAMETERS, [{ kind, minute: 0, value }], { startMmol: 6.2, untilMinute: 240, everyMinutes: 240 })[1]!.glucoseMmol;
    const fall = (6.2 - at240("bolus", 0.2)) / 0.2;
    const rise = (at240("meal", 10) - 6.2) / 10;
    expect(ideal.sensitivityMmolPerUnit).toBeCloseTo(fall, 4);
    expect(ideal.carbRatioGramsPerUnit).toBeCloseTo(fall / rise, 3);
  });

  it("asks less insulin of a more sensitive person", () => {
    const factor = 1.5;
    const { transportSensitivity, disposalSensitivity, liverSensitivity } = NOMINAL_PARAMETERS;
    const sensitive = idealSettings({
      ...NOMINAL_PARAMETERS,
      transportSensitivity: transportSensitivity * factor, disposalSensitivity: disposalSensitivity * factor, liverSensitivity: liverSensitivity * factor,
    });
    expect(sensitive.basalUnitsPerHour).toBeCloseTo(ideal.basalUnitsPerHour / factor, 9);
    expect(sensitive.sensitivityMmolPerUnit).toBeGreaterThan(ideal.sensitivityMmolPerUnit);
    expect(sensitive.carbRatioGramsPerUnit).toBeGreaterThan(ideal.carbRatioGramsPerUnit);
  });
});
