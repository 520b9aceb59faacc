import { freedomOf, type OutcomeKind } from "./correlation";
import { varianceFactor, type Effect } from "./effect";
import { studentTQuantile } from "./student-t";
import { DAYS_EACH_SIDE_AT_MOST } from "./windows";

/** The standard normal quantile of 0.8: how much more it takes to find a size four times in five. */
const EIGHT_IN_TEN = 0.8416;

export type DaysNeeded = Readonly<{
  /** More clean days until the gap as it is now would be called; null: not within four weeks. */
  ifDifferenceStays: number | null;
  /** More clean days for a wanted size with a chance of 80 %; null: not within four weeks. */
  forTarget: number | null;
}>;

/**
 * How many more clean days would settle it: days are appended after the last
 * one, swings kept as they are.
 *
 * @param target the wanted size of the difference, in the outcome's unit
 */
export function daysNeeded(
  effect: Effect,
  days: Readonly<{ before: ReadonlyArray<number>; after: ReadonlyArray<number>; lastDay: number }>,
  kind: OutcomeKind,
  isSettling: boolean,
  target: number,
): DaysNeeded {
  const fewestWith = (isEnough: (halfWidth: number, errorBar: number) => boolean): number | null => {
    for (let more = 0; days.after.length + more <= DAYS_EACH_SIDE_AT_MOST; more += 1) {
      const after = [...days.after, ...Array.from({ length: more }, (_, i) => days.lastDay + 1 + i)];
      const nu = effect.nu + freedomOf(kind, after) - freedomOf(kind, days.after);
      const errorBar = effect.sigma * Math.sqrt(varianceFactor(kind, days.before, after, isSettling));
      if (isEnough(studentTQuantile(0.975, nu) * errorBar, errorBar)) return more;
    }
    return null;
  };
  return {
    ifDifferenceStays: fewestWith((halfWidth) => Math.abs(effect.difference) >= halfWidth),
    forTarget: fewestWith((halfWidth, errorBar) => target >= halfWidth + EIGHT_IN_TEN * errorBar),
  };
}
