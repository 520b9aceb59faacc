import { describe, expect, it } from "vitest";
import { sourceLine } from "./provenance";

describe("sourceLine", () => {
  it.each([
    ["R", "a guideline"],
    ["A", "a guideline (from the abstract)"],
    ["S", "a guideline (as quoted by another page)"],
    ["M", "a guideline (from memory, not verified)"],
    ["C", "a guideline (computed for this page)"],
    ["CP", "a guideline (common practice, no source)"],
  ] as const)("keeps the code %s with the number, in words", (provenance, expected) => {
    expect(sourceLine("a guideline", provenance)).toBe(expected);
  });
});
