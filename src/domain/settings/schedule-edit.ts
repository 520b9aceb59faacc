import { AppError } from "@/domain/errors";
import { assertSchedule, blockAt, MINUTES_PER_DAY, type Block, type Schedule } from "./schedule";

function inOrder<B extends Block>(blocks: B[]): B[] {
  return blocks.toSorted((a, b) => a.startMinute - b.startMinute);
}

function checked<B extends Block>(blocks: B[]): B[] {
  assertSchedule(blocks);
  return blocks;
}

/**
 * A new block, which holds until the next one starts.
 *
 * @throws {AppError} INVALID_INPUT when a block starts there already
 */
export function addBlock<B extends Block>(schedule: Schedule<B>, block: B): B[] {
  return checked(inOrder([...schedule, block]));
}

/**
 * Cut a block in two; both halves keep its value.
 *
 * @throws {AppError} INVALID_INPUT when a block starts there already
 */
export function splitBlock<B extends Block>(schedule: Schedule<B>, atMinute: number): B[] {
  return addBlock(schedule, { ...blockAt(schedule, atMinute), startMinute: atMinute });
}

function indexOfStart(schedule: Schedule<Block>, startMinute: number): number {
  const index = schedule.findIndex((block) => block.startMinute === startMinute);
  if (index === -1) throw new AppError("NOT_FOUND", `no block starts at minute ${startMinute}`);
  if (index === 0) throw new AppError("INVALID_INPUT", "the first block stays at minute 0");
  return index;
}

/**
 * Let the block before run on over this one.
 *
 * @throws {AppError} NOT_FOUND when no block starts there; INVALID_INPUT for the first block
 */
export function mergeBlock<B extends Block>(schedule: Schedule<B>, startMinute: number): B[] {
  return checked(schedule.toSpliced(indexOfStart(schedule, startMinute), 1));
}

/**
 * Let a block start earlier or later, between its neighbours.
 *
 * @throws {AppError} NOT_FOUND when no block starts there; INVALID_INPUT for the first block
 *   or when the new start meets or passes a neighbour
 */
export function moveBlock<B extends Block>(schedule: Schedule<B>, startMinute: number, newStartMinute: number): B[] {
  const index = indexOfStart(schedule, startMinute);
  return checked(schedule.map((block, i) => (i === index ? { ...block, startMinute: newStartMinute } : block)));
}

/**
 * Set a value for part of the day and leave the rest as it was.
 *
 * @param fromMinute first minute of the part, 0 to 1439
 * @param toMinute   first minute after it, up to 1440
 * @param change     from the block in force to the new one; its start is kept by this function
 * @throws {AppError} INVALID_RANGE unless fromMinute < toMinute, both inside the day
 */
export function changeSpan<B extends Block>(
  schedule: Schedule<B>,
  fromMinute: number,
  toMinute: number,
  change: (block: B) => B,
): B[] {
  if (!(fromMinute >= 0 && fromMinute < toMinute && toMinute <= MINUTES_PER_DAY)) {
    throw new AppError("INVALID_RANGE", `minutes ${fromMinute} to ${toMinute} of the day`);
  }
  const cuts = new Set(schedule.map((block) => block.startMinute)).add(fromMinute);
  if (toMinute < MINUTES_PER_DAY) cuts.add(toMinute);
  const blocks = [...cuts].map((startMinute) => {
    const block = blockAt(schedule, startMinute);
    const isInside = fromMinute <= startMinute && startMinute < toMinute;
    return { ...(isInside ? change(block) : block), startMinute };
  });
  return checked(inOrder(blocks));
}
