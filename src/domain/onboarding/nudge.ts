import { readDecimal } from "@/domain/form-text";

const MICRO = 1e6;

/** How many decimals a step is written with: 0.025 has three. */
function placesOf(step: number): number {
  return (String(step).split(".")[1] ?? "").length;
}

/**
 * A typed value moved to the next step up or down, as text; at a value between
 * steps to the nearest one that way. Never below zero. Text that is no number
 * stays as it is.
 *
 * @param step above zero
 */
export function nudged(typed: string, step: number, way: "up" | "down"): string {
  const value = readDecimal(typed);
  if (typeof value === "string" || step <= 0) return typed;
  const [microValue, microStep] = [Math.round(value * MICRO), Math.round(step * MICRO)];
  const steps = way === "up" ? Math.floor(microValue / microStep) + 1 : Math.ceil(microValue / microStep) - 1;
  return (Math.max(0, steps * microStep) / MICRO).toFixed(placesOf(step));
}
