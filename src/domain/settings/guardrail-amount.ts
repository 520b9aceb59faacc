import { exactDailyBasalMilliUnits } from "./basal-total";
import { changeDirection } from "./change-direction";
import type { SettingFamily } from "./family";
import { toNumber } from "./fraction";
import type { GuardrailFacts, Spoken } from "./guardrail-facts";
import type { GuardrailLimits } from "./guardrail-table";

/** A device's own numbers have no known scale, so a percentage of them says nothing. */
function largestStepPercent({ difference }: GuardrailFacts, family?: SettingFamily): number {
  const steps = difference.changes
    .filter((change) => change.family !== "features" && (family === undefined || change.family === family))
    .flatMap(({ stepPercent }) => stepPercent ?? []);
  return Math.max(0, ...steps);
}

/** How large the step is. Above 20 % asks; for a basal rate above 10 % is mentioned. */
export function sizeGuardrails(facts: GuardrailFacts, limits: GuardrailLimits): Spoken[] {
  const largest = largestStepPercent(facts);
  const largestBasal = largestStepPercent(facts, "basal");
  const percentOf = (step: number) => ({ percent: Number(step.toFixed(1)) });
  if (largest > limits.askStepPercent) return [{ code: "too-big", severity: "asks", values: percentOf(largest) }];
  if (largestBasal <= limits.informBasalStepPercent) return [];
  return [{ code: "too-big", severity: "informs", values: percentOf(largestBasal) }];
}

/** More insulin after lows, or less of it with ketones about. */
export function riskGuardrails(facts: GuardrailFacts, limits: GuardrailLimits): Spoken[] {
  const direction = changeDirection(facts.difference);
  const spoken: Spoken[] = [];
  const isStronger = direction === "stronger" || direction === "mixed";
  if (isStronger && (facts.lowFractionOfLast3Days ?? 0) >= limits.lowFraction) {
    spoken.push({ code: "stronger-after-lows", severity: "asks", tellsEducator: true });
  }
  const isWeaker = direction === "weaker" || direction === "mixed";
  if (isWeaker && (facts.highestKetonesMmolOfLast24Hours ?? 0) >= limits.ketonesMmol) {
    spoken.push({ code: "weaker-and-ketones", severity: "asks" });
  }
  return spoken;
}

/** The share of basal insulin in a day, once the proposal is in effect. */
export function shareGuardrails(facts: GuardrailFacts, limits: GuardrailLimits): Spoken[] {
  const { proposed, totalDailyDoseUnits } = facts;
  if (totalDailyDoseUnits === null || totalDailyDoseUnits <= 0) return [];
  const { basalShareLowPercent: low, basalShareHighPercent: high } = limits;
  // Milli-units over units x 10 is a percentage.
  const percent = toNumber(exactDailyBasalMilliUnits(proposed.basal)) / (totalDailyDoseUnits * 10);
  if (percent >= low && percent <= high) return [];
  return [{ code: "basal-share", severity: "informs", values: { percent: Number(percent.toFixed(1)), low, high } }];
}
