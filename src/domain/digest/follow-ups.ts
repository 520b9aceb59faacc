import type { VersionState } from "@/domain/journal/version-lifecycle";
import { dayNumberOf } from "@/domain/day-start";
import type { FollowUp } from "./week";

const DAYS_AHEAD = 7;
/** An older date was let pass; it would be said every week for ever. */
const DAYS_OVERDUE_AT_MOST = 28;

/**
 * The dates that fall due in the coming seven days, or did in the last 28: the
 * next review an educator set, and the look a person planned. Only of a
 * version that is approved or in effect, earliest first.
 *
 * @param today civil date as ISO
 */
export function followUpsOf(
  versions: ReadonlyArray<Readonly<{ number: number; state: VersionState; reviewOn: string | null; lookAgainOn: string | null }>>,
  today: string,
): FollowUp[] {
  const isNear = (on: string | null): on is string => {
    if (on === null) return false;
    const days = dayNumberOf(on) - dayNumberOf(today);
    return days < DAYS_AHEAD && days >= -DAYS_OVERDUE_AT_MOST;
  };
  return versions
    .filter(({ state }) => state === "in-effect" || state === "approved")
    .flatMap(({ number, reviewOn, lookAgainOn }) => [
      ...(isNear(reviewOn) ? [{ on: reviewOn, kind: "review" as const, versionNumber: number }] : []),
      ...(isNear(lookAgainOn) ? [{ on: lookAgainOn, kind: "look" as const, versionNumber: number }] : []),
    ])
    .toSorted((a, b) => a.on.localeCompare(b.on));
}
