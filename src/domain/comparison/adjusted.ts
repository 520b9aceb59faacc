import { meanOf } from "./day-value";
import { estimateEffect, type Effect } from "./effect";

/** One day with what was delivered: glucose mean mg/dL of the window, insulin U, carbohydrate g of the day (0 for nights). */
export type InsulinDay = Readonly<{ day: number; glucoseMgDl: number; insulinUnits: number; carbohydrateGrams: number }>;

export type AdjustedWindow = "night" | "day";

/** Constants of each window, fitted on simulated people that no test uses; see the calibration page. */
export const ADJUSTED_CONSTANTS = {
  night: { kind: "win", gamma0: 0.422, v0: 41.3 ** 2, sigma0: 10.6 },
  day: { kind: "day", gamma0: 0.109, v0: 146.9 ** 2, sigma0: 14.1 },
} as const;

const PRIOR_DAYS = 6;
/** One slope, half of it known beforehand. */
const FREEDOM_SPENT = 0.5;

export type AdjustedEffect = Effect & Readonly<{ gamma: number; rawDifference: number }>;

/**
 * Days compared at equal insulin: a night that needed more insulin is expected
 * to be higher, and that expectation is taken off before days are compared.
 * Its difference is not in a unit that a person knows and is never shown as mg/dL.
 *
 * @param programmed sensitivity (mg/dL per U) and carb ratio (g/U) of the version before the change
 * @returns null with fewer than three days on a side
 */
export function adjustedEffect(
  before: ReadonlyArray<InsulinDay>,
  after: ReadonlyArray<InsulinDay>,
  window: AdjustedWindow,
  programmed: Readonly<{ sensitivityMgDlPerUnit: number; carbRatioGramsPerUnit: number }>,
  isSettling = false,
): AdjustedEffect | null {
  const { kind, gamma0, v0, sigma0 } = ADJUSTED_CONSTANTS[window];
  const need = (d: InsulinDay) =>
    programmed.sensitivityMgDlPerUnit *
    (d.insulinUnits - (window === "day" ? d.carbohydrateGrams / programmed.carbRatioGramsPerUnit : 0));
  let sxx = 0;
  let sxg = 0;
  for (const side of [before, after]) {
    if (side.length === 0) continue;
    const needMean = meanOf(side.map(need));
    const glucoseMean = meanOf(side.map((d) => d.glucoseMgDl));
    for (const d of side) {
      sxx += (need(d) - needMean) ** 2;
      sxg += (need(d) - needMean) * (d.glucoseMgDl - glucoseMean);
    }
  }
  const gamma = (sxg + PRIOR_DAYS * v0 * gamma0) / (sxx + PRIOR_DAYS * v0);
  const atEqualInsulin = (d: InsulinDay) => ({ day: d.day, value: d.glucoseMgDl - gamma * need(d), isUsable: true });
  const effect = estimateEffect({
    before: before.map(atEqualInsulin), after: after.map(atEqualInsulin), history: [],
    kind, sigma0, isSettling, freedomSpent: FREEDOM_SPENT,
  });
  if (!effect) return null;
  const rawDifference = meanOf(after.map((d) => d.glucoseMgDl)) - meanOf(before.map((d) => d.glucoseMgDl));
  return { ...effect, gamma, rawDifference };
}
