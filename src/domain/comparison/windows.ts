import type { DayValue } from "./day-value";

/** At most this many days on each side. */
export const DAYS_EACH_SIDE_AT_MOST = 28;
/** How far back earlier versions may lend their day-to-day swings, counted from the change day. */
const HISTORY_REACHES_BACK_DAYS = 89;

/** The days that a comparison rests on, by day number. */
export type ComparisonDays = Readonly<{
  /** The day the version came into effect. Never used itself, nor the day before it. */
  changeDay: number;
  /** The last earlier change that touched what is measured. */
  previousChangeDay: number;
  /** The last day that counts: yesterday, or the day before the next change. */
  lastDay: number;
  /** The first day of an earlier version whose swings may be borrowed. */
  historyStart: number | null;
}>;

/** First and last day of each side, both included; a side is empty when first > last. */
export function sidesOf({ changeDay, previousChangeDay, lastDay }: ComparisonDays) {
  return {
    before: { first: Math.max(previousChangeDay + 1, changeDay - 1 - DAYS_EACH_SIDE_AT_MOST), last: changeDay - 2 },
    after: { first: changeDay + 1, last: Math.min(lastDay, changeDay + DAYS_EACH_SIDE_AT_MOST) },
  };
}

const within = (days: ReadonlyArray<DayValue>, first: number, last: number) =>
  days.filter(({ day }) => first <= day && day <= last).toSorted((a, b) => a.day - b.day);

/**
 * Sort a series into before, after, history and left out.
 *
 * The change day and the day before it are left out always: the day before is
 * commonly what prompted the change, and would make any change look like a help.
 */
export function sortDays(series: ReadonlyArray<DayValue>, days: ComparisonDays) {
  const sides = sidesOf(days);
  const before = within(series, sides.before.first, sides.before.last);
  const after = within(series, sides.after.first, sides.after.last);
  const history =
    days.historyStart === null
      ? []
      : within(series, Math.max(days.historyStart + 1, days.changeDay - HISTORY_REACHES_BACK_DAYS), days.previousChangeDay - 1);
  const usable = (list: ReadonlyArray<DayValue>) => list.filter((day) => day.isUsable);
  return {
    sides,
    before: usable(before),
    after: usable(after),
    history: usable(history),
    leftOut: [...before, ...after].filter((day) => !day.isUsable),
  };
}
