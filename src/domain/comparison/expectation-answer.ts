import type { Verdict } from "./verdict";

/**
 * Whether what was hoped for was met. The verdict was worked out for exactly
 * the outcome that the expectation named, so better is met; more lows or worse
 * is not met, and everything short of a verdict is not yet.
 */
export function expectationAnswer(verdict: Verdict): "met" | "not-met" | "not-yet" {
  if (verdict === "better") return "met";
  if (verdict === "worse" || verdict === "more-lows" || verdict === "no-difference-that-matters") return "not-met";
  return "not-yet";
}
