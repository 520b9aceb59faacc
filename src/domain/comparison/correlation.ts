/** Whether an outcome is a whole day or a part of each day; neighbouring parts are less alike. */
export type OutcomeKind = "day" | "win";

/**
 * How alike days are is fixed, not estimated: short series always underestimate
 * it (Turner 2021, BMC Med Res Methodol, doi 10.1186/s12874-021-01364-0). A fast
 * part that fades from day to day and a slow drift over two weeks.
 */
const ALIKENESS = {
  day: { rho: 0.3, kappa: 0.15 },
  win: { rho: 0.15, kappa: 0.1 },
} as const satisfies Record<OutcomeKind, { rho: number; kappa: number }>;

const DRIFT_DAYS = 14;

/** Worked out once for every whole gap up to this many days: a comparison asks for it thousands of times. */
const GAPS_KEPT = 200;
const KEPT: Readonly<Record<OutcomeKind, Float64Array>> = {
  day: Float64Array.from({ length: GAPS_KEPT }, (_, gap) => workedOut("day", gap)),
  win: Float64Array.from({ length: GAPS_KEPT }, (_, gap) => workedOut("win", gap)),
};

function workedOut(kind: OutcomeKind, gapDays: number): number {
  const { rho, kappa } = ALIKENESS[kind];
  return (1 - kappa) * rho ** gapDays + kappa * Math.exp(-gapDays / DRIFT_DAYS);
}

/** Correlation of two days that lie `gapDays` calendar days apart; 1 for a day with itself. */
export function dayCorrelation(kind: OutcomeKind, gapDays: number): number {
  return KEPT[kind][gapDays] ?? workedOut(kind, gapDays);
}

/**
 * Mean correlation over all pairs of one day from each set.
 *
 * @param xs day numbers, not empty
 * @param ys day numbers, not empty
 */
export function meanCorrelation(kind: OutcomeKind, xs: ReadonlyArray<number>, ys: ReadonlyArray<number>): number {
  let sum = 0;
  for (const x of xs) for (const y of ys) sum += dayCorrelation(kind, Math.abs(x - y));
  return sum / (xs.length * ys.length);
}

/** How many independent days a set of days is worth. */
export function effectiveDays(kind: OutcomeKind, days: ReadonlyArray<number>): number {
  return 1 / meanCorrelation(kind, days, days);
}

/** What a set of `n` days adds to the degrees of freedom: n (1 - S). */
export function freedomOf(kind: OutcomeKind, days: ReadonlyArray<number>): number {
  return days.length * (1 - meanCorrelation(kind, days, days));
}
