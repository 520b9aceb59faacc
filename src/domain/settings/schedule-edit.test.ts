import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { AppError } from "@/domain/errors";
import { blockAt, MINUTES_PER_DAY, spansOf } from "./schedule";
import { addBlock, changeSpan, mergeBlock, moveBlock, splitBlock } from "./schedule-edit";

vi.setConfig({ testTimeout: 60_000 });

type Rate = { startMinute: number; rate: number };
const rates = (...pairs: [number, number][]): Rate[] => pairs.map(([startMinute, rate]) => ({ startMinute, rate }));
const DAY = rates([0, 5], [240, 15], [480, 10]);
const refusal = (code: string) => expect.objectContaining({ code }) as Error;

describe("editing a schedule", () => {
  it("adds a block in its place", () => {
    expect(addBlock(DAY, { startMinute: 300, rate: 7 })).toEqual(rates([0, 5], [240, 15], [300, 7], [480, 10]));
    expect(() => addBlock(DAY, { startMinute: 240, rate: 7 })).toThrow(refusal("INVALID_INPUT"));
  });

  it("splits a block into two of the same value", () => {
    expect(splitBlock(DAY, 360)).toEqual(rates([0, 5], [240, 15], [360, 15], [480, 10]));
    expect(() => splitBlock(DAY, 240)).toThrow(refusal("INVALID_INPUT"));
    expect(() => splitBlock(DAY, 1440)).toThrow(refusal("INVALID_RANGE"));
  });

  it("merges a block into the one before", () => {
    expect(mergeBlock(DAY, 240)).toEqual(rates([0, 5], [480, 10]));
    expect(() => mergeBlock(DAY, 0)).toThrow(refusal("INVALID_INPUT"));
    expect(() => mergeBlock(DAY, 241)).toThrow(refusal("NOT_FOUND"));
  });

  it("moves a start between its neighbours and no further", () => {
    expect(moveBlock(DAY, 240, 300)).toEqual(rates([0, 5], [300, 15], [480, 10]));
    expect(() => moveBlock(DAY, 240, 480)).toThrow(refusal("INVALID_INPUT"));
    expect(() => moveBlock(DAY, 240, 0)).toThrow(refusal("INVALID_INPUT"));
    expect(() => moveBlock(DAY, 0, 60)).toThrow(refusal("INVALID_INPUT"));
    expect(() => moveBlock(DAY, 1, 60)).toThrow(refusal("NOT_FOUND"));
  });

  it("changes a part of the day, across blocks, and leaves the rest", () => {
    const change = (block: Rate) => ({ ...block, rate: block.rate + 1 });
    expect(changeSpan(DAY, 120, 300, change)).toEqual(rates([0, 5], [120, 6], [240, 16], [300, 15], [480, 10]));
    expect(changeSpan(DAY, 480, 1440, change)).toEqual(rates([0, 5], [240, 15], [480, 11]));
    expect(changeSpan(DAY, 0, 1440, change)).toEqual(rates([0, 6], [240, 16], [480, 11]));
  });

  it.each([
    [300, 300],
    [300, 200],
    [-1, 60],
    [0, 1441],
  ])("refuses the part from %s to %s", (from, to) => {
    expect(() => changeSpan(DAY, from, to, (block) => block)).toThrow(refusal("INVALID_RANGE"));
  });

  it("leaves what it was handed untouched", () => {
    const before = structuredClone(DAY);
    addBlock(DAY, { startMinute: 60, rate: 1 });
    mergeBlock(DAY, 240);
    moveBlock(DAY, 240, 250);
    changeSpan(DAY, 0, 60, (block) => ({ ...block, rate: 0 }));
    expect(DAY).toEqual(before);
  });

  const minute = fc.integer({ min: 0, max: 1439 });
  const edit = fc.oneof(
    fc.record({ kind: fc.constant("add" as const), a: minute, b: fc.integer({ min: 0, max: 40 }) }),
    fc.record({ kind: fc.constantFrom("split", "merge" as const), a: minute, b: minute }),
    fc.record({ kind: fc.constantFrom("move", "span" as const), a: minute, b: minute }),
  );

  function applied(schedule: Rate[], { kind, a, b }: { kind: string; a: number; b: number }): Rate[] {
    const start = schedule[a % schedule.length]?.startMinute ?? 0;
    if (kind === "add") return addBlock(schedule, { startMinute: a, rate: b });
    if (kind === "split") return splitBlock(schedule, a);
    if (kind === "merge") return mergeBlock(schedule, start);
    if (kind === "move") return moveBlock(schedule, start, b);
    return changeSpan(schedule, Math.min(a, b), Math.max(a, b), (block) => ({ ...block, rate: block.rate + 1 }));
  }

  it("covers 24 hours without overlap after any sequence of edits, or refuses the edit", () => {
    fc.assert(
      fc.property(fc.array(edit, { maxLength: 20 }), minute, (edits, probe) => {
        let schedule = DAY;
        for (const each of edits) {
          try {
            schedule = applied(schedule, each);
          } catch (error) {
            expect(error).toBeInstanceOf(AppError);
          }
          const spans = spansOf(schedule);
          expect(spans.reduce((sum, { fromMinute, toMinute }) => sum + toMinute - fromMinute, 0)).toBe(MINUTES_PER_DAY);
        }
        expect(blockAt(schedule, probe).rate).toBeGreaterThanOrEqual(0);
      }),
      { numRuns: 10_000 },
    );
  });
});
