import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { blockAt, isSameSchedule, isSameValue, MINUTES_PER_DAY, normaliseSchedule, scheduleFault, spansOf } from "./schedule";

vi.setConfig({ testTimeout: 60_000 });

type Rate = { startMinute: number; rate: number };
const rates = (...pairs: [number, number][]): Rate[] => pairs.map(([startMinute, rate]) => ({ startMinute, rate }));
const DAY = rates([0, 5], [240, 15], [480, 10]);

const anySchedule = fc
  .tuple(fc.uniqueArray(fc.integer({ min: 1, max: 1439 }), { maxLength: 12 }), fc.array(fc.integer({ min: 0, max: 3 }), { minLength: 13, maxLength: 13 }))
  .map(([starts, values]) => rates(...[0, ...starts.toSorted((a, b) => a - b)].map((start, i): [number, number] => [start, values[i] ?? 0])));

describe("a schedule", () => {
  it.each([
    [[], 0, /at least one/],
    [rates([5, 1]), 0, /first block/],
    [rates([0, 1], [0, 2]), 1, /none twice/],
    [rates([0, 1], [300, 2], [200, 3]), 2, /one after the other/],
    [rates([0, 1], [1440, 2]), 1, /0 to 1439/],
    [rates([0, 1], [60.5, 2]), 1, /whole minute/],
    [rates([-60, 1]), 0, /0 to 1439/],
  ])("names the first block at fault in %j", (blocks, index, text) => {
    expect(scheduleFault(blocks)).toMatchObject({ index, text: expect.stringMatching(text) as string });
    expect(() => spansOf(blocks)).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
  });

  it("has no fault when it covers the day", () => {
    expect(scheduleFault(DAY)).toBeNull();
  });

  it("has the value of the block that started last", () => {
    expect([0, 239, 240, 479, 480, 1439].map((minute) => blockAt(DAY, minute).rate)).toEqual([5, 5, 15, 15, 10, 10]);
  });

  it.each([-1, 1440, Number.NaN])("has no value at minute %s", (minute) => {
    expect(() => blockAt(DAY, minute)).toThrow(expect.objectContaining({ code: "INVALID_RANGE" }));
  });

  it("writes out both ends of every block", () => {
    expect(spansOf(DAY).map(({ fromMinute, toMinute }) => [fromMinute, toMinute])).toEqual([
      [0, 240],
      [240, 480],
      [480, 1440],
    ]);
  });

  it("drops a block that repeats the one before, and nothing else", () => {
    expect(normaliseSchedule(rates([0, 5], [60, 5], [120, 6], [180, 5]))).toEqual(rates([0, 5], [120, 6], [180, 5]));
  });

  it("is the same however it is cut, and another where one minute differs", () => {
    expect(isSameSchedule(DAY, rates([0, 5], [100, 5], [240, 15], [480, 10]))).toBe(true);
    expect(isSameSchedule(DAY, rates([0, 5], [241, 15], [480, 10]))).toBe(false);
    expect(isSameSchedule(DAY, rates([0, 5], [240, 15], [480, 11]))).toBe(false);
    expect(isSameSchedule(DAY, rates([0, 5]))).toBe(false);
  });

  it("compares values by everything but the start", () => {
    expect(isSameValue({ startMinute: 0, low: 1, high: 2 }, { startMinute: 9, low: 1, high: 2 })).toBe(true);
    expect(isSameValue({ startMinute: 0, low: 1, high: 2 }, { startMinute: 0, low: 1, high: 3 })).toBe(false);
  });

  it("covers 24 hours without a gap or overlap, cut or normalised, at the same values", () => {
    fc.assert(
      fc.property(anySchedule, fc.integer({ min: 0, max: 1439 }), (schedule, minute) => {
        for (const blocks of [schedule, normaliseSchedule(schedule)]) {
          const spans = spansOf(blocks);
          expect(spans[0]?.fromMinute).toBe(0);
          expect(spans.at(-1)?.toMinute).toBe(MINUTES_PER_DAY);
          spans.slice(1).forEach((span, i) => expect(span.fromMinute).toBe(spans[i]?.toMinute));
          expect(spans.every(({ fromMinute, toMinute }) => fromMinute < toMinute)).toBe(true);
        }
        expect(blockAt(normaliseSchedule(schedule), minute).rate).toBe(blockAt(schedule, minute).rate);
        expect(isSameSchedule(schedule, normaliseSchedule(schedule))).toBe(true);
      }),
      { numRuns: 10_000 },
    );
  });
});
