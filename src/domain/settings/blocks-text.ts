import { plainDigits, readDecimal } from "@/domain/form-text";
import { clockText } from "./clock-text";

export type TypedBlock = Readonly<{ startMinute: number; value: number }>;

/**
 * Blocks as people write them down from a device: one a line, a time and a
 * value, "00:00 0.60". Commas, semicolons and "U/h" are borne with.
 *
 * @returns the blocks, or a sentence that names the line at fault
 */
export function readBlocks(typed: string): TypedBlock[] | string {
  const lines = typed.split(/[\n;]+/).map((line) => line.trim()).filter(Boolean);
  const blocks: TypedBlock[] = [];
  for (const [i, line] of lines.entries()) {
    const [, hours = "", minutes = "", rest = ""] = /^(\S{1,2})[:.](\S{2})\s+(.+)$/u.exec(line) ?? [];
    const startMinute = Number(plainDigits(hours)) * 60 + Number(plainDigits(minutes));
    const value = readDecimal(rest);
    if (hours === "" || !(startMinute >= 0 && startMinute < 1440) || typeof value === "string") {
      return `Line ${i + 1} is not a time and a value, such as 00:00 0.60.`;
    }
    blocks.push({ startMinute, value });
  }
  if (blocks.length === 0) return "Type at least one line, such as 00:00 0.60.";
  if (blocks[0]?.startMinute !== 0) return "The first line starts at 00:00.";
  if (blocks.some((b, i) => i > 0 && b.startMinute <= (blocks[i - 1]?.startMinute ?? -1))) return "Each line starts later than the one before.";
  return blocks;
}

/** The inverse: one block a line. */
export function blocksText(blocks: ReadonlyArray<TypedBlock>): string {
  return blocks.map(({ startMinute, value }) => `${clockText(startMinute)} ${value}`).join("\n");
}
