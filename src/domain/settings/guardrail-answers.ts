import { AppError } from "@/domain/errors";
import type { GuardrailFinding } from "./guardrail-table";

export type AnsweredGuardrail = Readonly<{ code: string; severity: string; text: string; answer: string }>;

/**
 * The guardrails that fired, each with the person's answer where it asked.
 *
 * @param answers by guardrail code, in the person's words
 * @throws {AppError} INVALID_INPUT with one field per guardrail that still waits
 *   (`answers.<code>`), or that blocks (`form`)
 */
export function answeredGuardrails(
  findings: ReadonlyArray<GuardrailFinding>,
  answers: Readonly<Record<string, string>>,
): AnsweredGuardrail[] {
  const fields: Record<string, string[]> = {};
  for (const { code, severity, text } of findings) {
    if (severity === "blocks") (fields[code === "outside-step" ? "value" : "form"] ??= []).push(text);
    if (severity === "asks" && !answers[code]) fields[`answers.${code}`] = [text];
  }
  if (Object.keys(fields).length > 0) throw new AppError("INVALID_INPUT", "guardrails wait for an answer", fields);
  return findings.map(({ code, severity, text }) => ({ code, severity, text, answer: answers[code] ?? "" }));
}
