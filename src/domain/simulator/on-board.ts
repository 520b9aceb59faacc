import { SLOT_MINUTES } from "./slots";

/** How long the simulated loop remembers insulin, slots (6 h), and the time constant of its memory, min. */
export const REMEMBERED_SLOTS = 72;
const TIME_CONSTANT_MINUTES = 90;

/** Share still to act of insulin given k slots ago, for k from 0 to 72: (1 + t/90) e^(-t/90). */
const REMAINING = Float64Array.from({ length: REMEMBERED_SLOTS + 1 }, (_, k) => {
  const x = (k * SLOT_MINUTES) / TIME_CONSTANT_MINUTES;
  return (1 + x) * Math.exp(-x);
});

/**
 * Insulin on board before anything is given in a slot, in the unit of the row. Below
 * zero where the loop has given less than what is programmed.
 *
 * @param given insulin beyond what is programmed, for every slot so far
 */
export function insulinOnBoard(given: Float64Array, slot: number): number {
  const farthest = Math.min(REMEMBERED_SLOTS, slot);
  let sum = 0;
  for (let k = 1; k <= farthest; k++) sum += (REMAINING[k] ?? 0) * (given[slot - k] ?? 0);
  return sum;
}
