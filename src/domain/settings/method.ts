import { evaluateFormula, type Formula, type FormulaInputs } from "./formula";
import type { Fraction } from "./fraction";
import type { Provenance } from "./provenance";

/**
 * What a published rule may need. Doses in U a day, weight in kilograms or
 * pounds, carb ratio in g/U.
 */
export type MethodInput =
  | "weightKg"
  | "weightPounds"
  | "injectionsDailyDose"
  | "pumpDailyDose"
  | "totalDailyDose"
  | "basalDailyDose"
  | "carbRatio";

export type MethodSetting = "totalDailyDose" | "basal" | "carbRatio" | "sensitivity" | "durationOfAction";

/** Whom the source speaks about. A rule is shown only to the people it was written for. */
export type MethodPopulation = "adult" | "child" | "pregnancy" | "type-2" | "regular-insulin";

/**
 * One published rule, as data. The value comes out in U/day (total daily dose,
 * basal), g/U (carb ratio), mg/dL per U (sensitivity) or minutes (duration).
 */
export type Method = Readonly<{
  id: string;
  setting: MethodSetting;
  label: string;
  formula: Formula<MethodInput>;
  population: MethodPopulation;
  source: string;
  provenance: Provenance;
}>;

/**
 * Work a published rule out, exactly and unrounded.
 *
 * @returns `null` when an input the rule needs is not known
 */
export function evaluateMethod(method: Method, inputs: FormulaInputs<MethodInput>): Fraction | null {
  return evaluateFormula(method.formula, inputs);
}

/** A row of a table of rules: id, label, formula, population, source, provenance. */
export type MethodRow = readonly [
  id: string,
  label: string,
  formula: Formula<MethodInput>,
  population: MethodPopulation,
  source: string,
  provenance: Provenance,
];

/** The rules of one setting from the rows of their table. */
export function methodTable(setting: MethodSetting, rows: ReadonlyArray<MethodRow>): Method[] {
  return rows.map(([id, label, formula, population, source, provenance]) => ({
    id,
    setting,
    label,
    formula,
    population,
    source,
    provenance,
  }));
}
