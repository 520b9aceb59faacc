import { describe, expect, it } from "vitest";
import { againstText } from "./against-text";

describe("againstText", () => {
  it("speaks of insulin, not of numbers", () => {
    expect(againstText("basal", 500, 550)).toBe("10% stronger");
    expect(againstText("carbRatio", 10_000, 11_000)).toBe("10% weaker");
    expect(againstText("sensitivity", 50, 50.1)).toBe("equal");
    expect(againstText("basal", 0, 0.1)).toBe("stronger");
    expect(againstText("basal", 0, 0)).toBe("equal");
  });
});
