import { existsSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { readRows } from "@/verify/csv-file";
import { studentTCdf, studentTQuantile } from "./student-t";

const DATA = "../shared/data/statistics";

describe("Student's t", () => {
  // scipy 1.10, root-refined against its cdf (the project's outside check values).
  it.each([
    [0.75, 6, 0.717558196491],
    [0.75, 10.4, 0.698809184304],
  ])("has its %s quantile at %s degrees of freedom", (p, nu, quantile) => {
    expect(Math.abs(studentTQuantile(p, nu) - quantile)).toBeLessThan(1e-9);
  });

  it("has its cumulative probability at 33.3 degrees of freedom", () => {
    expect(Math.abs(studentTCdf(-3.2, 33.3) - 0.00150744488846)).toBeLessThan(1e-12);
  });

  it("refuses degrees of freedom that are not positive", () => {
    expect(() => studentTCdf(0, 0)).toThrow(expect.objectContaining({ code: "INVALID_RANGE" }));
  });

  it.skipIf(!existsSync(DATA))("agrees with every outside value to 1e-9 (skipped where ../shared is absent)", () => {
    for (const row of readRows(`${DATA}/t_quantiles.csv`)) {
      expect(Math.abs(studentTQuantile(Number(row.p), Number(row.nu)) - Number(row.quantile))).toBeLessThan(1e-9);
    }
    for (const row of readRows(`${DATA}/t_cdf.csv`)) {
      expect(Math.abs(studentTCdf(Number(row.x), Number(row.nu)) - Number(row.cdf))).toBeLessThan(1e-9);
    }
  });
});
