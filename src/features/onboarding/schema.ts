import { z } from "zod";
import { WIZARD_STEPS } from "@/domain/onboarding/wizard-step";
import { isZone } from "@/domain/zone-name";

const words = (most: number) => z.string().trim().max(most, `At most ${most} characters.`);
const journalId = z.uuid();

export const createJournalInput = z.object({
  name: words(80).min(1, "Give the notebook a name."),
  glucoseUnit: z.enum(["mg/dL", "mmol/L"], { error: "Choose a unit." }),
  timeZone: z.string().refine(isZone, "Choose a time zone from the list."),
  therapy: z.enum(["injections", "pump", "closed-loop"], { error: "Choose how you treat your diabetes now." }),
  plannedStartOn: z.union([z.literal("").transform(() => null), z.iso.date("Type a date.")]),
  pump: words(120),
  sensor: words(120),
  controller: words(120),
  insulin: words(120),
});
export type CreateJournalInput = z.input<typeof createJournalInput>;

export const stepInput = z.object({ journalId, step: z.enum(WIZARD_STEPS) });

/** A page sent back: which, what the draft's count was when it was opened, and the typed values. */
export const saveStepInput = z.object({
  journalId,
  step: z.enum(WIZARD_STEPS),
  rowVersion: z.coerce.number().int().min(0),
});
export type SaveStepInput = z.input<typeof saveStepInput> & Record<string, unknown>;

export const proposeStartInput = z.object({ journalId, rowVersion: z.coerce.number().int().min(0), note: words(2000).default("") });
export type ProposeStartInput = z.input<typeof proposeStartInput>;
