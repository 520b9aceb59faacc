import { offsetMinutes } from "@/domain/civil-time";

const DAY_MS = 86_400_000;
const MINUTE_MS = 60_000;

/**
 * The instants at which a zone's clocks show a wall-clock time: none where the
 * clock skips it, two where the clock shows it twice, else one.
 *
 * @param localMs the wall-clock time as if it were UTC, epoch milliseconds
 * @returns epoch milliseconds, ascending
 */
export function instantsOfLocal(localMs: number, zone: string): number[] {
  const offsets = new Set([offsetMinutes(localMs - DAY_MS, zone), offsetMinutes(localMs + DAY_MS, zone)]);
  return [...offsets]
    .map((offset) => localMs - offset * MINUTE_MS)
    .filter((ms) => ms + offsetMinutes(ms, zone) * MINUTE_MS === localMs)
    .toSorted((a, b) => a - b);
}
