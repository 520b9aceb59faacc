"use client";

import type { ReactNode } from "react";
import { ActionForm } from "@/components/form/action-form";
import { stepSchemas } from "@/domain/onboarding/step-schemas";
import type { FlatPage } from "@/domain/onboarding/step-start";
import { nextStep, STEP_NAMES, type WizardStep } from "@/domain/onboarding/wizard-step";
import type { GlucoseUnit } from "@/domain/units";
import { saveStepAction } from "../actions";

/** The form of one wizard page: saved at every step, under the draft's count. */
export function StepForm({
  journalId, step, unit, rowVersion, start, returnTo, back, children,
}: Readonly<{ journalId: string; step: WizardStep; unit: GlucoseUnit; rowVersion: number; start: FlatPage; returnTo: string; back: ReactNode; children?: ReactNode }>) {
  const next = nextStep(step);
  return (
    <ActionForm
      key={rowVersion}
      schema={stepSchemas(unit)[step]}
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
