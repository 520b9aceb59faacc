"use client";

import { TextArea } from "@/components/form/fields";
import { useFormContext } from "@/components/form/form-state";
import { GUARDRAILS } from "@/domain/settings/guardrail-table";

/** A place to answer each guardrail that asked; none is shown before one does. */
export function GuardrailAnswers() {
  const { errorOf, startOf } = useFormContext();
  const asked = Object.keys(GUARDRAILS).filter((code) => errorOf(`answers.${code}`) ?? startOf(`answers.${code}`));
  return asked.map((code) => <TextArea key={code} name={`answers.${code}`} label="Before this goes on, say in a few words" rows={2} />);
}
