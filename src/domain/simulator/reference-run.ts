import { AppError } from "@/domain/errors";
import { mealMmol, STATE } from "./model";
import type { ModelParameters } from "./parameters";
import { stepperOf } from "./runge-kutta";
import { steadyStateAt } from "./steady-state";

/**
 * Something given to a person at a minute of the run: a basal rate from then on, in
 * U/h, a bolus in U, or a meal in grams of carbohydrate eaten at once.
 */
export type RunEvent = Readonly<{ kind: "basal" | "bolus" | "meal"; minute: number; value: number }>;

/** State at a minute, after whatever was given at that minute. */
export type RunRow = Readonly<{ minute: number; glucoseMmol: number; state: Float64Array }>;

/** Longest step, min; half a minute stays within 6e-6 mmol/L of the reference run. */
const LONGEST_STEP_MINUTES = 0.5;

function assertEvent({ kind, minute, value }: RunEvent): void {
  if (!(minute >= 0) || !Number.isFinite(minute)) throw new AppError("INVALID_RANGE", `a ${kind} at minute ${minute}`);
  if (!(value >= 0) || !Number.isFinite(value)) throw new AppError("INVALID_RANGE", `a ${kind} of ${value}`);
}

/**
 * What the model makes of a list of inputs, from a steady state, without a sensor,
 * a loop or chance.
 *
 * Until the first basal rate is given, the infusion of the steady state runs on.
 * Inputs may come at any minute, also between rows; those after the end do nothing.
 *
 * @param startMmol glucose of the steady state at minute 0
 * @param everyMinutes distance of the rows; the first is at 0, the last at or before `untilMinute`
 * @throws {AppError} INVALID_RANGE for a negative or endless value or time
 */
export function referenceRun(
  parameters: ModelParameters,
  events: ReadonlyArray<RunEvent>,
  { startMmol, untilMinute, everyMinutes }: { startMmol: number; untilMinute: number; everyMinutes: number },
): RunRow[] {
  events.forEach(assertEvent);
  const queue = events.toSorted((a, b) => a.minute - b.minute);
  const { basalUnitsPerHour, state } = steadyStateAt(parameters, startMmol);
  const glucoseVolumeL = parameters.glucoseVolumeLPerKg * parameters.bodyWeightKg;
  const step = stepperOf(parameters);
  let milliUnitsPerMinute = (basalUnitsPerHour * 1000) / 60;
  let now = 0;

  const advanceTo = (minute: number) => {
    const steps = Math.ceil((minute - now) / LONGEST_STEP_MINUTES);
    for (let i = 0; i < steps; i++) step(state, (minute - now) / steps, milliUnitsPerMinute, 1);
    now = minute;
  };
  const give = ({ kind, value }: RunEvent) => {
    if (kind === "basal") milliUnitsPerMinute = (value * 1000) / 60;
    if (kind === "bolus") state[STATE.depot1] = (state[STATE.depot1] ?? 0) + 1000 * value;
    if (kind === "meal") state[STATE.meal1] = (state[STATE.meal1] ?? 0) + mealMmol(parameters, value);
  };

  const rows: RunRow[] = [];
  for (let minute = 0; minute <= untilMinute; minute += everyMinutes) {
    for (let event = queue[0]; event !== undefined && event.minute <= minute; event = queue[0]) {
      advanceTo(event.minute);
      give(event);
      queue.shift();
    }
    advanceTo(minute);
    rows.push({ minute, glucoseMmol: (state[STATE.blood] ?? 0) / glucoseVolumeL, state: state.slice() });
  }
  return rows;
}
