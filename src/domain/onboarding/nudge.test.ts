import { describe, expect, it } from "vitest";
import { nudged } from "./nudge";

describe("nudged", () => {
  it.each([
    ["0.50", 0.05, "up", "0.55"], ["0.50", 0.05, "down", "0.45"], ["0,53 U/h", 0.05, "up", "0.55"], ["0.53", 0.05, "down", "0.50"],
    ["0.6", 0.025, "up", "0.625"], ["0.02", 0.05, "down", "0.00"], ["0", 0.05, "down", "0.00"], ["17", 1, "up", "18"], ["3.4", 0.1, "down", "3.3"],
    ["", 1, "up", ""], ["much", 1, "down", "much"], ["1", 0, "up", "1"],
  ] as const)("%j by %d %s: %j", (typed, step, way, after) => expect(nudged(typed, step, way)).toBe(after));
});
