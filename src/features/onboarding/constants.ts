export const THERAPIES = { injections: "Injections", pump: "A pump", "closed-loop": "Another closed loop" } as const;

/** The value fields of each page that is edited by block. */
export const BLOCK_FIELDS = {
  basal: ["value"],
  "carb-ratio": ["value"],
  sensitivity: ["value"],
  targets: ["low", "high"],
} as const;

export type BlockStep = keyof typeof BLOCK_FIELDS;

export const RECORDED_TEXT = "Recorded without an educator’s review, knowingly.";
