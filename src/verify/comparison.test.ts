import { existsSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { adjustCases } from "./adjusted";
import { compareCases } from "./comparison";
import { readRows } from "./csv-file";

const DATA = "../shared/data/statistics";

/** Every cell of the outside file equal to ours: words and counts exactly, numbers to the tolerance. */
function expectEqual(ours: Record<string, string | number | null>[], outside: Record<string, string>[], tolerance: number) {
  expect(ours).toHaveLength(outside.length);
  outside.forEach((row, i) => {
    for (const [column, text] of Object.entries(row)) {
      const value = ours[i]?.[column] ?? "";
      const where = `case ${row.case}, ${column}`;
      if (typeof value !== "number") expect(String(value), where).toBe(text);
      else expect(Math.abs(value - Number(text)), where).toBeLessThanOrEqual(tolerance * Math.max(1, Math.abs(Number(text))));
    }
  });
}

describe.skipIf(!existsSync(DATA))("outside check values (computed twice in Python; skipped where ../shared is absent)", () => {
  it("plain comparison: every case to 1e-9, day counts exactly", () => {
    const ours = compareCases(readRows(`${DATA}/check_cases.csv`), readRows(`${DATA}/check_days.csv`));
    expectEqual(ours, readRows(`${DATA}/check_expected.csv`), 1e-9);
  });

  it("insulin-adjusted comparison: every case to 1e-7", () => {
    const ours = adjustCases(readRows(`${DATA}/adjusted_cases.csv`), readRows(`${DATA}/adjusted_days.csv`));
    expectEqual(ours, readRows(`${DATA}/adjusted_expected.csv`), 1e-7);
  });
});
