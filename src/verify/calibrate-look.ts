import { adjustedEffect, type AdjustedEffect, type AdjustedWindow } from "@/domain/comparison/adjusted";
import type { DayValue } from "@/domain/comparison/day-value";
import { DAYS_TO_LOOK, estimateEffect, type Effect } from "@/domain/comparison/effect";
import { compareLows, type Lows } from "@/domain/comparison/lows";
import { OUTCOMES, type OutcomeId } from "@/domain/comparison/outcomes";
import { decide, type Verdict } from "@/domain/comparison/verdict";
import { sortDays, type ComparisonDays } from "@/domain/comparison/windows";
import type { OutcomeSeries } from "@/domain/simulator/outcome-series";

/** What somebody who looks on one day is told, with what it rests on. */
export type Look = Readonly<{ verdict: Verdict; effect: Effect | null; adjusted: AdjustedEffect | null }>;

/** What a look needs beside the series. */
export type LookFacts = Readonly<{
  outcome: Exclude<OutcomeId, "day-lows">;
  isInsulinLogged: boolean;
  lows: Lows;
  targetHighMgDl: number;
  programmed: Readonly<{ sensitivityMgDlPerUnit: number; carbRatioGramsPerUnit: number }>;
}>;

/** The comparison of lows for a look; one for all outcomes. */
export function lowsOn({ series }: OutcomeSeries, days: ComparisonDays): Lows {
  return compareLows(series["day-lows"], days, false);
}

/**
 * One look at a change, by the shipped rules: windows, effect, days at equal insulin,
 * lows and verdict, each the function that the product uses. It leaves out only what
 * no verdict rests on (days needed, the level of lows); a test holds it to the whole
 * comparison.
 */
export function lookAt(all: OutcomeSeries, days: ComparisonDays, facts: LookFacts): Look {
  const { outcome, isInsulinLogged, lows, targetHighMgDl } = facts;
  const { kind, sigma0, adjusted: window } = OUTCOMES[outcome];
  const sorted = sortDays(all.series[outcome], days);
  const effect = estimateEffect({ ...sorted, kind, sigma0, isSettling: false });
  const adjusted = effect && window && isInsulinLogged ? atEqualInsulin(all, sorted, window, facts.programmed) : null;
  const { verdict } = decide({
    outcome, effect, adjusted, lows,
    hasTimeInRangeFallen: false,
    isAimFewerHighs: true,
    isBaselineAboveTarget: effect !== null && effect.meanBefore > targetHighMgDl,
    hasVersionEnded: false,
  });
  return { verdict, effect, adjusted };
}

function atEqualInsulin(
  { insulin }: OutcomeSeries,
  { before, after }: { before: ReadonlyArray<DayValue>; after: ReadonlyArray<DayValue> },
  window: AdjustedWindow,
  programmed: LookFacts["programmed"],
): AdjustedEffect | null {
  const logged = new Map(insulin[window].map((day) => [day.day, day]));
  const on = (side: ReadonlyArray<DayValue>) => side.flatMap(({ day }) => logged.get(day) ?? []);
  const [b, a] = [on(before), on(after)];
  return b.length < DAYS_TO_LOOK || a.length < DAYS_TO_LOOK ? null : adjustedEffect(b, a, window, programmed, false);
}
