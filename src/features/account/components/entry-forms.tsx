"use client";

import { ActionForm } from "@/components/form/action-form";
import { TextField } from "@/components/form/fields";
import { requestResetAction, resendVerificationAction, resetPasswordAction, signInAction, verifyEmailAction } from "../actions";
import { PASSWORD_CHARACTERS_AT_LEAST } from "../constants";
import { nothingInput, requestResetInput, resetPasswordInput, signInInput, verifyEmailInput } from "../schema";

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
  return (
    <ActionForm schema={nothingInput} action={resendVerificationAction} submitLabel="Send the link again" submitKind="other" done={<p>Sent. It can take a minute to arrive.</p>} />
  );
}

/** Says the same whether or not there is such an account. */
export function RequestResetForm() {
  return (
    <ActionForm
      schema={requestResetInput}
      action={requestResetAction}
      submitLabel="Send the link"
      isEmptiedWhenDone
      done={<p>If there is an account with this address, a link is on its way. It works once, within an hour.</p>}
    >
      <TextField name="email" label="E-mail address" type="email" autoComplete="username" />
    </ActionForm>
  );
}

export function ResetPasswordForm({ token }: Readonly<{ token: string }>) {
  return (
    <ActionForm schema={resetPasswordInput} action={resetPasswordAction} submitLabel="Set the new password" hidden={{ token }}>
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
