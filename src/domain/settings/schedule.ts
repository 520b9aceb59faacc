import { AppError } from "@/domain/errors";

/**
 * A setting that steps through the day: each block holds from its start until
 * the next block starts, the last one until midnight. Minutes after midnight,
 * first block at 0, ascending, so that every minute has exactly one value.
 */
export type Block = Readonly<{ startMinute: number }>;
export type Schedule<B extends Block> = ReadonlyArray<B>;

export const MINUTES_PER_DAY = 1440;

/** A block with both ends written out; `toMinute` is not part of it. */
export type Span<B extends Block> = Readonly<{ block: B; fromMinute: number; toMinute: number }>;

/**
 * What keeps a list of blocks from being a schedule.
 *
 * @returns the index of the first block at fault and why, or `null` when there is none
 */
export function scheduleFault(blocks: Schedule<Block>): { index: number; text: string } | null {
  if (blocks.length === 0) return { index: 0, text: "a schedule needs at least one block" };
  let previous = -1;
  for (const [index, { startMinute }] of blocks.entries()) {
    if (!Number.isInteger(startMinute) || startMinute < 0 || startMinute >= MINUTES_PER_DAY) {
      return { index, text: "a block starts at a whole minute from 0 to 1439" };
    }
    if (index === 0 && startMinute !== 0) return { index, text: "the first block starts at minute 0" };
    if (startMinute <= previous) return { index, text: "blocks start one after the other, none twice" };
    previous = startMinute;
  }
  return null;
}

/** @throws {AppError} INVALID_INPUT for a list of blocks that leaves a gap or overlaps */
export function assertSchedule(blocks: Schedule<Block>): void {
  const fault = scheduleFault(blocks);
  if (fault) throw new AppError("INVALID_INPUT", `block ${fault.index}: ${fault.text}`);
}

/** The blocks with their ends; together they cover 0 to 1440 without overlap. */
export function spansOf<B extends Block>(schedule: Schedule<B>): Span<B>[] {
  assertSchedule(schedule);
  return schedule.map((block, index) => ({
    block,
    fromMinute: block.startMinute,
    toMinute: schedule[index + 1]?.startMinute ?? MINUTES_PER_DAY,
  }));
}

/**
 * The block in force at a minute of the day.
 *
 * @throws {AppError} INVALID_RANGE for a minute outside 0 to 1439
 */
export function blockAt<B extends Block>(schedule: Schedule<B>, minute: number): B {
  const span = spansOf(schedule).find(({ fromMinute, toMinute }) => fromMinute <= minute && minute < toMinute);
  if (!span) throw new AppError("INVALID_RANGE", `minute ${minute} of the day`);
  return span.block;
}

function withoutStart({ startMinute: _start, ...value }: Block): Record<string, unknown> {
  return value;
}

/** Whether two blocks set the same value, wherever they start. */
export function isSameValue<B extends Block>(a: B, b: B): boolean {
  const [left, right] = [withoutStart(a), withoutStart(b)];
  const keys = new Set([...Object.keys(left), ...Object.keys(right)]);
  return [...keys].every((key) => left[key] === right[key]);
}

/** The same schedule with the fewest blocks: one that repeats the value before it goes. */
export function normaliseSchedule<B extends Block>(schedule: Schedule<B>): B[] {
  assertSchedule(schedule);
  return schedule.filter((block, index) => {
    const before = schedule[index - 1];
    return before === undefined || !isSameValue(before, block);
  });
}

/** Whether two schedules set the same value at every minute, however they are cut into blocks. */
export function isSameSchedule<B extends Block>(a: Schedule<B>, b: Schedule<B>): boolean {
  const [left, right] = [normaliseSchedule(a), normaliseSchedule(b)];
  if (left.length !== right.length) return false;
  return left.every((block, index) => {
    const other = right[index];
    return other !== undefined && block.startMinute === other.startMinute && isSameValue(block, other);
  });
}
