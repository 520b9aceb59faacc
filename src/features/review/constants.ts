/** What an educator goes through before signing. */
export const REVIEW_CHECKLIST = {
  identity: "Identity and gate answers",
  data: "Span and sufficiency of the data",
  arithmetic: "Arithmetic shown, deviations and why",
  lows: "Lows first",
  ketones: "Ketone and sick-day plan",
  "back-up": "Back-up doses",
  "own-words": "The person can say each setting in their own words",
  contact: "Date and way of next contact",
} as const;

export const RETURN_REASONS = {
  "unclear-reason": "The reason is unclear",
  "step-too-large": "The step is too large",
  "too-many-at-once": "Too many settings at once",
  "data-too-thin": "The data are too thin",
  "lows-first": "Lows come first",
  other: "Something else",
} as const;

export const DECLINE_REASONS = {
  "not-suitable-now": "Not suitable now",
  "needs-a-visit": "Needs a visit",
  gate: "An answer of the gate questions",
  other: "Something else",
} as const;

/** The sign-off, bound to one version and its content hash. */
export function signOffText(given: { number: number; contentHash: string; firstDay: string; lastDay: string; reviewOn: string }): string {
  return `I have reviewed version ${given.number} (hash ${given.contentHash.slice(0, 12)}), the data from ${given.firstDay} to ${given.lastDay} and the checklist. In my professional judgement and within my scope of practice these settings are suitable to begin. Next review by ${given.reviewOn}.`;
}
