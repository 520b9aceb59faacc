import { meanOf, type DayValue } from "./day-value";
import { estimateEffect, type Effect } from "./effect";
import { OUTCOMES } from "./outcomes";
import { studentTQuantile } from "./student-t";
import { sortDays, type ComparisonDays } from "./windows";

/** The usual aims for most adults (Battelino 2019): below 70 under 4 %, below 54 under 1 %. */
export const LEVEL_PERCENT = { below70: 4, below54: 1 } as const;

const MORE_LOWS_LEAST_RISE = 1;
const BLOCKING_LEAST_RISE = 0.5;
const FEWER_LOWS_LEAST_FALL = 1;
const DAYS_TO_CALL = 5;

export type Lows = Readonly<{
  /** Percent of the day below 70 mg/dL, as people see it. */
  percentBefore: number | null;
  percentAfter: number | null;
  percentDifference: number | null;
  /** The comparison of square roots, which decides. */
  effect: Effect | null;
  hasRisen: boolean;
  /** They may have risen: nothing else is then called better. */
  mayHaveRisen: boolean;
  hasFallen: boolean;
}>;

/**
 * Lows are compared as the square root of each day's percent below 70 (many
 * zeros, a long tail) and shown as plain percents. A rise needs less evidence
 * than anything else: three days, and a one-in-ten chance.
 *
 * @param below70Percent percent of each day's readings below 70 mg/dL
 */
export function compareLows(below70Percent: ReadonlyArray<DayValue>, days: ComparisonDays, isSettling: boolean): Lows {
  const { before, after, history } = sortDays(below70Percent, days);
  const root = (list: DayValue[]) => list.map((d) => ({ ...d, value: Math.sqrt(d.value) }));
  const { kind, sigma0 } = OUTCOMES["day-lows"];
  const effect = estimateEffect({ before: root(before), after: root(after), history: root(history), kind, sigma0, isSettling });
  const percentBefore = before.length > 0 ? meanOf(before.map((d) => d.value)) : null;
  const percentAfter = after.length > 0 ? meanOf(after.map((d) => d.value)) : null;
  const rise = percentBefore === null || percentAfter === null ? null : percentAfter - percentBefore;
  const isAbove = (p: number) => effect !== null && effect.t > studentTQuantile(p, effect.nu);
  return {
    percentBefore, percentAfter, percentDifference: rise, effect,
    hasRisen: rise !== null && rise >= MORE_LOWS_LEAST_RISE && isAbove(0.9),
    mayHaveRisen: rise !== null && rise >= BLOCKING_LEAST_RISE && isAbove(0.75),
    hasFallen:
      effect !== null && effect.nAfter >= DAYS_TO_CALL && effect.high95 < 0 && rise !== null && rise <= -FEWER_LOWS_LEAST_FALL,
  };
}

export type LowsLevel = Readonly<{ below70Percent: number; below54Percent: number; isAbove: boolean }>;

/** Whether lows stand above the usual aim since the change, whatever the cause. Null without a usable day. */
export function lowsLevel(
  below70Percent: ReadonlyArray<DayValue>,
  below54Percent: ReadonlyArray<DayValue>,
  days: ComparisonDays,
): LowsLevel | null {
  const mean = (series: ReadonlyArray<DayValue>) => {
    const { after } = sortDays(series, days);
    return after.length === 0 ? null : meanOf(after.map((d) => d.value));
  };
  const below70 = mean(below70Percent);
  const below54 = mean(below54Percent);
  if (below70 === null || below54 === null) return null;
  return {
    below70Percent: below70, below54Percent: below54,
    isAbove: below70 >= LEVEL_PERCENT.below70 || below54 >= LEVEL_PERCENT.below54,
  };
}
