import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { bandOf } from "./band";
import { rollUp } from "./daily-rollup";

const at = (iso: string, mgDl: number) => ({ atMs: Date.parse(iso), glucoseMgDl: mgDl, band: bandOf(mgDl, "mg/dL") });

describe("rollUp", () => {
  it("counts a hand-made night and day: 69, 70 by night, 180, 181 by day", () => {
    const rows = rollUp([at("2026-03-01T01:00:00Z", 69), at("2026-03-01T01:05:00Z", 70), at("2026-03-01T12:00:00Z", 180), at("2026-03-01T12:05:00Z", 181)], "UTC");
    expect(rows).toMatchObject([
      { part: "day", readings: 4, sumMgDl: 500, bandCounts: [0, 1, 2, 1, 0], minutesInPart: 1440 },
      { part: "night", readings: 2, sumMgDl: 139, bandCounts: [0, 1, 1, 0, 0], minutesInPart: 360 },
    ]);
  });

  it.each([
    ["2026-03-29", "Europe/Oslo", 1380, 300],
    ["2026-10-25", "Europe/Oslo", 1500, 420],
    ["2026-04-05", "Australia/Lord_Howe", 1470, 390],
    ["2026-03-10", "America/St_Johns", 1440, 360],
  ])("knows the real minutes of %s in %s", (day, zone, dayMinutes, nightMinutes) => {
    const rows = rollUp(Array.from({ length: 30 }, (_, i) => at(new Date(Date.parse(`${day}T00:00:00Z`) - 15 * 3_600_000 + i * 3_600_000).toISOString(), 100)), zone);
    const dayNumber = Date.parse(`${day}T00:00:00Z`) / 86_400_000;
    expect(rows.find((r) => r.dayNumber === dayNumber && r.part === "day")?.minutesInPart).toBe(dayMinutes);
    expect(rows.find((r) => r.dayNumber === dayNumber && r.part === "night")?.minutesInPart).toBe(nightMinutes);
  });

  it("adds up: figures of two days together are those of each alone", () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 40, max: 400 }), { minLength: 2, maxLength: 200 }), (values) => {
        const readings = values.map((v, i) => at(new Date(Date.UTC(2026, 2, 1) + i * 15 * 60_000).toISOString(), v));
        const total = rollUp(readings, "UTC").filter((r) => r.part === "day").reduce((sum, r) => sum + r.sumMgDl, 0);
        expect(total).toBe(values.reduce((sum, v) => sum + v, 0));
      }),
    );
  });
});
