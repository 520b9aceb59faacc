"use client";

import { ActionForm } from "@/components/form/action-form";
import { TextArea } from "@/components/form/fields";
import { proposeStartAction } from "../actions";
import { proposeStartInput } from "../schema";

export function ProposeForm({ journalId, rowVersion }: Readonly<{ journalId: string; rowVersion: number }>) {
  return (
    <ActionForm schema={proposeStartInput} action={proposeStartAction} submitLabel="Ask the educator" hidden={{ journalId, rowVersion: String(rowVersion) }}>
      <TextArea name="note" label="A note to your educator" isOptional rows={3} />
    </ActionForm>
  );
}
