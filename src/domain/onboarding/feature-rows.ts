import { z } from "zod";
import { readDecimal } from "@/domain/form-text";
import { MAX_FEATURE_LABEL_LENGTH, MAX_FEATURE_TEXT_LENGTH, MAX_FEATURES } from "@/domain/settings/profile-bounds";
import type { Feature } from "@/domain/settings/profile-features";

export const FEATURE_KINDS = { switch: "On or off", number: "A number", text: "Words" } as const;

const ON = /^(on|yes|1|true)$/i;
const OFF = /^(off|no|0|false)$/i;

const row = z
  .object({
    label: z.string().trim().min(1, "Name it as your device does.").max(MAX_FEATURE_LABEL_LENGTH, `At most ${MAX_FEATURE_LABEL_LENGTH} characters.`),
    kind: z.enum(["switch", "number", "text"], { error: "Choose what it holds." }).default("text"),
    value: z.string().trim().max(MAX_FEATURE_TEXT_LENGTH, `At most ${MAX_FEATURE_TEXT_LENGTH} characters.`).default(""),
  })
  .transform(({ label, kind, value }, ctx): Feature => {
    const refuse = (message: string) => {
      ctx.addIssue({ code: "custom", path: ["value"], message });
      return z.NEVER;
    };
    if (kind === "text") return { label, kind, value };
    if (kind === "switch") return ON.test(value) || OFF.test(value) ? { label, kind, value: ON.test(value) } : refuse("Type on or off.");
    const number = readDecimal(value);
    return typeof number === "string" ? refuse(number) : { label, kind, value: number };
  });

function isNothing(typed: unknown): boolean {
  if (typed === null || typeof typed !== "object") return true;
  const { label, value } = typed as Record<string, unknown>;
  return [label, value].every((text) => typeof text !== "string" || text.trim() === "");
}

/**
 * Switches, numbers and words of a device under the person's own labels. Rows
 * left empty are dropped; an issue names the row as it was typed.
 */
export const featureRows = z.preprocess(
  (rows): unknown => (Array.isArray(rows) ? rows : []),
  z
    .array(z.preprocess((typed) => (isNothing(typed) ? null : typed), row.nullable()))
    .max(MAX_FEATURES)
    .superRefine((rows, ctx) => {
      rows.forEach((feature, i) => {
        if (feature && rows.slice(0, i).some((other) => other?.label === feature.label)) {
          ctx.addIssue({ code: "custom", path: [i, "label"], message: "This name is used twice." });
        }
      });
    })
    .transform((rows) => rows.filter((feature): feature is Feature => feature !== null)),
);
