import { z } from "zod";
import { decimal, optionalDecimal, tick } from "@/domain/form-text";
import { cardFields } from "@/domain/onboarding/step-schemas";
import { WIZARD_STEPS } from "@/domain/onboarding/wizard-step";
import { isZone } from "@/domain/zone-name";

const words = (most: number) => z.string().trim().max(most, `At most ${most} characters.`);
const journalId = z.uuid();
const rowVersion = z.coerce.number().int().min(0);
const ticked = (sentence: string) => tick.refine((isTicked) => isTicked, sentence);

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
  basalStepUnits: decimal({ min: 0.005, max: 0.5, unit: "U/h" }).prefault("0.05"),
  bolusStepUnits: decimal({ min: 0.005, max: 1, unit: "U" }).prefault("0.05"),
});
export type CreateJournalInput = z.input<typeof createJournalInput>;

export const stepInput = z.object({ journalId, step: z.enum(WIZARD_STEPS) });

/** A page sent back: which, what the draft's count was when it was opened, and the typed values. */
export const saveStepInput = z.object({ journalId, step: z.enum(WIZARD_STEPS), rowVersion });
export type SaveStepInput = z.input<typeof saveStepInput> & Record<string, unknown>;

const typed = z.string().max(40).catch("");

/** One press of the block editor, sent where there is no script: the rows as typed, and which button. */
export const editBlocksInput = z.object({
  journalId,
  step: z.enum(["basal", "carb-ratio", "sensitivity", "targets"]),
  rowVersion,
  edit: z.string().max(12),
  blocks: z.array(z.object({ from: typed, value: typed, low: typed, high: typed }).partial().catch({})).max(48).catch([]),
});
export type EditBlocksInput = z.input<typeof editBlocksInput> | Record<string, unknown>;

/** Of two texts for one page: the saved one, or one that was typed elsewhere by its place in the list. */
export const chooseTextInput = z.object({
  journalId,
  step: z.enum(WIZARD_STEPS),
  rowVersion,
  keep: z.union([z.literal("saved"), z.coerce.number().int().min(0).max(50)], { error: "Choose which text stays." }),
});
export type ChooseTextInput = z.input<typeof chooseTextInput>;

export const proposeStartInput = z.object({ journalId, rowVersion, note: words(2000).default("") });
export type ProposeStartInput = z.input<typeof proposeStartInput>;

const hasKetoneStrips = ticked("Tick this once ketone strips in date are at hand.");
const hasFastCarbohydrate = ticked("Tick this once fast carbohydrate is at hand.");

export const recordStartInput = z.object({
  journalId,
  rowVersion,
  note: words(2000).default(""),
  /** Local date and time in the journal's zone, as typed; empty is now. */
  effectiveFrom: z.union([z.literal(""), z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}/, "Type the date and time on the device.")]).default(""),
  isKnowing: ticked("Tick this to say that you know it."),
  hasKetoneStrips,
  hasFastCarbohydrate,
});
export type RecordStartInput = z.input<typeof recordStartInput>;

export const planStartInput = z.object({ journalId, plannedStartOn: z.union([z.literal("").transform(() => null), z.iso.date("Type a date.")]) });
export type PlanStartInput = z.input<typeof planStartInput>;

export const startJournalInput = z.object({ journalId, startedOn: z.iso.date("Type a date."), hasKetoneStrips, hasFastCarbohydrate });
export type StartJournalInput = z.input<typeof startJournalInput>;

export const saveCardInput = cardFields.extend({ journalId });
export type SaveCardInput = z.input<typeof saveCardInput>;

export const writeDosesInput = z
  .object({
    journalId,
    longActingUnits: optionalDecimal({ min: 0, max: 200, unit: "U" }),
    rapidUnits: optionalDecimal({ min: 0, max: 60, unit: "U" }),
  })
  .refine((doses) => doses.longActingUnits !== null || doses.rapidUnits !== null, { path: ["longActingUnits"], message: "Write at least one of the two." });
export type WriteDosesInput = z.input<typeof writeDosesInput>;
