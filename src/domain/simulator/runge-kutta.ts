import { derivativeOf, STATE_SIZE } from "./model";
import type { ModelParameters } from "./parameters";

/** Moves a state on in place by a number of minutes, insulin held constant meanwhile. */
export type Stepper = (
  state: Float64Array, minutes: number, insulinMilliUnitsPerMinute: number, sensitivityFactor: number,
) => void;

/**
 * The classic fourth-order method of Runge and Kutta with a fixed step, for one person.
 *
 * Against the reference run it is off by at most 9e-4 mmol/L with steps of 5 min and
 * 6e-6 with half a minute. The scratch space is made once: a step allocates nothing.
 */
export function stepperOf(parameters: ModelParameters): Stepper {
  const derivative = derivativeOf(parameters);
  const k1 = new Float64Array(STATE_SIZE), k2 = new Float64Array(STATE_SIZE);
  const k3 = new Float64Array(STATE_SIZE), k4 = new Float64Array(STATE_SIZE), at = new Float64Array(STATE_SIZE);

  const moveTo = (state: Float64Array, minutes: number, slope: Float64Array) => {
    for (let i = 0; i < STATE_SIZE; i++) at[i] = (state[i] ?? 0) + minutes * (slope[i] ?? 0);
  };
  return (state, minutes, insulin, factor) => {
    derivative(state, insulin, factor, k1);
    moveTo(state, minutes / 2, k1);
    derivative(at, insulin, factor, k2);
    moveTo(state, minutes / 2, k2);
    derivative(at, insulin, factor, k3);
    moveTo(state, minutes, k3);
    derivative(at, insulin, factor, k4);
    for (let i = 0; i < STATE_SIZE; i++) {
      const slope = (k1[i] ?? 0) + 2 * (k2[i] ?? 0) + 2 * (k3[i] ?? 0) + (k4[i] ?? 0);
      state[i] = (state[i] ?? 0) + (minutes / 6) * slope;
    }
  };
}
