import type { ProfileDifference } from "@/domain/settings/difference";
import type { OutcomeId } from "./outcomes";

/** A part of the day that some settings govern. */
export type DayPart = "night" | "breakfast" | "lunch" | "dinner" | "corrections";

export const DAY_PARTS: ReadonlyArray<DayPart> = ["night", "breakfast", "lunch", "dinner", "corrections"];

/** Minutes after midnight, start included, end not; a meal's part reaches four hours past the last start. */
const CLOCK: Readonly<Record<Exclude<DayPart, "corrections">, readonly [number, number]>> = {
  night: [0, 360],
  breakfast: [300, 870],
  lunch: [630, 1200],
  dinner: [960, 1440],
};

/** Minutes after midnight in which a meal of this name starts. Common practice, no source. */
export const MEAL_STARTS: Readonly<Record<"breakfast" | "lunch" | "dinner", readonly [number, number]>> = {
  breakfast: [300, 630],
  lunch: [630, 960],
  dinner: [960, 1320],
};

/**
 * The parts of the day that a change can move. Basal moves the hours of its
 * block, a ratio the meals of its block, sensitivity the corrections; whatever
 * has no hours (targets, duration, limits, switches) moves all.
 */
export function governedParts(difference: ProfileDifference): DayPart[] {
  const parts = new Set<DayPart>();
  for (const { family, fromMinute, toMinute } of difference.changes) {
    const touches = (range: readonly [number, number]) => fromMinute < range[1] && range[0] < toMinute;
    if (family === "basal") {
      for (const part of ["night", "breakfast", "lunch", "dinner"] as const) if (touches(CLOCK[part])) parts.add(part);
    } else if (family === "carbRatio") {
      for (const meal of ["breakfast", "lunch", "dinner"] as const) if (touches(MEAL_STARTS[meal])) parts.add(meal);
    } else if (family === "sensitivity") parts.add("corrections");
    else for (const part of DAY_PARTS) parts.add(part);
  }
  return DAY_PARTS.filter((part) => parts.has(part));
}

const PART_OF_OUTCOME: Partial<Record<OutcomeId, DayPart>> = {
  "night-mean": "night",
  "night-time-in-range": "night",
  "breakfast-mean": "breakfast",
  "lunch-mean": "lunch",
  "dinner-mean": "dinner",
  "correction-in-range": "corrections",
};

/**
 * The last earlier change that ends the days before: of anything for a whole
 * day, of what governs the part for a part of the day.
 *
 * @param earlier changes before this one, any order
 * @returns null when nothing was changed before
 */
export function previousChangeDay(
  outcome: OutcomeId,
  earlier: ReadonlyArray<{ day: number; parts: ReadonlyArray<DayPart> }>,
): number | null {
  const part = PART_OF_OUTCOME[outcome];
  const days = earlier.filter(({ parts }) => part === undefined || parts.includes(part)).map(({ day }) => day);
  return days.length === 0 ? null : Math.max(...days);
}
