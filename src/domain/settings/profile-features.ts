import { z } from "zod";
import { MAX_FEATURE_LABEL_LENGTH, MAX_FEATURE_TEXT_LENGTH, MAX_FEATURES } from "./profile-bounds";

const label = z.string().trim().min(1).max(MAX_FEATURE_LABEL_LENGTH);

/** A switch, number or text of the device, written down in the person's own words. */
export const featureSchema = z.discriminatedUnion("kind", [
  z.object({ label, kind: z.literal("switch"), value: z.boolean() }),
  z.object({ label, kind: z.literal("number"), value: z.number() }),
  z.object({ label, kind: z.literal("text"), value: z.string().max(MAX_FEATURE_TEXT_LENGTH) }),
]);

export type Feature = z.infer<typeof featureSchema>;

/** Every label once: a difference between two profiles matches features by label. */
export const featuresSchema = z
  .array(featureSchema)
  .max(MAX_FEATURES)
  .superRefine((features, context) => {
    const seen = new Set<string>();
    for (const [index, feature] of features.entries()) {
      if (seen.has(feature.label)) {
        context.addIssue({ code: "custom", path: [index, "label"], message: "this label is used twice" });
      }
      seen.add(feature.label);
    }
  });
