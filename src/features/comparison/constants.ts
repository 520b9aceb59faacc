import type { OutcomeId } from "@/domain/comparison/outcomes";

/** The hours that stand under the wash; null where the whole day is meant. */
export const GOVERNED_MINUTES: Readonly<Record<OutcomeId, readonly [number, number] | null>> = {
  "day-time-in-range": null,
  "day-mean": null,
  "day-lows": null,
  "night-mean": [0, 360],
  "night-time-in-range": [0, 360],
  "breakfast-mean": [300, 870],
  "lunch-mean": [630, 1200],
  "dinner-mean": [960, 1440],
  "correction-in-range": null,
};

export const STRIP_TITLES: Readonly<Record<OutcomeId, string>> = {
  "day-time-in-range": "Day by day: time in range",
  "day-mean": "Day by day: mean glucose",
  "day-lows": "Day by day: time below range",
  "night-mean": "Night by night: mean glucose, midnight to six",
  "night-time-in-range": "Night by night: time in range, midnight to six",
  "breakfast-mean": "Breakfast by breakfast: mean of four hours",
  "lunch-mean": "Lunch by lunch: mean of four hours",
  "dinner-mean": "Dinner by dinner: mean of four hours",
  "correction-in-range": "Corrections: second to fourth hour in range",
};

export const STRIP_UNITS: Readonly<Record<OutcomeId, string>> = {
  "day-time-in-range": "in range",
  "day-mean": "",
  "day-lows": "low",
  "night-mean": "",
  "night-time-in-range": "in range",
  "breakfast-mean": "",
  "lunch-mean": "",
  "dinner-mean": "",
  "correction-in-range": "in range",
};
