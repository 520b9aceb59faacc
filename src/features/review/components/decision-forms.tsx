"use client";

import { ActionForm } from "@/components/form/action-form";
import { TickField, TicksField } from "@/components/form/choices";
import { SelectField, TextArea, TextField } from "@/components/form/fields";
import { approveVersionAction, declineVersionAction, returnVersionAction } from "../actions";
import { DECLINE_REASONS, RETURN_REASONS, REVIEW_CHECKLIST } from "../constants";
import { approveVersionInput, declineVersionInput, returnVersionInput } from "../schema";

type Target = Readonly<{ journalId: string; number: number; contentHash: string }>;
const hidden = ({ journalId, number, contentHash }: Target) => ({ journalId, number: String(number), contentHash });
const options = (list: Readonly<Record<string, string>>) => Object.entries(list).map(([value, label]) => ({ value, label }));

/** A signed approval of exactly what is shown on the page. */
export function ApproveForm(target: Target) {
  return (
    <ActionForm schema={approveVersionInput} action={approveVersionAction} submitLabel="Sign and approve" hidden={hidden(target)}>
      <TicksField name="checklist" label="Gone through" options={options(REVIEW_CHECKLIST)} />
      <TextField name="reviewOn" label="Next review by" type="date" size={12} />
      <TextArea name="remarks" label="Remarks for the person" isOptional rows={3} />
      <TickField
        name="isSigned"
        label={`I have reviewed version ${target.number} (hash ${target.contentHash.slice(0, 12)}), the data of the last 14 days and the checklist. In my professional judgement and within my scope of practice these settings are suitable to begin.`}
      />
    </ActionForm>
  );
}

export function ReturnForm(target: Target) {
  return (
    <ActionForm schema={returnVersionInput} action={returnVersionAction} submitLabel="Send back with remarks" hidden={hidden(target)} start={{ reason: "" }}>
      <SelectField name="reason" label="Why?" options={[{ value: "", label: "Choose …" }, ...options(RETURN_REASONS)]} />
      <TextArea name="remarks" label="What to mend" rows={3} />
    </ActionForm>
  );
}

export function DeclineForm(target: Target) {
  return (
    <ActionForm schema={declineVersionInput} action={declineVersionAction} submitLabel="Decline" hidden={hidden(target)} start={{ reason: "" }}>
      <SelectField name="reason" label="Why?" options={[{ value: "", label: "Choose …" }, ...options(DECLINE_REASONS)]} />
      <TextArea name="remarks" label="In words the person can use" rows={3} />
    </ActionForm>
  );
}
