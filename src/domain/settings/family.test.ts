import { describe, expect, it } from "vitest";
import { directionOf, FAMILY_FACTS, SETTING_FAMILIES } from "./family";

describe("directionOf", () => {
  it.each([
    ["basal", 500, 550, "stronger"],
    ["basal", 550, 500, "weaker"],
    ["carbRatio", 17_000, 15_000, "stronger"],
    ["carbRatio", 15_000, 17_000, "weaker"],
    ["sensitivity", 60, 50, "stronger"],
    ["sensitivity", 50, 60, "weaker"],
    ["target", 130, 120, "stronger"],
    ["target", 120, 130, "weaker"],
    ["durationOfAction", 300, 240, "stronger"],
    ["durationOfAction", 240, 300, "weaker"],
    ["limits", 1000, 2000, "stronger"],
    ["limits", 2000, 1000, "weaker"],
    ["features", 1, 2, "neutral"],
  ] as const)("%s from %s to %s is %s", (family, oldValue, newValue, expected) => {
    expect(directionOf(family, oldValue, newValue)).toBe(expected);
  });

  it("is weaker where a limit appears and stronger where it goes", () => {
    expect(directionOf("limits", null, 5000)).toBe("weaker");
    expect(directionOf("limits", 5000, null)).toBe("stronger");
  });

  it.each(SETTING_FAMILIES)("%s: no change has no direction, and it has words", (family) => {
    expect(directionOf(family, 5, 5)).toBe("neutral");
    expect(directionOf(family, null, null)).toBe("neutral");
    expect(FAMILY_FACTS[family].label).not.toBe("");
  });

  it("lists every family of the table once", () => {
    expect([...SETTING_FAMILIES].toSorted()).toEqual(Object.keys(FAMILY_FACTS).toSorted());
  });

  it("cannot say where one of two values outside the limits is not known", () => {
    expect(directionOf("basal", null, 500)).toBe("neutral");
  });
});
