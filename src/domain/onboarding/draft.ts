import type { GlucoseUnit } from "@/domain/units";

/** What was typed, by wizard page and field. */
export type DraftAnswers = Readonly<Record<string, Readonly<Record<string, unknown>>>>;

/** What the arithmetic needs to know of a journal. */
export type DraftJournal = Readonly<{
  therapy: "injections" | "pump" | "closed-loop";
  glucoseUnit: GlucoseUnit;
  setup: Readonly<{ basalStepMilliUnits: number }>;
}>;
