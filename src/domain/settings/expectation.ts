import { z } from "zod";
import { startMinuteSchema } from "./schedule-schema";
import { MINUTES_PER_DAY } from "./schedule";

/** What a person may expect to see move (content.md 5). */
export const EXPECTED_OUTCOMES = {
  "mean-glucose": "mean glucose",
  "time-in-range": "time in range",
  lows: "lows",
  "rise-after-meals": "rise after meals",
  "fall-after-correction": "fall after a correction",
} as const;

/** When they expect to see it; "own" is a part of the day with its own ends. */
export const EXPECTED_WINDOWS = {
  night: "in the night, 00:00 to 06:00",
  "after-breakfast": "after breakfast",
  "after-lunch": "after lunch",
  "after-dinner": "after dinner",
  "after-corrections": "after corrections",
  "whole-day": "over the whole day",
  own: "in a part of the day of my own",
} as const;

export const EXPECTED_DIRECTIONS = {
  rise: "will rise",
  fall: "will fall",
  steadier: "will become steadier",
  same: "will stay as it is",
} as const;

export type ExpectedOutcome = keyof typeof EXPECTED_OUTCOMES;
export type ExpectedWindow = keyof typeof EXPECTED_WINDOWS;
export type ExpectedDirection = keyof typeof EXPECTED_DIRECTIONS;

const codes = <Code extends string>(list: Record<Code, string>) => Object.keys(list) as [Code, ...Code[]];

/**
 * What the person says, before any data, that they hope to see. Fixed when the
 * change is logged (comparison.md 3.4). `ownPart` goes with the window "own"
 * and with no other; it may run over midnight.
 */
export const expectationSchema = z
  .object({
    outcome: z.enum(codes(EXPECTED_OUTCOMES)),
    window: z.enum(codes(EXPECTED_WINDOWS)),
    direction: z.enum(codes(EXPECTED_DIRECTIONS)),
    ownPart: z
      .object({ fromMinute: startMinuteSchema, toMinute: z.int().min(1).max(MINUTES_PER_DAY) })
      .refine(({ fromMinute, toMinute }) => fromMinute !== toMinute, { path: ["toMinute"], message: "an empty part" })
      .optional(),
  })
  .refine(({ window, ownPart }) => (window === "own") === (ownPart !== undefined), {
    path: ["ownPart"],
    message: "a part of the day goes with the window own, and only with it",
  });

export type Expectation = z.infer<typeof expectationSchema>;
