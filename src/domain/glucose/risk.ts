import type { Summary } from "./summary";

export type GriZone = "A" | "B" | "C" | "D" | "E";

type OutsideShares = Pick<Summary, "veryLowFraction" | "lowFraction" | "highFraction" | "veryHighFraction">;

/**
 * Glycemia risk index 0 to 100, its zone and its two components in percent
 * (Klonoff 2023, J Diabetes Sci Technol 17:1226, from memory): 3.0 x very low %
 * + 2.4 x low % + 1.6 x very high % + 0.8 x high %, no more than 100.
 * Zones end at 20, 40, 60 and 80, the end included.
 */
export function glycemiaRisk(shares: OutsideShares): { gri: number; griZone: GriZone; hypoPercent: number; hyperPercent: number } {
  const hypoPercent = 100 * (shares.veryLowFraction + 0.8 * shares.lowFraction);
  const hyperPercent = 100 * (shares.veryHighFraction + 0.5 * shares.highFraction);
  const gri = Math.min(100, 3.0 * hypoPercent + 1.6 * hyperPercent);
  return { gri, griZone: zoneOf(gri), hypoPercent, hyperPercent };
}

function zoneOf(gri: number): GriZone {
  if (gri <= 20) return "A";
  if (gri <= 40) return "B";
  if (gri <= 60) return "C";
  return gri <= 80 ? "D" : "E";
}

/**
 * Low and high blood glucose index: means of r = 10 f(G)^2 over all readings,
 * counted where f < 0 and where f > 0, f(G) = 1.509 x ((ln G)^1.084 - 5.381),
 * G in mg/dL (Kovatchev 1997 and 2006, from memory).
 *
 * @returns null without a reading
 */
export function bloodGlucoseRisk(valuesMgDl: ReadonlyArray<number>): { lbgi: number; hbgi: number } | null {
  const n = valuesMgDl.length;
  if (n === 0) return null;
  let low = 0;
  let high = 0;
  for (const value of valuesMgDl) {
    // Below 1 mg/dL the logarithm has no real power; no sensor reads there.
    const f = 1.509 * (Math.log(Math.max(1, value)) ** 1.084 - 5.381);
    if (f < 0) low += 10 * f * f;
    else high += 10 * f * f;
  }
  return { lbgi: low / n, hbgi: high / n };
}
