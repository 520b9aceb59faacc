import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { microMgDlPerUnitFrom, sensitivityIn } from "./sensitivity-unit";

vi.setConfig({ testTimeout: 60_000 });

describe("a sensitivity factor in two units", () => {
  it.each([
    [60, "mg/dL", 60_000_000],
    [51.4286, "mg/dL", 51_428_600],
    [3.4, "mmol/L", 61_253_040],
    [2.86, "mmol/L", 51_524_616],
  ] as const)("stores %s %s as %s millionths of a mg/dL", (value, unit, expected) => {
    expect(microMgDlPerUnitFrom(value, unit)).toBe(expected);
    expect(sensitivityIn(expected, unit)).toBeCloseTo(value, 9);
  });

  it("gives back every hundredth of a mmol/L exactly as typed", () => {
    for (let hundredths = 10; hundredths <= 3000; hundredths += 1) {
      const stored = microMgDlPerUnitFrom(hundredths / 100, "mmol/L");
      expect(stored).toBe(hundredths * 180_156);
      expect(Number(sensitivityIn(stored, "mmol/L").toFixed(2))).toBe(hundredths / 100);
    }
  });

  it("is not moved by a hundred switches of the unit", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1_000_000, max: 500_000_000 }), fc.boolean(), (stored, startsInMmol) => {
        let value = stored;
        for (let i = 0; i < 100; i += 1) {
          const unit = (i % 2 === 0) === startsInMmol ? "mmol/L" : "mg/dL";
          value = microMgDlPerUnitFrom(sensitivityIn(value, unit), unit);
        }
        expect(value).toBe(stored);
      }),
      { numRuns: 10_000 },
    );
  });
});
