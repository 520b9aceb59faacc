import { fractionOf, over, plus, times, type Fraction } from "./fraction";

/**
 * One summand of a published rule: a constant times some inputs, divided by
 * others. "1800 / TDD" is `{ constant: 1800, over: ["totalDailyDose"] }`;
 * "6.17 x kg / TDD" has an input on both sides.
 */
export type Term<Input extends string> = Readonly<{
  constant: number;
  times?: ReadonlyArray<Input>;
  over?: ReadonlyArray<Input>;
  /** A constant divisor that has no short decimal, as the 6 of "TDD / 6". */
  dividedBy?: number;
}>;

/** The sum of its terms. */
export type Formula<Input extends string> = ReadonlyArray<Term<Input>>;

export type FormulaInputs<Input extends string> = Readonly<Partial<Record<Input, Fraction>>>;

/**
 * Work a rule out exactly. The rules are data (see the `methods-*` files); this
 * is the only place that computes them.
 *
 * @returns the exact value, or `null` when an input the rule needs is not there
 * @throws {AppError} INVALID_INPUT when an input divided by is zero
 */
export function evaluateFormula<Input extends string>(
  formula: Formula<Input>,
  inputs: FormulaInputs<Input>,
): Fraction | null {
  let sum = fractionOf(0);
  for (const term of formula) {
    let value = over(fractionOf(term.constant), fractionOf(term.dividedBy ?? 1));
    for (const name of term.times ?? []) {
      const input = inputs[name];
      if (!input) return null;
      value = times(value, input);
    }
    for (const name of term.over ?? []) {
      const input = inputs[name];
      if (!input) return null;
      value = over(value, input);
    }
    sum = plus(sum, value);
  }
  return sum;
}
