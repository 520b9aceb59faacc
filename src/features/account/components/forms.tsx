"use client";

import { useState } from "react";
import { ActionForm } from "@/components/form/action-form";
import { ChoiceField } from "@/components/form/choices";
import { SelectField, TextField } from "@/components/form/fields";
import { Notice } from "@/components/notice";
import {
  changePasswordAction, requestResetAction, resendVerificationAction, resetPasswordAction, signInAction, submitCredentialAction, updateProfileAction, verifyEmailAction,
} from "../actions";
import { changePasswordInput, nothingInput, requestResetInput, resetPasswordInput, signInInput, submitCredentialInput, updateAccountInput, verifyEmailInput } from "../schema";

export function SignInForm({ next }: Readonly<{ next: string }>) {
  return (
    <ActionForm schema={signInInput} action={signInAction} submitLabel="Sign in" hidden={{ next }}>
      <TextField name="email" label="E-mail address" type="email" autoComplete="username" />
      <TextField name="password" label="Password" type="password" autoComplete="current-password" />
    </ActionForm>
  );
}

/** One button: a link that only looks must not spend itself. */
export function VerifyForm({ token }: Readonly<{ token: string }>) {
  return <ActionForm schema={verifyEmailInput} action={verifyEmailAction} submitLabel="Verify this address" hidden={{ token }} />;
}

export function ResendForm() {
  const [isSent, setSent] = useState(false);
  if (isSent) return <Notice><p>Sent. It can take a minute.</p></Notice>;
  return <ActionForm schema={nothingInput} action={resendVerificationAction} submitLabel="Send the link again" onDone={() => setSent(true)} />;
}

export function RequestResetForm() {
  const [isSent, setSent] = useState(false);
  if (isSent) return <Notice><p>If there is an account with this address, a link is on its way. It works once, within an hour.</p></Notice>;
  return (
    <ActionForm schema={requestResetInput} action={requestResetAction} submitLabel="Send the link" onDone={() => setSent(true)}>
      <TextField name="email" label="E-mail address" type="email" autoComplete="username" />
    </ActionForm>
  );
}

export function ResetPasswordForm({ token }: Readonly<{ token: string }>) {
  return (
    <ActionForm schema={resetPasswordInput} action={resetPasswordAction} submitLabel="Set the new password" hidden={{ token }}>
      <TextField name="password" label="New password" type="password" autoComplete="new-password" hint="At least 15 characters; a few words in a row work well." />
    </ActionForm>
  );
}

export function ProfileForm({ start, zones }: Readonly<{ start: Readonly<Record<string, string>>; zones: ReadonlyArray<string> }>) {
  const [isSaved, setSaved] = useState(false);
  return (
    <>
      {isSaved ? <Notice><p>Saved.</p></Notice> : null}
      <ActionForm schema={updateAccountInput} action={updateProfileAction} submitLabel="Save" start={start} onDone={() => setSaved(true)}>
        <TextField name="displayName" label="Name that others see" autoComplete="name" />
        <SelectField name="timeZone" label="Time zone" options={zones.map((zone) => ({ value: zone, label: zone.replaceAll("_", " ") }))} />
        <ChoiceField name="glucoseUnit" label="Glucose in" options={[{ value: "mg/dL", label: "mg/dL" }, { value: "mmol/L", label: "mmol/L" }]} isInline />
      </ActionForm>
    </>
  );
}

export function ChangePasswordForm() {
  const [isSaved, setSaved] = useState(false);
  return (
    <>
      {isSaved ? <Notice><p>Changed. Your other devices were signed out.</p></Notice> : null}
      <ActionForm schema={changePasswordInput} action={changePasswordAction} submitLabel="Change the password" onDone={() => setSaved(true)}>
        <TextField name="currentPassword" label="Present password" type="password" autoComplete="current-password" />
        <TextField name="password" label="New password" type="password" autoComplete="new-password" hint="At least 15 characters." />
      </ActionForm>
    </>
  );
}

/** An educator's licence; approvals count once an administrator has verified it. */
export function LicenceForm() {
  const [isSent, setSent] = useState(false);
  if (isSent) return <Notice><p>Handed in. An administrator looks at it before your approvals count.</p></Notice>;
  return (
    <ActionForm schema={submitCredentialInput} action={submitCredentialAction} submitLabel="Hand in the licence" onDone={() => setSent(true)}>
      <TextField name="profession" label="Profession" />
      <TextField name="licenceNumber" label="Licence number" size={20} />
      <TextField name="jurisdiction" label="Where it holds" />
      <TextField name="expiresOn" label="Runs out on" type="date" size={12} />
    </ActionForm>
  );
}
