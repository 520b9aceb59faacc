import { changeDirection } from "./change-direction";
import { fillText } from "./check-texts";
import { riskGuardrails, shareGuardrails, sizeGuardrails } from "./guardrail-amount";
import type { GuardrailFacts, Spoken } from "./guardrail-facts";
import { stepGuardrails } from "./guardrail-step";
import { DEFAULT_GUARDRAIL_LIMITS, GUARDRAILS, type GuardrailFinding } from "./guardrail-table";
import { timingGuardrails } from "./guardrail-timing";

/** Less insulin, after a low or on an educator's word. */
function cannotWait(facts: GuardrailFacts, lowFraction: number): boolean {
  if (changeDirection(facts.difference) !== "weaker") return false;
  const isOnEducatorsWord = facts.isByEducator || facts.reason === "educator-said";
  const isAfterLow =
    facts.reason === "pattern-low" ||
    facts.reason === "severe-low" ||
    (facts.lowFractionOfLast3Days ?? 0) >= lowFraction;
  return isOnEducatorsWord || isAfterLow;
}

/** What is left of a guardrail when the change must not wait. */
function softened(spoken: Spoken): Spoken[] {
  const { whenWeakeningCannotWait: becomes } = GUARDRAILS[spoken.code];
  if (becomes === "silent") return [];
  return [becomes === "informs" ? { ...spoken, severity: "informs" } : spoken];
}

/**
 * The guardrails that a change meets (content.md 6). Pure: whether to go on after
 * "asks" is the person's to say, and the answer is kept with the version.
 *
 * A weakening after a low or on an educator's word never waits: nothing asks it to
 * hold on or to show a pattern. A closed gate and a device's step still block.
 *
 * @returns what fired, blocking ones first
 */
export function evaluateGuardrails(facts: GuardrailFacts): GuardrailFinding[] {
  const limits = { ...DEFAULT_GUARDRAIL_LIMITS, ...facts.overrides };
  const gate: Spoken[] =
    facts.isGateOpen || facts.isApproved ? [] : [{ code: "gate", severity: "blocks" }];
  const always = [...gate, ...stepGuardrails(facts), ...shareGuardrails(facts, limits)];
  const ofAChange = [
    ...timingGuardrails(facts, limits),
    ...sizeGuardrails(facts, limits),
    ...riskGuardrails(facts, limits),
  ];
  const spoken = facts.isStarting ? always : [...always, ...ofAChange];
  const left = cannotWait(facts, limits.lowFraction) ? spoken.flatMap(softened) : spoken;
  const rank = { blocks: 0, asks: 1, informs: 2 } as const;
  return left
    .toSorted((a, b) => rank[a.severity] - rank[b.severity])
    .map(({ code, severity, values = {}, tellsEducator = false }) => ({
      code,
      severity,
      text: fillText(GUARDRAILS[code].text, values),
      tellsEducator,
    }));
}
