"use client";

import { ActionForm } from "@/components/form/action-form";
import { TickField } from "@/components/form/choices";
import { TextArea, TextField } from "@/components/form/fields";
import { proposeStartAction, recordStartAction } from "../actions";
import { proposeStartInput, recordStartInput } from "../schema";

type Draft = Readonly<{ journalId: string; rowVersion: number }>;

export function ProposeForm({ journalId, rowVersion }: Draft) {
  return (
    <ActionForm schema={proposeStartInput} action={proposeStartAction} submitLabel="Ask the educator" hidden={{ journalId, rowVersion: String(rowVersion) }}>
      <TextArea name="note" label="A note to your educator" isOptional rows={3} />
    </ActionForm>
  );
}

/** The knowing acknowledgement: only with an open gate, and marked beside the version for good. */
export function RecordForm({ journalId, rowVersion, now }: Draft & Readonly<{ now: string }>) {
  return (
    <ActionForm
      schema={recordStartInput}
      action={recordStartAction}
      submitLabel="Record without a review"
      submitKind="other"
      idPrefix="record"
      hidden={{ journalId, rowVersion: String(rowVersion) }}
      start={{ effectiveFrom: now }}
    >
      <p>Your answers leave this open to you. It becomes version 1 in effect at once, marked as recorded without a review, and its day is day 1.</p>
      <TextField name="effectiveFrom" label="On the device since" type="datetime-local" size={20} hint="Nothing is sent to a device. Enter the settings there, have them read back, then say when." />
      <TextArea name="note" label="Why without a review" isOptional rows={2} />
      <TickField name="hasKetoneStrips" label="Ketone strips in date are at hand." />
      <TickField name="hasFastCarbohydrate" label="Fast carbohydrate for three lows is at hand." />
      <TickField name="isKnowing" label="I know that no educator has looked at these numbers, and that they are published arithmetic, not a prescription." />
    </ActionForm>
  );
}
