/** Why a setting was changed: the list a person chooses from (content.md 5). */
export const CHANGE_REASONS = {
  "pattern-low": "Lows at the same time on several days",
  "pattern-high": "Highs at the same time on several days",
  "severe-low": "A low that needed someone's help",
  "test-result": "The result of a test",
  "illness-plan": "My illness plan",
  "educator-said": "My educator said so",
  "talked-with-mentor": "Talked it over with my mentor",
  "device-update": "An update of the device",
  "typing-error": "A typing error put right",
  undo: "Back to an earlier version",
  other: "Something else, in words",
} as const;

export type ChangeReason = keyof typeof CHANGE_REASONS;

export const CHANGE_REASON_CODES = Object.keys(CHANGE_REASONS) as [ChangeReason, ...ChangeReason[]];

/** "other" says nothing by itself and needs words. */
export function needsWords(reason: ChangeReason): boolean {
  return reason === "other";
}
