import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { dayTotalMilli, partOfSchedule, readableBlocks, stepNeighbours } from "./block-facts";

describe("readableBlocks", () => {
  it("reads what people type, in order of the day, and leaves out what can't be read yet", () => {
    expect(readableBlocks([
      { from: "16:00", value: "0,55 U/h" }, { from: "0:00", value: "０.45" }, { from: "4.00", value: "" }, { from: "", value: "1" }, { from: "00:00", value: "9" },
    ])).toEqual([{ startMinute: 0, value: 0.45 }, { startMinute: 960, value: 0.55 }]);
  });

  it("reads the field it is asked for", () => {
    expect(readableBlocks([{ from: "00:00", low: "100", high: "120" }], "high")).toEqual([{ startMinute: 0, value: 120 }]);
  });
});

describe("dayTotalMilli", () => {
  // Worked example W5 of the reference (Hamilton Health Sciences 2014): 2 + 6 + 16 = 24 U.
  it("adds up a day: 00–04 0.5, 04–08 1.5, 08–24 1.0", () => {
    expect(dayTotalMilli([{ startMinute: 0, value: 0.5 }, { startMinute: 240, value: 1.5 }, { startMinute: 480, value: 1 }])).toBe(24_000);
  });

  it("can't tell for a day that does not begin at 00:00", () => {
    expect(dayTotalMilli([])).toBeNull();
    expect(dayTotalMilli([{ startMinute: 60, value: 1 }])).toBeNull();
  });
});

describe("partOfSchedule", () => {
  const day = [{ startMinute: 0, value: 0.6 }, { startMinute: 180, value: 0.85 }, { startMinute: 540, value: 0.7 }];

  it("gives one value inside one block and a mean weighted by time across two, by hand", () => {
    expect(partOfSchedule(day, 0, 180)).toEqual({ low: 0.6, high: 0.6, mean: 0.6 });
    // 04:00 to 10:00: five hours of 0.85 and one of 0.70.
    const part = partOfSchedule(day, 240, 600);
    expect(part).toMatchObject({ low: 0.7, high: 0.85 });
    expect(part?.mean).toBeCloseTo((5 * 0.85 + 0.7) / 6, 12);
  });

  it("can't tell without a schedule, without its beginning, or for no time at all", () => {
    expect(partOfSchedule([], 0, 1440)).toBeNull();
    expect(partOfSchedule([{ startMinute: 60, value: 1 }], 0, 1440)).toBeNull();
    expect(partOfSchedule(day, 300, 300)).toBeNull();
  });

  it("has a mean between its ends, and parts that add up to the day", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1439 }), (cut) => {
        const [a, b, whole] = [partOfSchedule(day, 0, cut), partOfSchedule(day, cut, 1440), partOfSchedule(day, 0, 1440)];
        expect(a!.mean).toBeGreaterThanOrEqual(a!.low - 1e-12);
        expect(a!.mean).toBeLessThanOrEqual(a!.high + 1e-12);
        expect(a!.mean * cut + b!.mean * (1440 - cut)).toBeCloseTo(whole!.mean * 1440, 8);
      }),
    );
  });
});

describe("stepNeighbours", () => {
  it.each([
    [0.15, 0.05, null], [0.3, 0.1, null], [0.53, 0.05, [0.5, 0.55]], [0.62, 0.025, [0.6, 0.625]], [12.5, 1, [12, 13]], [1, 0, null],
  ])("%d on a step of %d: %j", (value, step, expected) => expect(stepNeighbours(value, step)).toEqual(expected));
});
