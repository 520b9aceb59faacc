import { z } from "zod";
import { asList, optionalDecimal, timeOfDay } from "@/domain/form-text";
import { CHANGE_REASON_CODES, needsWords } from "@/domain/settings/change-reason";
import { EXPECTED_DIRECTIONS, EXPECTED_OUTCOMES, EXPECTED_WINDOWS, expectationSchema } from "@/domain/settings/expectation";
import { settingsProfileSchema } from "@/domain/settings/profile";

const journalId = z.uuid();
const versionNumber = z.coerce.number().int().min(1).max(100_000);
const words = (longest: number) => z.string().trim().max(longest, `At most ${longest} characters.`);
const codes = <Code extends string>(list: Record<Code, string>) => Object.keys(list) as [Code, ...Code[]];
const isoDay = z.iso.date("Type a date.");
const emptyToNull = <T extends z.ZodType>(schema: T) =>
  z.union([z.literal("").transform(() => null), schema]).nullish().transform((value) => value ?? null);

/** The days that looked like this, as ISO dates: none, one or many. */
const evidenceDays = z.preprocess(asList, z.array(z.iso.date()).max(60));
const answers = z.record(z.string().max(40), words(500)).default({});
const contentHash = z.string().regex(/^[0-9a-f]{64}$/);

export const journalInput = z.object({ journalId });
export const versionInput = z.object({ journalId, number: versionNumber });

const reason = z.object({ code: z.enum(CHANGE_REASON_CODES, { error: "Choose a reason from the list." }), text: words(2000) })
  .refine((r) => !needsWords(r.code) || r.text.length > 0, { path: ["text"], message: "Say in a few words why." });

/** A whole new profile, proposed or recorded: what the API sends and what every form ends in. */
export const saveVersionInput = z.object({
  journalId,
  baseVersion: versionNumber,
  profile: settingsProfileSchema,
  reason,
  expectation: expectationSchema.nullable(),
  evidenceDays,
  lookAgainOn: isoDay.nullable().default(null),
  revertRule: words(500).default(""),
  answers,
  kind: z.enum(["change", "undo"]).default("change"),
  action: z.enum(["propose", "record"]),
});
export type SaveVersionInput = z.input<typeof saveVersionInput>;

const partEnd = z.union([z.literal("24:00").transform(() => 1440), z.literal("00:00").transform(() => 1440), timeOfDay]);

/** The change form: one setting, one part of the day. Values are read in the journal's unit. */
export const changeSettingInput = z
  .object({
    journalId,
    baseVersion: versionNumber,
    setting: z.enum(["basal", "carbRatio", "sensitivity", "target"], { error: "Choose which setting changes." }),
    from: timeOfDay,
    to: partEnd,
    value: optionalDecimal({ min: 0, max: 1000, unit: "" }),
    targetLow: optionalDecimal({ min: 1, max: 400, unit: "" }),
    targetHigh: optionalDecimal({ min: 1, max: 400, unit: "" }),
    reason: z.enum(CHANGE_REASON_CODES, { error: "Choose a reason from the list." }),
    reasonText: words(2000),
    expectedOutcome: z.enum(codes(EXPECTED_OUTCOMES), { error: "Choose what you hope to see." }),
    expectedWindow: z.enum(codes(EXPECTED_WINDOWS).filter((w) => w !== "own") as [keyof typeof EXPECTED_WINDOWS], { error: "Choose the part of the day." }),
    expectedDirection: z.enum(codes(EXPECTED_DIRECTIONS), { error: "Choose which way." }),
    evidenceDays,
    lookAgainOn: emptyToNull(isoDay),
    revertRule: words(500),
    answers,
    action: z.enum(["propose", "record"]).default("propose"),
  })
  .superRefine((input, ctx) => {
    const missing = (path: string, message: string) => ctx.addIssue({ code: "custom", path: [path], message });
    if (input.from >= input.to) missing("to", "The part of the day ends after it starts.");
    if (input.setting === "target") {
      if (input.targetLow === null) missing("targetLow", "Type the lower end of the target.");
      if (input.targetHigh === null) missing("targetHigh", "Type the upper end of the target.");
    } else if (input.value === null) missing("value", "Type the new value.");
    if (needsWords(input.reason) && input.reasonText === "") missing("reasonText", "Say in a few words why.");
  });
export type ChangeSettingInput = z.input<typeof changeSettingInput>;

export const effectInput = z.object({
  journalId,
  number: versionNumber,
  contentHash,
  /** Local date and time in the journal's zone, as typed; empty is now. */
  effectiveFrom: z.union([z.literal(""), z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}/, "Type the date and time on the device.")]).default(""),
});
export type EffectInput = z.input<typeof effectInput>;

export const returnToInput = z.object({ journalId, number: versionNumber, reasonText: words(2000).default(""), answers });
