import { changeDirection } from "./change-direction";
import type { ChangeReason } from "./change-reason";
import type { GuardrailFacts, Spoken } from "./guardrail-facts";
import type { GuardrailLimits } from "./guardrail-table";

/** Reasons that rest on something other than a pattern of days. */
const REASONS_WITHOUT_PATTERN: ReadonlyArray<ChangeReason> = [
  "undo",
  "typing-error",
  "educator-said",
  "device-update",
  "illness-plan",
];

/** Going back, or putting a slip right, is one act however many settings it touches. */
const REASONS_FOR_SEVERAL_FAMILIES: ReadonlyArray<ChangeReason> = ["undo", "typing-error", "device-update"];

function tooSoon({ difference, lastChanged }: GuardrailFacts, { restHours }: GuardrailLimits): Spoken[] {
  return difference.families.flatMap((family) => {
    const last = lastChanged[family];
    const direction = changeDirection(difference, family);
    if (!last || last.hours >= restHours || (direction !== "stronger" && direction !== "mixed")) return [];
    const values = { version: last.versionNumber, hours: Math.floor(last.hours) };
    return [{ code: "too-soon", severity: "asks", values }];
  });
}

/**
 * The guardrails about one thing at a time, waiting, and the days a change rests
 * on. The wait is broken by weakening or by an educator only (settings.md 3.3).
 */
export function timingGuardrails(facts: GuardrailFacts, limits: GuardrailLimits): Spoken[] {
  const { difference, reason, evidenceDays, flaggedEvidenceDays } = facts;
  const isAboutLows =
    changeDirection(difference) === "weaker" || reason === "pattern-low" || reason === "severe-low";
  const neededDays = isAboutLows ? limits.evidenceDaysForLows : limits.evidenceDays;
  const isOnEducatorsWord = facts.isByEducator || reason === "educator-said";

  const spoken: Spoken[] = [];
  if (difference.families.length > 1 && !REASONS_FOR_SEVERAL_FAMILIES.includes(reason)) {
    spoken.push({ code: "one-family", severity: "asks" });
  }
  if (!isOnEducatorsWord) spoken.push(...tooSoon(facts, limits));
  if (evidenceDays < neededDays && !facts.isByEducator && !REASONS_WITHOUT_PATTERN.includes(reason)) {
    spoken.push({ code: "no-pattern", severity: "asks" });
  }
  if (flaggedEvidenceDays > 0) {
    spoken.push({ code: "flagged-days", severity: "informs", values: { days: flaggedEvidenceDays } });
  }
  return spoken;
}
