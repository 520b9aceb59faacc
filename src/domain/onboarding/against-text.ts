import { directionOf, type SettingFamily } from "@/domain/settings/family";

/**
 * How far a number lies from another one, in words of insulin: "equal" below
 * half a percent, "14% weaker", "3% stronger".
 *
 * @param from above zero, in the unit of `to`
 */
export function againstText(family: SettingFamily, from: number, to: number): string {
  if (from === 0) return to === 0 ? "equal" : directionOf(family, from, to);
  const percent = (Math.abs(to - from) * 100) / Math.abs(from);
  return percent < 0.5 ? "equal" : `${percent.toFixed(0)}% ${directionOf(family, from, to)}`;
}
