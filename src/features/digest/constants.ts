import type { DigestLevel } from "@/domain/digest/basis";

/** What each level holds, in the words of the form. */
export const LEVEL_WORDS: ReadonlyArray<Readonly<{ value: DigestLevel; label: string; hint: string }>> = [
  { value: "links", label: "Counts and links", hint: "How many changes, days with data and questions. No health data in the mail." },
  { value: "summary", label: "Summary", hint: "Adds which versions changed, and the first sentence of what followed." },
  { value: "full", label: "Everything", hint: "Adds old and new values and the figures of the week. Anyone who reads your mail can read them." },
  { value: "off", label: "No weekly mail", hint: "Nothing is sent. The pages stay as they are." },
];
