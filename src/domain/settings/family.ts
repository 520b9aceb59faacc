/**
 * The families of settings. Everything that has to know which way a number
 * strengthens reads it here: rounding, differences and guardrails agree because
 * they share this table.
 *
 * `strongerWhen` says which way means more insulin. A larger carb ratio or
 * sensitivity number means less insulin for the same meal or correction
 * (settings.md 1.6, "larger ISF number = weaker correction").
 */
export const FAMILY_FACTS = {
  basal: { label: "basal rate", strongerWhen: "higher" },
  carbRatio: { label: "carb ratio", strongerWhen: "lower" },
  sensitivity: { label: "sensitivity factor", strongerWhen: "lower" },
  target: { label: "glucose target", strongerWhen: "lower" },
  durationOfAction: { label: "duration of insulin action", strongerWhen: "lower" },
  limits: { label: "limits", strongerWhen: "higher" },
  features: { label: "switches and numbers of the device", strongerWhen: "unknown" },
} as const satisfies Record<string, { label: string; strongerWhen: "higher" | "lower" | "unknown" }>;

export type SettingFamily = keyof typeof FAMILY_FACTS;

export const SETTING_FAMILIES: ReadonlyArray<SettingFamily> = [
  "basal",
  "carbRatio",
  "sensitivity",
  "target",
  "durationOfAction",
  "limits",
  "features",
];

export type Direction = "stronger" | "weaker" | "neutral";

/**
 * Which way a number moved, in terms of insulin.
 *
 * @param oldValue `null` where nothing was set; for a limit this means no cap
 * @param newValue likewise
 * @returns "neutral" for equal values and for families whose direction is unknown
 */
export function directionOf(family: SettingFamily, oldValue: number | null, newValue: number | null): Direction {
  const { strongerWhen } = FAMILY_FACTS[family];
  if (strongerWhen === "unknown" || oldValue === newValue) return "neutral";
  if (oldValue === null || newValue === null) {
    if (family !== "limits") return "neutral";
    return newValue === null ? "stronger" : "weaker";
  }
  const isHigher = newValue > oldValue;
  return isHigher === (strongerWhen === "higher") ? "stronger" : "weaker";
}
