import type { DailyDose } from "./daily-dose";
import { gateDoseReasons, type GateDoseCode } from "./gate-dose";
import { GATE_QUESTIONS, type GateAnswers, type GateQuestion } from "./gate-questions";

export type GateReason = Readonly<{ code: GateQuestion | GateDoseCode; text: string }>;

/** While `open` is false no number may be shown to the person. */
export type Gate = Readonly<{ open: boolean; reasons: ReadonlyArray<GateReason> }>;

const ADULT_FROM_YEARS = 18;

const QUESTIONS = Object.keys(GATE_QUESTIONS) as GateQuestion[];

/**
 * Whether a person may see starting arithmetic, or their educator first
 * (settings.md 4.8 and 3.2 rules 1 to 3; content.md 7).
 *
 * Only a plain "no" to each question leaves the gate open: not sure counts as
 * yes, and a question nobody answered is not a no.
 *
 * @param facts.ageYears `null` when not typed; under 18 closes the gate whatever the answer
 * @param facts.dose     the estimates of the daily dose; `null` before they are typed
 */
export function evaluateGate(facts: {
  answers: GateAnswers;
  ageYears: number | null;
  dose: DailyDose | null;
}): Gate {
  const isUnderAge = facts.ageYears !== null && facts.ageYears < ADULT_FROM_YEARS;
  const fromAnswers = QUESTIONS.filter(
    (question) => facts.answers[question] !== "no" || (question === "under18" && isUnderAge),
  ).map((question) => {
    const isUnanswered = (facts.answers[question] ?? null) === null && !(question === "under18" && isUnderAge);
    const { reason } = GATE_QUESTIONS[question];
    return { code: question, text: isUnanswered ? `Not answered yet: ${reason}` : reason };
  });
  const reasons: GateReason[] = [...fromAnswers, ...(facts.dose ? gateDoseReasons(facts.dose) : [])];
  return { open: reasons.length === 0, reasons };
}
