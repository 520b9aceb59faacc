import type { GlucoseUnit } from "@/domain/units";
import type { DraftAnswers, TypedPage } from "./draft";
import { stepSchemas } from "./step-schemas";
import { WIZARD_STEPS, type WizardStep } from "./wizard-step";

/** The fields of a page out of everything a form sent. */
export function fieldsOf(step: WizardStep, sent: TypedPage): TypedPage {
  return Object.fromEntries(Object.keys(stepSchemas("mg/dL")[step].shape).flatMap((name) => (name in sent ? [[name, sent[name]]] : [])));
}

/** The pages that were saved and can't be read: half typed by an edit without script, or under older bounds. */
export function unreadablePages(answers: DraftAnswers, unit: GlucoseUnit): WizardStep[] {
  return WIZARD_STEPS.filter((step) => answers[step] !== undefined && !stepSchemas(unit)[step].safeParse(answers[step]).success);
}

/** A pump's own settings are asked only where there is a pump; each that is missing, with a sentence. */
export function missingWorkingSettings(page: TypedPage, therapy: "injections" | "pump" | "closed-loop"): Record<string, string[]> {
  if (therapy === "injections") return {};
  const isEmpty = (name: string) => typeof page[name] !== "string" || page[name].trim() === "";
  const sentence = "Write at least one line, such as 00:00 and the value.";
  return Object.fromEntries(["workingBasal", "workingCarbRatio", "workingSensitivity"].filter(isEmpty).map((name) => [name, [sentence]]));
}
