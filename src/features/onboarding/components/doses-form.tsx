"use client";

import { ActionForm } from "@/components/form/action-form";
import { TextField } from "@/components/form/fields";
import type { FlatPage } from "@/domain/onboarding/step-start";
import { writeDosesAction } from "../actions";
import { writeDosesInput } from "../schema";

/** The educator's own: which back-up doses stand on the card. */
export function DosesForm({ journalId, start }: Readonly<{ journalId: string; start: FlatPage }>) {
  return (
    <ActionForm schema={writeDosesInput} action={writeDosesAction} submitLabel="Write these doses on the card" submitKind="other" idPrefix="doses" hidden={{ journalId }} start={start}>
      <TextField name="longActingUnits" label="Long-acting insulin a day" suffix="U" inputMode="decimal" isOptional />
      <TextField name="rapidUnits" label="Rapid insulin every 4 hours while no long-acting is at hand" suffix="U" inputMode="decimal" isOptional />
    </ActionForm>
  );
}
