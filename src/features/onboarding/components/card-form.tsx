"use client";

import { ActionForm } from "@/components/form/action-form";
import { ButtonLink } from "@/components/button";
import type { FlatPage } from "@/domain/onboarding/step-start";
import { saveCardAction } from "../actions";
import { saveCardInput } from "../schema";
import { CardFields } from "./step-fields";

/** The fallback card, written anew at any time. */
export function CardForm({ journalId, start }: Readonly<{ journalId: string; start: FlatPage }>) {
  return (
    <ActionForm schema={saveCardInput} action={saveCardAction} submitLabel="Save the card" hidden={{ journalId }} start={start} extraButtons={<ButtonLink href={`/j/${journalId}/fallback`}>Back</ButtonLink>}>
      <CardFields />
    </ActionForm>
  );
}
