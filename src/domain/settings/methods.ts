import { AppError } from "@/domain/errors";
import type { FormulaInputs } from "./formula";
import type { Fraction } from "./fraction";
import { evaluateMethod, type Method, type MethodInput, type MethodPopulation, type MethodSetting } from "./method";
import { BASAL_METHODS } from "./methods-basal";
import { CARB_RATIO_METHODS } from "./methods-carb-ratio";
import { DOSE_BY_REGIMEN_METHODS } from "./methods-dose-by-regimen";
import { DOSE_BY_WEIGHT_METHODS } from "./methods-dose-by-weight";
import { DOSE_EDUCATOR_ONLY_METHODS } from "./methods-dose-educator-only";
import { DURATION_METHODS } from "./methods-duration";
import { SENSITIVITY_METHODS } from "./methods-sensitivity";

/** Every published rule of settings.md 1.1 to 1.7, in the order in which it is shown. */
export const METHODS: ReadonlyArray<Method> = [
  ...DOSE_BY_REGIMEN_METHODS,
  ...DOSE_BY_WEIGHT_METHODS,
  ...DOSE_EDUCATOR_ONLY_METHODS,
  ...BASAL_METHODS,
  ...CARB_RATIO_METHODS,
  ...SENSITIVITY_METHODS,
  ...DURATION_METHODS,
];

/** The rules of one setting that were written for one group of people. */
export function methodsFor(setting: MethodSetting, population: MethodPopulation): Method[] {
  return METHODS.filter((method) => method.setting === setting && method.population === population);
}

/** @throws {AppError} NOT_FOUND for an id that is in no table */
export function methodById(id: string): Method {
  const method = METHODS.find((candidate) => candidate.id === id);
  if (!method) throw new AppError("NOT_FOUND", `method ${id}`);
  return method;
}

/**
 * The exact value of one rule.
 *
 * @throws {AppError} NOT_FOUND for an unknown id; INVALID_INPUT when an input the rule needs is not known
 */
export function valueOfMethod(id: string, inputs: FormulaInputs<MethodInput>): Fraction {
  const value = evaluateMethod(methodById(id), inputs);
  if (value === null) throw new AppError("INVALID_INPUT", `an input of ${id} is not known`);
  return value;
}
