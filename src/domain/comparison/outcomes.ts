import type { Expectation } from "@/domain/settings/expectation";
import type { AdjustedWindow } from "./adjusted";
import type { OutcomeKind } from "./correlation";

export type OutcomeId =
  | "day-time-in-range" | "day-mean" | "day-lows" | "night-mean" | "night-time-in-range"
  | "breakfast-mean" | "lunch-mean" | "dinner-mean" | "correction-in-range";

export type Outcome = Readonly<{
  kind: OutcomeKind;
  unit: "points" | "mg/dL" | "percent";
  /** Usual day-to-day SD, in the unit; lows as the square root of the percent below 70. */
  sigma0: number;
  betterWhen: "higher" | "lower";
  /** Smaller differences are never called, in the unit. */
  leastDifference: number;
  /** Minutes of the part of the day that one point stands for, where points are minutes. */
  minutesPerPoint: number | null;
  /** Which days at equal insulin stand beside it. */
  adjusted: AdjustedWindow | null;
  days: "days" | "nights";
}>;

const meal: Outcome = {
  kind: "win", unit: "mg/dL", sigma0: 32, betterWhen: "lower", leastDifference: 5, minutesPerPoint: null, adjusted: null, days: "days",
};

/** Usual swings were read off simulated people; minutes: 14.4 per point of a day, 3.6 per point of 00:00-06:00. */
export const OUTCOMES: Readonly<Record<OutcomeId, Outcome>> = {
  "day-time-in-range": {
    kind: "day", unit: "points", sigma0: 12, betterWhen: "higher", leastDifference: 3, minutesPerPoint: 14.4, adjusted: "day", days: "days",
  },
  "day-mean": {
    kind: "day", unit: "mg/dL", sigma0: 20, betterWhen: "lower", leastDifference: 5, minutesPerPoint: null, adjusted: "day", days: "days",
  },
  "day-lows": {
    kind: "day", unit: "percent", sigma0: 1, betterWhen: "lower", leastDifference: 1, minutesPerPoint: 14.4, adjusted: null, days: "days",
  },
  "night-mean": {
    kind: "win", unit: "mg/dL", sigma0: 21, betterWhen: "lower", leastDifference: 5, minutesPerPoint: null, adjusted: "night", days: "nights",
  },
  "night-time-in-range": {
    kind: "win", unit: "points", sigma0: 16, betterWhen: "higher", leastDifference: 3, minutesPerPoint: 3.6, adjusted: "night", days: "nights",
  },
  "breakfast-mean": meal,
  "lunch-mean": meal,
  "dinner-mean": meal,
  "correction-in-range": {
    kind: "win", unit: "points", sigma0: 32, betterWhen: "higher", leastDifference: 3, minutesPerPoint: null, adjusted: "day", days: "days",
  },
};

const OF_WINDOW: Readonly<Record<Expectation["window"], OutcomeId>> = {
  night: "night-mean",
  "after-breakfast": "breakfast-mean",
  "after-lunch": "lunch-mean",
  "after-dinner": "dinner-mean",
  "after-corrections": "correction-in-range",
  "whole-day": "day-time-in-range",
  own: "day-time-in-range",
};

/**
 * The one outcome that decides, fixed when the change was logged. Parts of the
 * day are judged by mean glucose, whose signal is 1.3 to 3 times that of their
 * time in range on simulated people.
 *
 * @param expectation null for a version that states none: the whole day
 * @param isBundle several settings changed at once: only the whole day, and only as a bundle
 */
export function primaryOutcome(expectation: Expectation | null, isBundle: boolean): OutcomeId {
  if (expectation?.outcome === "lows") return "day-lows";
  if (isBundle || !expectation) return "day-time-in-range";
  if (expectation.window === "night" && expectation.outcome === "time-in-range") return "night-time-in-range";
  if (expectation.window === "whole-day" && expectation.outcome === "mean-glucose") {
    return expectation.direction === "rise" ? "day-lows" : "day-mean";
  }
  if (expectation.outcome === "fall-after-correction") return "correction-in-range";
  return OF_WINDOW[expectation.window];
}
