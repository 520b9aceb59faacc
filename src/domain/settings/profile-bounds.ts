/**
 * The widest values a profile may hold, in its stored units. They catch a slip
 * of the keyboard and nothing more: whether a value suits a person is for the
 * checks, the guardrails and the educator. Common practice, no source.
 */
export const PROFILE_BOUNDS = {
  milliUnitsPerHour: { min: 0, max: 35_000 },
  milligramsPerUnit: { min: 500, max: 1_000_000 },
  microMgDlPerUnit: { min: 1_000_000, max: 5_000_000_000 },
  targetMgDl: { min: 60, max: 300 },
  durationOfActionMinutes: { min: 60, max: 720 },
  bolusMilliUnits: { min: 0, max: 100_000 },
  insulinOnBoardMilliUnits: { min: 0, max: 200_000 },
} as const;

/** One block for each half hour of the day. */
export const MAX_BLOCKS = 48;
export const MAX_FEATURES = 60;
export const MAX_FEATURE_LABEL_LENGTH = 80;
export const MAX_FEATURE_TEXT_LENGTH = 500;
