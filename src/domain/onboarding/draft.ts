import type { GlucoseUnit } from "@/domain/units";

/** One page as typed, by field. */
export type TypedPage = Readonly<Record<string, unknown>>;

/**
 * What was typed, by wizard page and field, with two entries of the draft's own:
 * `saved` is the draft's count when each page was last saved, `aside` what
 * another device typed meanwhile and nobody has chosen from yet.
 */
export type DraftAnswers = Readonly<Record<string, TypedPage>>;

/** What the arithmetic needs to know of a journal. */
export type DraftJournal = Readonly<{
  therapy: "injections" | "pump" | "closed-loop";
  glucoseUnit: GlucoseUnit;
  setup: Readonly<{ basalStepMilliUnits: number; bolusStepMilliUnits: number }>;
}>;
