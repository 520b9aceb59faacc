/**
 * The grid on which the simulated people live: steps of five minutes, 288 a day,
 * counted from the midnight at which a run begins.
 */
export const SLOT_MINUTES = 5;
export const SLOTS_PER_HOUR = 12;
export const SLOTS_PER_DAY = 288;

/**
 * The slot of the day that holds a minute of the day.
 *
 * @param minute after midnight, 0 to 1439
 */
export function slotOfMinute(minute: number): number {
  return Math.floor(minute / SLOT_MINUTES);
}
