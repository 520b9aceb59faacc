import { MGDL_PER_MMOL, type GlucoseUnit } from "@/domain/units";
import type { Comparison } from "./compare";
import { OUTCOMES } from "./outcomes";

/** What the lens is drawn from, in the unit of its label. */
export type LensFigures = Readonly<{ estimate: number; low90: number; high90: number; lowLabel: string; highLabel: string; label: string }>;

const signed = (value: number, places: number) => `${value < 0 ? "−" : "+"}${Math.abs(value).toFixed(places)}`;

/** The likely difference in the reader's unit; null while nothing can be drawn. */
export function lensFigures({ effect, lows, outcome, verdict }: Comparison, unit: GlucoseUnit): LensFigures | null {
  const isLows = outcome === "day-lows" || verdict === "more-lows";
  if (isLows) {
    const { effect: roots, percentDifference } = lows;
    if (!roots || percentDifference === null) return null;
    const back = (end: number) => Math.max(0, roots.meanBefore + end) ** 2 - roots.meanBefore ** 2;
    const [low90, high90] = [back(roots.low90), back(roots.high90)];
    const estimate = back(roots.difference);
    return { estimate, low90, high90, lowLabel: "fewer lows", highLabel: "more lows", label: `${signed(estimate, 1)} points of the day low, likely ${signed(low90, 1)} to ${signed(high90, 1)}` };
  }
  if (!effect) return null;
  const { difference, low90, high90 } = effect;
  if (OUTCOMES[outcome].unit === "mg/dL") {
    const factor = unit === "mg/dL" ? 1 : 1 / MGDL_PER_MMOL;
    const places = unit === "mg/dL" ? 0 : 1;
    const text = (v: number) => signed(v * factor, places);
    return {
      estimate: difference, low90, high90, lowLabel: "lower", highLabel: "higher",
      label: `${text(difference)} ${unit}, likely ${text(low90)} to ${text(high90)}`,
    };
  }
  return {
    estimate: difference, low90, high90, lowLabel: "less in range", highLabel: "more in range",
    label: `${signed(difference, 0)} points, likely ${signed(low90, 0)} to ${signed(high90, 0)}`,
  };
}
