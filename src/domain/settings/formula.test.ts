import { describe, expect, it } from "vitest";
import { evaluateFormula } from "./formula";
import { fraction, fractionOf, toNumber } from "./fraction";

describe("evaluateFormula", () => {
  it("multiplies a constant with its inputs and divides by others", () => {
    const formula = [{ constant: 6, times: ["kg"], over: ["dose"] }] as const;
    expect(evaluateFormula(formula, { kg: fractionOf(80), dose: fractionOf(40) })).toEqual(fractionOf(12));
  });

  it("adds its terms", () => {
    const formula = [{ constant: 217, over: ["dose"] }, { constant: 3 }] as const;
    expect(evaluateFormula(formula, { dose: fractionOf(40) })).toEqual(fractionOf(8.425));
  });

  it("keeps a divisor without a short decimal exact", () => {
    const formula = [{ constant: 1, times: ["dose"], dividedBy: 6 }] as const;
    expect(evaluateFormula(formula, { dose: fractionOf(41) })).toEqual(fraction(41n, 6n));
  });

  it("gives a constant without any input", () => {
    expect(evaluateFormula([{ constant: 240 }], {})).toEqual(fractionOf(240));
  });

  it.each([[{ constant: 1, times: ["kg"] }] as const, [{ constant: 1, over: ["kg"] }] as const])(
    "has no answer while an input is missing",
    (...formula) => {
      expect(evaluateFormula<"kg">(formula, {})).toBeNull();
    },
  );

  it("refuses to divide by a dose of zero", () => {
    const formula = [{ constant: 500, over: ["dose"] }] as const;
    expect(() => evaluateFormula(formula, { dose: fractionOf(0) })).toThrow(
      expect.objectContaining({ code: "INVALID_INPUT" }),
    );
  });

  it("is empty for no terms", () => {
    expect(toNumber(evaluateFormula([], {}) ?? fractionOf(1))).toBe(0);
  });
});
