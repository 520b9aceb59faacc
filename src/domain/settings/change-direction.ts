import type { ProfileDifference } from "./difference";
import type { SettingFamily } from "./family";

/**
 * Whether a change as a whole means more insulin, less, both, or neither known.
 *
 * @param family look at one family only
 */
export function changeDirection(
  { changes }: ProfileDifference,
  family?: SettingFamily,
): "stronger" | "weaker" | "mixed" | "neutral" {
  const looked = family === undefined ? changes : changes.filter((change) => change.family === family);
  const hasStronger = looked.some(({ direction }) => direction === "stronger");
  const hasWeaker = looked.some(({ direction }) => direction === "weaker");
  if (hasStronger && hasWeaker) return "mixed";
  return hasStronger ? "stronger" : hasWeaker ? "weaker" : "neutral";
}
