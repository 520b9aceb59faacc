import type { Severity } from "./check-texts";

/**
 * The guardrails of a change (content.md 6, from settings.md 3.3): when each one
 * speaks is in `guardrails.ts`, what it says is here.
 *
 * `whenWeakeningCannotWait` says what becomes of it when a change only weakens,
 * after a low or on an educator's word: such a change never waits.
 */
export const GUARDRAILS = {
  "one-family": {
    text: "Two settings at once can be compared only as a pair. Which one matters most today?",
    whenWeakeningCannotWait: "silent",
  },
  "too-soon": {
    text: "Version {version} has been in effect for {hours} hours. Three full days show more than one.",
    whenWeakeningCannotWait: "silent",
  },
  "too-big": {
    text: "This is a {percent}% step. Published advice moves in steps of 10 to 20%.",
    whenWeakeningCannotWait: "informs",
  },
  "no-pattern": {
    text: "One day is not a pattern. Which other days looked like this?",
    whenWeakeningCannotWait: "silent",
  },
  "flagged-days": {
    text: "{days} of these days are flagged. They may not be ordinary.",
    whenWeakeningCannotWait: "same",
  },
  "stronger-after-lows": {
    text: "There were lows on these days. Talk to your educator before more insulin.",
    whenWeakeningCannotWait: "same",
  },
  "weaker-and-ketones": {
    text: "Ketones were noted. Follow your sick-day plan first.",
    whenWeakeningCannotWait: "same",
  },
  "basal-share": {
    text: "Basal would be {percent}% of your day's insulin. Published shares run from {low} to {high}%.",
    whenWeakeningCannotWait: "same",
  },
  "outside-step": {
    text: "Your device moves in steps of {step}. Choose {below} or {above}.",
    whenWeakeningCannotWait: "same",
  },
  gate: {
    text: "This needs your educator first. You can write it down and send it now.",
    whenWeakeningCannotWait: "same",
  },
} as const satisfies Record<string, { text: string; whenWeakeningCannotWait: "silent" | "informs" | "same" }>;

export type GuardrailCode = keyof typeof GUARDRAILS;

/** A guardrail that spoke. `tellsEducator` marks the one the educator hears of too. */
export type GuardrailFinding = Readonly<{
  code: GuardrailCode;
  severity: Severity;
  text: string;
  tellsEducator: boolean;
}>;

/** The numbers of the table; an educator may set others for one person, a clinic for all. */
export type GuardrailLimits = Readonly<{
  /** Hours a family rests before it is strengthened again: three full days. */
  restHours: number;
  /** A step above this asks, in percent of the old value. */
  askStepPercent: number;
  /** A step of a basal rate above this is mentioned. */
  informBasalStepPercent: number;
  evidenceDays: number;
  /** Fewer days are enough where the pattern is lows. */
  evidenceDaysForLows: number;
  /** Share of readings below 70 mg/dL in the last three days. */
  lowFraction: number;
  ketonesMmol: number;
  basalShareLowPercent: number;
  basalShareHighPercent: number;
}>;

export const DEFAULT_GUARDRAIL_LIMITS: GuardrailLimits = {
  restHours: 72,
  askStepPercent: 20,
  informBasalStepPercent: 10,
  evidenceDays: 3,
  evidenceDaysForLows: 2,
  lowFraction: 0.04,
  ketonesMmol: 0.6,
  basalShareLowPercent: 30,
  basalShareHighPercent: 60,
};
