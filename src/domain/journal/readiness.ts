import type { VersionState } from "./version-lifecycle";

/** What is known on the way to the start day. */
export type ReadinessFacts = Readonly<{
  /** Null: the gate questions were not answered. */
  isGateOpen: boolean | null;
  /** State of the starting profile; null before there is one. */
  startingState: VersionState | null;
  /** What to go back to is written down. */
  hasPreviousSetup: boolean;
  hasBackUpDose: boolean;
  hasContact: boolean;
  /** Two statements of the person's own, made on the day. */
  hasKetoneStrips: boolean;
  hasFastCarbohydrate: boolean;
  daysOfGlucose: number;
  hasMentor: boolean;
  /** Labels of flags on the start day that would leave it out of a comparison. */
  flagsOnStartDay: ReadonlyArray<string>;
}>;

/** A thing that is missing, and the path under the journal where it is done; null where it is done on the spot. */
export type Missing = Readonly<{ code: string; text: string; at: string | null }>;

const DAYS_OF_GLUCOSE = 10;

/**
 * What keeps the start day closed, and what is only said (content.md 3). The
 * list is common practice without a source. The kit beyond ketone strips and
 * fast carbohydrate is not looked at here.
 */
export function readiness(facts: ReadinessFacts): Readonly<{ blocks: Missing[]; warns: Missing[] }> {
  const { isGateOpen, startingState } = facts;
  const isAgreed = startingState === "approved" || startingState === "in-effect";
  const unless = (isThere: boolean, code: string, text: string, at: string | null): Missing[] => (isThere ? [] : [{ code, text, at }]);
  return {
    blocks: [
      ...unless(facts.hasPreviousSetup, "no-fallback", "What you would go back to is not written down.", "fallback/edit"),
      ...unless(isGateOpen === true || facts.hasBackUpDose, "no-back-up-dose", "No back-up dose is written down. Your answers ask for one, marked by your educator.", "fallback"),
      ...unless(isAgreed, "not-agreed", notAgreedText(startingState, isGateOpen), startingState === null ? "start/review" : "changes"),
      ...unless(facts.hasContact, "no-contact", "Nobody who can be called is written down.", "fallback/edit"),
      ...unless(facts.hasKetoneStrips, "no-ketone-strips", "Ketone strips in date are not ticked.", null),
      ...unless(facts.hasFastCarbohydrate, "no-fast-carbohydrate", "Fast carbohydrate is not ticked.", null),
    ],
    warns: [
      ...unless(facts.daysOfGlucose >= DAYS_OF_GLUCOSE, "little-glucose", `${facts.daysOfGlucose} days of glucose are here; ${DAYS_OF_GLUCOSE} or more say more about what follows.`, "data"),
      ...unless(facts.hasMentor, "no-mentor", "No mentor is in the circle yet.", "circle"),
      ...facts.flagsOnStartDay.map((label) => ({ code: "flagged-day", text: `The start day is flagged: ${label.toLowerCase()}. It may not be an ordinary day.`, at: null })),
    ],
  };
}

function notAgreedText(state: VersionState | null, isGateOpen: boolean | null): string {
  if (state === "proposed") return "The starting profile waits for your educator.";
  if (state === "returned") return "The starting profile came back with remarks.";
  return isGateOpen ? "The starting profile is neither approved nor knowingly recorded." : "The starting profile is not approved.";
}
