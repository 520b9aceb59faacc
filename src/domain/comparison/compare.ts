import { adjustedEffect, type AdjustedEffect, type InsulinDay } from "./adjusted";
import type { DayValue } from "./day-value";
import { daysNeeded, type DaysNeeded } from "./days-needed";
import { DAYS_TO_LOOK, estimateEffect, type Effect } from "./effect";
import { previousChangeDay, type DayPart } from "./governed-parts";
import { compareLows, lowsLevel, type Lows, type LowsLevel } from "./lows";
import { OUTCOMES, type OutcomeId } from "./outcomes";
import { chanceBetter, decide, hasClearlyFallen, type VerdictAnswer } from "./verdict";
import { sortDays, type ComparisonDays } from "./windows";

/** A setup that adapts by itself is taken to be still learning for this long. */
const SETTLING_DAYS = 21;
const WANTED_POINTS = 5;

export type ComparisonInput = Readonly<{
  version: number;
  against: number;
  changeDay: number;
  /** Yesterday, or the day before the next version came into effect. */
  lastDay: number;
  hasVersionEnded: boolean;
  outcome: OutcomeId;
  isBundle: boolean;
  isAimFewerHighs: boolean;
  targetHighMgDl: number;
  /** Earlier changes with what they governed, the start of the setup among them. */
  earlierChanges: ReadonlyArray<{ day: number; parts: ReadonlyArray<DayPart> }>;
  /** Day 1 of the new setup, or of a new algorithm or reset; null when long ago. */
  systemStartDay: number | null;
  /** Each outcome's series by day; lows in plain percent below 70. */
  series: Readonly<Record<OutcomeId, ReadonlyArray<DayValue>>>;
  below54Percent: ReadonlyArray<DayValue>;
  /** Days with a complete insulin log, per window; empty where none is logged. */
  insulin: Readonly<{ night: ReadonlyArray<InsulinDay>; day: ReadonlyArray<InsulinDay> }>;
  /** Time-weighted programmed values of the version before the change. */
  programmed: Readonly<{ sensitivityMgDlPerUnit: number; carbRatioGramsPerUnit: number }>;
}>;

export type Comparison = Readonly<{
  version: number;
  against: number;
  outcome: OutcomeId;
  attribution: "single" | "bundle";
  days: ComparisonDays;
  sides: ReturnType<typeof sortDays>["sides"];
  before: ReadonlyArray<DayValue>;
  after: ReadonlyArray<DayValue>;
  leftOut: ReadonlyArray<DayValue>;
  /** The plain difference: what is shown, always. */
  effect: Effect | null;
  adjusted: AdjustedEffect | null;
  /** Why days at equal insulin do not decide, when they do not. */
  plainBecause: "outcome-has-none" | "insulin-not-logged" | null;
  lows: Lows;
  level: LowsLevel | null;
  isSettling: boolean;
  daysNeeded: DaysNeeded | null;
  /** Chance that the lasting effect is better, 0 to 1. */
  chanceBetter: number | null;
}> &
  VerdictAnswer;

/**
 * What followed one version: the one entry of the engine. Pure and without
 * random numbers; the same days give the same answer.
 */
export function compare(input: ComparisonInput): Comparison {
  const { outcome, changeDay, lastDay } = input;
  const daysFor = (id: OutcomeId): ComparisonDays => {
    const previous = previousChangeDay(id, input.earlierChanges);
    const earliest = previousChangeDay("day-mean", input.earlierChanges.filter(({ day }) => previous !== null && day < previous));
    return { changeDay, lastDay, previousChangeDay: previous ?? -Infinity, historyStart: earliest };
  };
  const days = daysFor(outcome);
  const sorted = sortDays(input.series[outcome], days);
  const isSettling = input.systemStartDay !== null && sorted.before.some(({ day }) => day <= (input.systemStartDay ?? 0) + SETTLING_DAYS);
  const { kind, sigma0 } = OUTCOMES[outcome];
  const isLows = outcome === "day-lows";
  const effect = isLows ? null : estimateEffect({ ...sorted, kind, sigma0, isSettling });
  const { adjusted, plainBecause } = effect ? adjust(input, days, isSettling) : { adjusted: null, plainBecause: null };
  const wholeDay = daysFor("day-lows");
  const lows = compareLows(input.series["day-lows"], wholeDay, isSettling);
  const shown = isLows ? lows.effect : effect;
  const numbers = { before: sorted.before.map((d) => d.day), after: sorted.after.map((d) => d.day), lastDay };
  const answer = decide({
    outcome, effect, adjusted, lows,
    hasTimeInRangeFallen: hasClearlyFallen(timeInRangeEffect(input, daysFor("day-time-in-range"), isSettling)),
    isAimFewerHighs: input.isAimFewerHighs,
    isBaselineAboveTarget: effect !== null && effect.meanBefore > input.targetHighMgDl,
    hasVersionEnded: input.hasVersionEnded,
  });
  return {
    ...answer,
    version: input.version, against: input.against, outcome,
    attribution: input.isBundle ? "bundle" : "single",
    days, sides: sorted.sides, before: sorted.before, after: sorted.after, leftOut: sorted.leftOut,
    effect, adjusted, plainBecause, lows,
    level: lowsLevel(input.series["day-lows"], input.below54Percent, wholeDay),
    isSettling,
    daysNeeded: shown ? daysNeeded(shown, numbers, kind, isSettling, WANTED_POINTS) : null,
    chanceBetter: shown ? (isLows ? 1 - shown.chanceAbove : chanceBetter(outcome, shown, adjusted)) : null,
  };
}

function timeInRangeEffect(input: ComparisonInput, days: ComparisonDays, isSettling: boolean): Effect | null {
  const { kind, sigma0 } = OUTCOMES["day-time-in-range"];
  return estimateEffect({ ...sortDays(input.series["day-time-in-range"], days), kind, sigma0, isSettling });
}

/** Days at equal insulin, on the same usable days, where three of them on each side have a complete log. */
function adjust(
  input: ComparisonInput,
  days: ComparisonDays,
  isSettling: boolean,
): Pick<Comparison, "adjusted" | "plainBecause"> {
  const window = OUTCOMES[input.outcome].adjusted;
  if (!window) return { adjusted: null, plainBecause: "outcome-has-none" };
  const { before, after } = sortDays(input.series[input.outcome], days);
  const logged = new Map(input.insulin[window].map((d) => [d.day, d]));
  const on = (side: DayValue[]) => side.flatMap(({ day }) => logged.get(day) ?? []);
  const sides = { before: on(before), after: on(after) };
  if (sides.before.length < DAYS_TO_LOOK || sides.after.length < DAYS_TO_LOOK) return { adjusted: null, plainBecause: "insulin-not-logged" };
  return { adjusted: adjustedEffect(sides.before, sides.after, window, input.programmed, isSettling), plainBecause: null };
}
