import { describe, expect, it } from "vitest";
import { blocksText, readBlocks } from "./blocks-text";

describe("readBlocks", () => {
  it("reads times and values with commas, units and full-width digits", () => {
    expect(readBlocks("00:00 0,60 U/h\n04:00 ０.８５; 22.30 1")).toEqual([
      { startMinute: 0, value: 0.6 },
      { startMinute: 240, value: 0.85 },
      { startMinute: 1350, value: 1 },
    ]);
  });

  it.each([
    ["", "at least one line"],
    ["05:00 1", "starts at 00:00"],
    ["00:00 1\n00:00 2", "later"],
    ["00:00 1\nnoon 2", "Line 2"],
  ])("says in words what is amiss with %j", (typed, words) => expect(readBlocks(typed)).toContain(words));

  it("writes what it reads", () => expect(blocksText([{ startMinute: 0, value: 0.5 }])).toBe("00:00 0.5"));
});
