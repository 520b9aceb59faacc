import type { VersionState } from "@/domain/journal/version-lifecycle";

export const STATE_WORDS: Readonly<Record<VersionState, string>> = {
  draft: "Draft",
  proposed: "Proposed",
  returned: "Returned",
  declined: "Declined",
  approved: "Approved",
  "in-effect": "In effect",
  superseded: "Superseded",
  withdrawn: "Withdrawn",
};

export const CHANGEABLE_SETTINGS = {
  basal: "Basal rate, U/h",
  carbRatio: "Carb ratio, g/U",
  sensitivity: "Sensitivity factor, per U",
  target: "Glucose target",
} as const;

export const REVERT_RULES = [
  "I go back if there are more than 2 lows a day on 2 days",
  "I go back if there is any low below 54 mg/dL (3.0 mmol/L) at night",
  "I go back if ketones are above 0.6 mmol/L",
  "I go back if my educator says so",
] as const;
