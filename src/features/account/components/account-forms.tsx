"use client";

import { ActionForm } from "@/components/form/action-form";
import { ChoiceField } from "@/components/form/choices";
import { SelectField, TextField } from "@/components/form/fields";
import { changePasswordAction, submitCredentialAction, updateProfileAction } from "../actions";
import { PASSWORD_CHARACTERS_AT_LEAST } from "../constants";
import { changePasswordInput, submitCredentialInput, updateAccountInput } from "../schema";

const UNITS = [{ value: "mg/dL", label: "mg/dL" }, { value: "mmol/L", label: "mmol/L" }];

export function ProfileForm({ start, zones }: Readonly<{ start: Readonly<Record<string, string>>; zones: ReadonlyArray<string> }>) {
  return (
    <ActionForm schema={updateAccountInput} action={updateProfileAction} submitLabel="Save" start={start} idPrefix="profile" done={<p>Saved.</p>}>
      <TextField name="displayName" label="Name that others see" autoComplete="name" />
      <SelectField name="timeZone" label="Time zone" options={zones.map((zone) => ({ value: zone, label: zone.replaceAll("_", " ") }))} />
      <ChoiceField name="glucoseUnit" label="Glucose in" options={UNITS} isInline />
    </ActionForm>
  );
}

export function ChangePasswordForm() {
  return (
    <ActionForm
      schema={changePasswordInput}
      action={changePasswordAction}
      submitLabel="Change the password"
      submitKind="other"
      idPrefix="password"
      isEmptiedWhenDone
      done={<p>Changed. Your other devices were signed out, and a mail says so.</p>}
    >
      <TextField name="currentPassword" label="Present password" type="password" autoComplete="current-password" />
      <TextField
        name="password"
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_CHARACTERS_AT_LEAST} characters; a few words in a row work well.`}
      />
    </ActionForm>
  );
}

/** An educator's licence; approvals count once an administrator has verified it. */
export function LicenceForm({ start }: Readonly<{ start: Readonly<Record<string, string>> }>) {
  return (
    <ActionForm
      schema={submitCredentialInput}
      action={submitCredentialAction}
      submitLabel="Hand in the licence"
      submitKind="other"
      start={start}
      idPrefix="licence"
      done={<p>Handed in. An administrator looks at it before your approvals count.</p>}
    >
      <TextField name="profession" label="Profession" />
      <TextField name="licenceNumber" label="Licence number" size={20} />
      <TextField name="jurisdiction" label="Where it holds" />
      <TextField name="expiresOn" label="Runs out on" type="date" size={12} />
    </ActionForm>
  );
}
