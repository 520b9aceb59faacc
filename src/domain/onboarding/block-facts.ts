import { readDecimal } from "@/domain/form-text";
import { MINUTES_PER_DAY } from "@/domain/settings/schedule";
import { startOfRow, type TypedRow } from "./block-rows";

/** A readable block of one value, in the unit of its page. */
export type ValueBlock = Readonly<{ startMinute: number; value: number }>;

/** The rows that can be read already, in order of the day; of two that start together the first one typed. */
export function readableBlocks(rows: ReadonlyArray<TypedRow>, field = "value"): ValueBlock[] {
  const blocks = rows.flatMap((row) => {
    const startMinute = startOfRow(row.from);
    const value = readDecimal(row[field] ?? "");
    return startMinute === null || typeof value === "string" ? [] : [{ startMinute, value }];
  });
  return blocks
    .filter(({ startMinute }, i) => blocks.findIndex((other) => other.startMinute === startMinute) === i)
    .toSorted((a, b) => a.startMinute - b.startMinute);
}

/** A day's total in thousandths of the value's hourly unit, or null while the day does not begin at 00:00. */
export function dayTotalMilli(blocks: ReadonlyArray<ValueBlock>): number | null {
  if (blocks[0]?.startMinute !== 0) return null;
  const milliMinutes = blocks.reduce((sum, { startMinute, value }, i) => sum + Math.round(value * 1000) * ((blocks[i + 1]?.startMinute ?? MINUTES_PER_DAY) - startMinute), 0);
  return milliMinutes / 60;
}

/** What a schedule held during a part of the day: its lowest and highest value, and the mean weighted by time. */
export type PartOfSchedule = Readonly<{ low: number; high: number; mean: number }>;

/**
 * @param fromMinute first minute of the part
 * @param toMinute   first minute after it
 * @returns null where the schedule is empty, does not begin at 00:00, or the part has no length
 */
export function partOfSchedule(blocks: ReadonlyArray<ValueBlock>, fromMinute: number, toMinute: number): PartOfSchedule | null {
  if (blocks[0]?.startMinute !== 0 || toMinute <= fromMinute) return null;
  const inPart = blocks.flatMap(({ startMinute, value }, i) => {
    const minutes = Math.min(toMinute, blocks[i + 1]?.startMinute ?? MINUTES_PER_DAY) - Math.max(fromMinute, startMinute);
    return minutes > 0 ? [{ value, minutes }] : [];
  });
  const values = inPart.map(({ value }) => value);
  const mean = inPart.reduce((sum, { value, minutes }) => sum + value * minutes, 0) / (toMinute - fromMinute);
  return { low: Math.min(...values), high: Math.max(...values), mean };
}

/**
 * The two values of a device's step between which a value lies; null where it
 * lies on a step. Worked in millionths, so that 0.15 is on a step of 0.05.
 */
export function stepNeighbours(value: number, step: number): readonly [number, number] | null {
  const [microValue, microStep] = [Math.round(value * 1e6), Math.round(step * 1e6)];
  if (microStep <= 0 || microValue % microStep === 0) return null;
  const below = Math.floor(microValue / microStep) * microStep;
  return [below / 1e6, (below + microStep) / 1e6];
}
