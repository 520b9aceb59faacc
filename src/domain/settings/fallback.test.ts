import { describe, expect, it } from "vitest";
import { backUpDoses } from "./fallback";
import { EXAMPLE_PROFILE } from "./profile.fixture";

const flat = (milliUnitsPerHour: number) => [{ startMinute: 0, milliUnitsPerHour }];
const rows = (...args: Parameters<typeof backUpDoses>) => backUpDoses(...args).map(({ id, units }) => [id, units]);

describe("back-up doses", () => {
  it("show all published variants: 18 U of basal, 42 U a day", () => {
    expect(rows(flat(750), 42)).toEqual([
      ["back-up-1.0", 18],
      ["back-up-1.2", 21.6],
      ["back-up-sixth", 7],
    ]);
  });

  it("count blocks, not an average rate: 4 x 0.5 + 18 x 0.65 + 2 x 0.55 = 14.8 U", () => {
    expect(rows(EXAMPLE_PROFILE.basal, null)).toEqual([
      ["back-up-1.0", 14.8],
      ["back-up-1.2", 17.76],
    ]);
  });

  it("carry source, provenance and what kind of dose they are", () => {
    for (const row of backUpDoses(flat(750), 42)) {
      expect(row).toMatchObject({ provenance: "R" });
      expect(row.source).not.toBe("");
      expect(row).not.toHaveProperty("formula");
    }
    expect(backUpDoses(flat(750), 42).map(({ kind }) => kind)).toEqual([
      "long-acting-per-day",
      "long-acting-per-day",
      "rapid-every-4-hours",
    ]);
  });
});
