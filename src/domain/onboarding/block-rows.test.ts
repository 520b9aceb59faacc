import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { clockText } from "@/domain/settings/clock-text";
import { addRow, editRows, hasNoValue, removeRow, splitRow, startOfRow, type TypedRow } from "./block-rows";
import { readableBlocks } from "./block-facts";

const rows = (...typed: [string, string][]): TypedRow[] => typed.map(([from, value]) => ({ from, value }));

describe("a block in two fields", () => {
  it.each([
    ["06:30", 390], ["6.30", 390], [" 0:00 ", 0], ["０６：３０", 390], ["２３:５９", 1439], ["24:00", null], ["12:60", null], ["noon", null], ["", null],
  ])("starts, typed as %j, at minute %j", (typed, minute) => expect(startOfRow(typed)).toBe(minute));

  it("is without a value when every value field is blank", () => {
    expect(hasNoValue({ from: "04:00", low: " ", high: "" })).toBe(true);
    expect(hasNoValue({ from: "", low: "", high: "7" })).toBe(false);
  });
});

describe("edits of a day", () => {
  const day = rows(["00:00", "0.45"], ["04:00", "0.60"], ["09:00", "0.50"]);

  it("adds an empty block at the end, and the first one at 00:00", () => {
    expect(addRow(day, ["value"])).toMatchObject({ rows: [...day, { from: "", value: "" }], focusRow: 3 });
    expect(addRow([], ["low", "high"]).rows).toEqual([{ from: "00:00", low: "", high: "" }]);
  });

  it("cuts a block on the half hour at or before its middle, by hand", () => {
    // 04:00 to 09:00: middle 06:30. 09:00 to 24:00: middle 16:30. 00:00 to 00:40: middle 00:20, no half hour inside.
    expect(splitRow(day, 1).rows.map((r) => r.from)).toEqual(["00:00", "04:00", "06:30", "09:00"]);
    expect(splitRow(day, 1).rows[2]).toEqual({ from: "06:30", value: "0.60" });
    expect(splitRow(day, 2).rows[3]).toEqual({ from: "16:30", value: "0.50" });
    expect(splitRow(rows(["00:00", "1"], ["00:40", "2"]), 0).rows[1]).toEqual({ from: "00:20", value: "1" });
  });

  it("leaves whole what can't be cut, and says why", () => {
    expect(splitRow(rows(["00:00", "1"], ["00:01", "2"]), 0)).toEqual({ rows: rows(["00:00", "1"], ["00:01", "2"]), focusRow: 0, say: "This block is too short to be cut." });
    expect(splitRow(rows(["0000", "1"]), 0)).toEqual({ rows: rows(["0000", "1"]), focusRow: 0, say: "Type when this block starts first, such as 06:30." });
    expect(splitRow(day, 9).rows).toBe(day);
  });

  it("removes any block but the first", () => {
    expect(removeRow(day, 1)).toMatchObject({ rows: [day[0], day[2]], focusRow: 0 });
    expect(removeRow(day, 0).rows).toBe(day);
    expect(removeRow(day, 3).rows).toBe(day);
  });

  it("stops at one block for each half hour", () => {
    const full = Array.from({ length: 48 }, (_, i) => ({ from: clockText(i * 30), value: "1" }));
    expect(addRow(full, ["value"]).rows).toBe(full);
    expect(splitRow(full, 3).rows).toBe(full);
  });

  it.each(["", "split", "split.x", "remove.-1", "merge.1", "__proto__"])("does nothing for a button named %j that it does not know", (edit) => {
    expect(editRows(day, edit, ["value"]).rows).toBe(day);
  });
});

describe("laws of edits", () => {
  const starts = fc.uniqueArray(fc.integer({ min: 1, max: 1439 }), { maxLength: 12 }).map((list) => [0, ...list.toSorted((a, b) => a - b)]);
  const dayArb = fc.tuple(starts, fc.array(fc.integer({ min: 0, max: 200 }), { minLength: 13, maxLength: 13 })).map(([list, values]) =>
    list.map((minute, i) => ({ from: clockText(minute), value: String((values[i] ?? 0) / 100) })),
  );
  const valueAt = (typed: ReadonlyArray<TypedRow>, minute: number) => readableBlocks(typed).filter((b) => b.startMinute <= minute).at(-1)?.value;

  it("keeps the value of every minute when a block is cut", () => {
    fc.assert(
      fc.property(dayArb, fc.nat(12), fc.integer({ min: 0, max: 1439 }), (day, index, minute) => {
        const { rows: after } = splitRow(day, index % day.length);
        expect(valueAt(after, minute)).toBe(valueAt(day, minute));
        expect(after.map((r) => startOfRow(r.from))).toEqual(after.map((r) => startOfRow(r.from)).toSorted((a, b) => (a ?? 0) - (b ?? 0)));
      }),
      { numRuns: 2000 },
    );
  });

  it("takes a cut back by removing the new block", () => {
    fc.assert(
      fc.property(dayArb, fc.nat(12), (day, index) => {
        const cut = splitRow(day, index % day.length);
        if (cut.rows === day) return;
        expect(removeRow(cut.rows, cut.focusRow).rows).toEqual(day);
      }),
      { numRuns: 2000 },
    );
  });

  it("never loses the first block and points the focus at a row there is", () => {
    const edits = fc.array(fc.oneof(fc.constant("add"), fc.nat(15).map((i) => `split.${i}`), fc.nat(15).map((i) => `remove.${i}`)), { maxLength: 80 });
    fc.assert(
      fc.property(dayArb, edits, (day, list) => {
        let typed: ReadonlyArray<TypedRow> = day;
        for (const edit of list) {
          const after = editRows(typed, edit, ["value"]);
          expect(after.rows[0]).toEqual(day[0]);
          expect(after.rows.length).toBeLessThanOrEqual(48);
          expect(after.rows[after.focusRow]).toBeDefined();
          typed = after.rows;
        }
      }),
      { numRuns: 500 },
    );
  });
});
