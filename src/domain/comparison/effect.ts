import { freedomOf, meanCorrelation, type OutcomeKind } from "./correlation";
import { isWeekendDay, meanOf, squaresAroundMean, type DayValue } from "./day-value";
import { studentTCdf, studentTQuantile } from "./student-t";

/** Days each side below which nothing is worked out. */
export const DAYS_TO_LOOK = 3;
/** How many days' worth of belief the usual day-to-day swing carries. */
const PRIOR_FREEDOM = 6;
const WEEKEND_SHIFT = 0.3;
const SETTLING_SHIFT_PER_DAY = 0.03;
/** Variance of lasting effects, in squared day-SDs: effects centre on none, half a day-SD wide. */
const EFFECT_VARIANCE = 0.25;

export type EffectInput = Readonly<{
  before: ReadonlyArray<DayValue>;
  after: ReadonlyArray<DayValue>;
  /** Days of earlier versions, which lend their swings only. */
  history: ReadonlyArray<DayValue>;
  kind: OutcomeKind;
  /** The usual day-to-day SD of this outcome, in its own unit. */
  sigma0: number;
  /** The setup was still adapting by itself during the days before. */
  isSettling: boolean;
  /** What a fitted slope costs in degrees of freedom. */
  freedomSpent?: number;
}>;

export type Effect = Readonly<{
  nBefore: number;
  nAfter: number;
  meanBefore: number;
  meanAfter: number;
  /** After minus before, in the outcome's unit. */
  difference: number;
  q: number;
  sigma: number;
  nu: number;
  standardError: number;
  t: number;
  low95: number;
  high95: number;
  low90: number;
  high90: number;
  /** The likely lasting part of the difference. */
  shrunk: number;
  /** Chance that the lasting effect is above zero, 0 to 1. */
  chanceAbove: number;
}>;

/** The variance of the difference in squared day-SDs, for two sets of day numbers. */
export function varianceFactor(
  kind: OutcomeKind,
  before: ReadonlyArray<number>,
  after: ReadonlyArray<number>,
  isSettling: boolean,
): number {
  const pairs =
    meanCorrelation(kind, before, before) + meanCorrelation(kind, after, after) - 2 * meanCorrelation(kind, before, after);
  const weekendShare = (days: ReadonlyArray<number>) => days.filter(isWeekendDay).length / days.length;
  const weekends = (WEEKEND_SHIFT * (weekendShare(after) - weekendShare(before))) ** 2;
  const settling = isSettling ? (SETTLING_SHIFT_PER_DAY * (meanOf(after) - meanOf(before))) ** 2 : 0;
  return pairs + weekends + settling;
}

/**
 * The plain difference of day averages with an error bar that treats
 * neighbouring days as partly the same day and allows for slow drift.
 *
 * @returns null with fewer than three usable days on a side
 * @see comparison method, section 3.3; Tang & Landes 2020, PLoS ONE 15:e0228077, is the closest published relative
 */
export function estimateEffect(input: EffectInput): Effect | null {
  const { before, after, history, kind, sigma0, isSettling, freedomSpent = 0 } = input;
  if (before.length < DAYS_TO_LOOK || after.length < DAYS_TO_LOOK) return null;
  const dayOf = ({ day }: DayValue) => day;
  const valueOf = ({ value }: DayValue) => value;
  const segments = [before, after, history].filter((segment) => segment.length >= 2);
  const nu = PRIOR_FREEDOM + segments.reduce((sum, s) => sum + freedomOf(kind, s.map(dayOf)), 0) - freedomSpent;
  const squares = segments.reduce((sum, s) => sum + squaresAroundMean(s.map(valueOf)), 0);
  const sigma = Math.sqrt((PRIOR_FREEDOM * sigma0 ** 2 + squares) / nu);
  const q = varianceFactor(kind, before.map(dayOf), after.map(dayOf), isSettling);
  const standardError = sigma * Math.sqrt(q);
  const meanBefore = meanOf(before.map(valueOf));
  const meanAfter = meanOf(after.map(valueOf));
  const difference = meanAfter - meanBefore;
  const lambda = EFFECT_VARIANCE / (EFFECT_VARIANCE + q);
  const half95 = studentTQuantile(0.975, nu) * standardError;
  const half90 = studentTQuantile(0.95, nu) * standardError;
  return {
    nBefore: before.length, nAfter: after.length, meanBefore, meanAfter, difference,
    q, sigma, nu, standardError, t: difference / standardError,
    low95: difference - half95, high95: difference + half95, low90: difference - half90, high90: difference + half90,
    shrunk: lambda * difference,
    chanceAbove: studentTCdf((Math.sqrt(lambda) * difference) / standardError, nu),
  };
}
