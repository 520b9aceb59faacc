"use client";

import type { ReactNode } from "react";
import { ActionForm } from "@/components/form/action-form";
import { STEP_SCHEMAS } from "@/domain/onboarding/step-schemas";
import { nextStep, STEP_NAMES, type WizardStep } from "@/domain/onboarding/wizard-step";
import { saveStepAction } from "../actions";

type Flat = Readonly<Record<string, string>>;

/** The form of one wizard page: saved at every step, under the draft's count. */
export function StepForm({
  journalId, step, rowVersion, start, returnTo, back, children,
}: Readonly<{ journalId: string; step: WizardStep; rowVersion: number; start: Flat; returnTo: string; back: ReactNode; children?: ReactNode }>) {
  const next = nextStep(step);
  return (
    <ActionForm
      key={rowVersion}
      schema={STEP_SCHEMAS[step]}
      action={saveStepAction}
      submitLabel={returnTo === "review" ? "Save and go back to the review" : `${STEP_NAMES[next]} next`}
      hidden={{ journalId, step, rowVersion: String(rowVersion), returnTo }}
      start={start}
      extraButtons={back}
    >
      {children}
    </ActionForm>
  );
}
