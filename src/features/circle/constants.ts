import type { JournalRole, Scope } from "@/domain/access/policy";

export const INVITATION_DAYS = 14;
export const COMMENT_CHARACTERS_AT_MOST = 4000;

/** The roles a person can give; their own cannot be given away. */
export const HELPER_ROLES = ["mentor", "educator", "family"] as const satisfies ReadonlyArray<JournalRole>;
export type HelperRole = (typeof HELPER_ROLES)[number];

export const ROLE_WORDS: Readonly<Record<JournalRole, string>> = {
  person: "person",
  mentor: "mentor",
  educator: "educator",
  family: "family helper",
};

export const ROLE_OPTIONS: ReadonlyArray<Readonly<{ value: HelperRole; label: string; hint: string }>> = [
  { value: "mentor", label: "Mentor", hint: "Has been through it. Reads what you share, comments and asks. Never sets a number." },
  { value: "educator", label: "Educator", hint: "Licensed. Reviews what you propose and signs. Needs to see your settings." },
  { value: "family", label: "Family helper", hint: "Reads and logs what you allow." },
];

/** What can be shared: beside its box, and within a sentence. */
export const SCOPE_OPTIONS: ReadonlyArray<Readonly<{ value: Scope; label: string; inSentence: string }>> = [
  { value: "settings", label: "Settings and their versions", inSentence: "settings" },
  { value: "glucose", label: "Glucose and comparisons", inSentence: "glucose and comparisons" },
  { value: "entries", label: "What is logged: meals, doses, days", inSentence: "what is logged" },
  { value: "notes", label: "Notes", inSentence: "notes" },
  { value: "feelings", label: "Feelings", inSentence: "feelings" },
  { value: "photos", label: "Photos", inSentence: "photos" },
];

/** Said when a mentor's comment holds a number for a setting (content.md 9). */
export const NUMBER_SENTENCE = "Numbers for settings come from the educator. Ask a question instead?";
