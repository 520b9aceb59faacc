import { changeDirection } from "./change-direction";
import type { ProfileDifference, SettingChange } from "./difference";
import type { Expectation, ExpectedOutcome, ExpectedWindow } from "./expectation";

/** Parts of the day, in minutes after midnight; a person's own meal times come later and elsewhere. */
const NIGHT = { fromMinute: 0, toMinute: 360 } as const;
const MEALS: ReadonlyArray<{ window: ExpectedWindow; fromMinute: number; toMinute: number }> = [
  { window: "after-breakfast", fromMinute: 300, toMinute: 630 },
  { window: "after-lunch", fromMinute: 630, toMinute: 960 },
  { window: "after-dinner", fromMinute: 960, toMinute: 1320 },
];

function isWithin({ fromMinute, toMinute }: SettingChange, part: { fromMinute: number; toMinute: number }): boolean {
  return part.fromMinute <= fromMinute && toMinute <= part.toMinute;
}

const WHOLE_DAY = { outcome: "time-in-range", window: "whole-day" } as const;

/** What one changed family governs, by the parts of the day in which it changed. */
function governed(changes: ReadonlyArray<SettingChange>): { outcome: ExpectedOutcome; window: ExpectedWindow } {
  const family = changes[0]?.family;
  if (family === "basal") {
    return changes.every((change) => isWithin(change, NIGHT)) ? { outcome: "mean-glucose", window: "night" } : WHOLE_DAY;
  }
  if (family === "carbRatio") {
    const meal = MEALS.find((part) => changes.every((change) => isWithin(change, part)));
    return meal ? { outcome: "rise-after-meals", window: meal.window } : WHOLE_DAY;
  }
  if (family === "sensitivity") return { outcome: "fall-after-correction", window: "after-corrections" };
  return WHOLE_DAY;
}

/**
 * The expectation offered first: what the changed setting governs, in the
 * direction more or less insulin usually moves it (comparison.md 3.4). More
 * insulin: glucose and rises fall, the fall after a correction grows, more time
 * in range. Less insulin: fewer lows, over the part of the day that is governed.
 * Several families, or one without a known direction: the whole day.
 *
 * @returns `null` when nothing changed
 */
export function defaultExpectation(difference: ProfileDifference): Expectation | null {
  if (difference.changes.length === 0) return null;
  const isSingle = difference.families.length === 1;
  const { outcome, window } = isSingle ? governed(difference.changes) : WHOLE_DAY;
  if (changeDirection(difference) === "weaker") return { outcome: "lows", window, direction: "fall" };
  const grows = outcome === "time-in-range" || outcome === "fall-after-correction";
  return { outcome, window, direction: grows ? "rise" : "fall" };
}
