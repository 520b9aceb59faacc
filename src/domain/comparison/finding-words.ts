import type { OutcomeId } from "./outcomes";
import type { Verdict } from "./verdict";

/** What an outcome is called in sentences. */
export const MEASURE: Readonly<Record<OutcomeId, string>> = {
  "day-time-in-range": "of the day was in range",
  "day-mean": "mean glucose over the whole day",
  "day-lows": "of the day was low",
  "night-mean": "mean glucose between midnight and six",
  "night-time-in-range": "of the time between midnight and six was in range",
  "breakfast-mean": "mean glucose in the four hours after breakfast",
  "lunch-mean": "mean glucose in the four hours after lunch",
  "dinner-mean": "mean glucose in the four hours after dinner",
  "correction-in-range": "of the second to fourth hour after a correction was in range",
};

type Titles = Readonly<{ better: string; worse: string }>;

const TITLES: Readonly<Record<OutcomeId, Titles>> = {
  "day-time-in-range": { better: "Days were more often in range", worse: "Days were less often in range" },
  "day-mean": { better: "Days were lower", worse: "Days were higher" },
  "day-lows": { better: "There were fewer lows", worse: "There were more lows" },
  "night-mean": { better: "Nights were lower", worse: "Nights were higher" },
  "night-time-in-range": { better: "Nights were more often in range", worse: "Nights were less often in range" },
  "breakfast-mean": { better: "Hours after breakfast were lower", worse: "Hours after breakfast were higher" },
  "lunch-mean": { better: "Hours after lunch were lower", worse: "Hours after lunch were higher" },
  "dinner-mean": { better: "Hours after dinner were lower", worse: "Hours after dinner were higher" },
  "correction-in-range": {
    better: "Hours after corrections were more often in range",
    worse: "Hours after corrections were less often in range",
  },
};

/** The heading of a comparison: the finding in words. */
export function findingTitle(verdict: Verdict, outcome: OutcomeId, version: number): string {
  const after = `after version ${version}.`;
  switch (verdict) {
    case "not-enough-days":
      return `Too few clean days yet ${after}`;
    case "more-lows":
      return `There were more lows ${after}`;
    case "better":
      return `${TITLES[outcome].better} ${after}`;
    case "worse":
      return `${TITLES[outcome].worse} ${after}`;
    case "no-difference-that-matters":
      return `Version ${version} made no difference that matters.`;
    case "cannot-tell-yet":
      return `It can’t be told yet what followed version ${version}.`;
    case "could-not-be-told":
      return `Version ${version} ended before it could be told.`;
  }
}

/** The same in a few words, for lists and the rule. */
export const SHORT_FINDING: Readonly<Record<Verdict, string>> = {
  "not-enough-days": "Too few clean days yet",
  "more-lows": "More lows after it",
  better: "Better, likely",
  worse: "Less often where it was hoped to be",
  "no-difference-that-matters": "No difference that matters",
  "cannot-tell-yet": "Can’t be told yet",
  "could-not-be-told": "Could not be told",
};

export const BUNDLE = "Several settings changed together. This is about all of them; none can be singled out.";
export const BLOCKED = "There was a gap on the hoped-for side, but lows may have risen too. That is not called better.";
export const AT_A_COST = "The fewer lows came with less time in range.";
export const SETTLING =
  "Your setup was still learning in these weeks. Part of the gap may be that, and the likely range is wider for it; the gap itself is not mended.";
export const LOOK_FIRST = "Look at this with your educator before anything else.";
export const LONGER_SPAN = "Compare a longer span instead.";
export const SMALLER_THAN_SWINGS = "The gap is smaller than your own day-to-day swings can show within four weeks.";
