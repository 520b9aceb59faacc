import { describe, expect, it } from "vitest";
import { STATE, STATE_SIZE } from "./model";
import { NOMINAL_PARAMETERS as P } from "./parameters";
import { stepperOf } from "./runge-kutta";
import { steadyStateAt } from "./steady-state";

/** Glucose in the gut, mmol: what the stepper makes of 100 mmol eaten, and the known solution. */
function gutAfterAnHour(stepMinutes: number) {
  const state = new Float64Array(STATE_SIZE);
  state[STATE.meal1] = 100;
  const step = stepperOf(P);
  for (let i = 0; i < 60 / stepMinutes; i++) step(state, stepMinutes, 0, 1);
  const decay = Math.exp(-60 / 40);
  return { first: state[STATE.meal1], second: state[STATE.meal2], exactFirst: 100 * decay, exactSecond: 100 * (60 / 40) * decay };
}

describe("stepperOf", () => {
  // dD1/dt = -D1/40 and dD2/dt = (D1 - D2)/40 from D1 = 100: D1 = 100 e^(-t/40), D2 = 100 (t/40) e^(-t/40).
  it("follows a known solution", () => {
    const { first, second, exactFirst, exactSecond } = gutAfterAnHour(0.5);
    expect(first).toBeCloseTo(exactFirst, 7);
    expect(second).toBeCloseTo(exactSecond, 7);
  });

  it("is of the fourth order: a step four times shorter is 256 times as accurate", () => {
    const error = (stepMinutes: number) => {
      const { second, exactSecond } = gutAfterAnHour(stepMinutes);
      return Math.abs(second! - exactSecond);
    };
    expect(error(4) / error(1)).toBeGreaterThan(220);
    expect(error(4) / error(1)).toBeLessThan(290);
  });

  it("keeps a steady state where it is", () => {
    const { basalUnitsPerHour, state } = steadyStateAt(P, 6);
    const before = state.slice();
    const step = stepperOf(P);
    for (let i = 0; i < 288; i++) step(state, 5, (basalUnitsPerHour * 1000) / 60, 1);
    state.forEach((value, i) => expect(Math.abs(value - before[i]!)).toBeLessThan(1e-8));
  });
});
