import { describe, expect, it } from "vitest";
import { startingTarget, startingTargetSection } from "./starting-target";

describe("the target of the first days", () => {
  it("is 120 to 130 mg/dL; in mmol/L 6.7 to 7.3, never below", () => {
    expect(startingTarget("mg/dL")).toEqual({ lowMgDl: 120, highMgDl: 130 });
    const { lowMgDl, highMgDl } = startingTarget("mmol/L");
    expect([lowMgDl, highMgDl]).toEqual([121, 132]);
    expect([lowMgDl, highMgDl].map((mgDl) => (mgDl / 18.0156).toFixed(1))).toEqual(["6.7", "7.3"]);
  });

  it("says that it has no source, and shows those that have one beside it", () => {
    const section = startingTargetSection("mg/dL", ["adult"]);
    expect(section.provenance).toBe("CP");
    expect(section.methods.map(({ id, provenance }) => [id, provenance])).toEqual([["target-100-150", "R"]]);
    expect(section.methods[0]).not.toHaveProperty("population");
    expect(startingTargetSection("mg/dL", ["adult", "child"]).methods).toHaveLength(3);
  });
});
