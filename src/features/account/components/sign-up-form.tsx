"use client";

import { useSyncExternalStore } from "react";
import { ActionForm } from "@/components/form/action-form";
import { SelectField, TextField } from "@/components/form/fields";
import { TickField } from "@/components/form/choices";
import { signUpAction } from "../actions";
import { PASSWORD_CHARACTERS_AT_LEAST } from "../constants";
import { signUpInput } from "../schema";

const noChange = () => () => undefined;

export function SignUpForm({ zones }: Readonly<{ zones: ReadonlyArray<string> }>) {
  const ownZone = useSyncExternalStore(noChange, () => new Intl.DateTimeFormat().resolvedOptions().timeZone, () => "");
  return (
    <ActionForm key={ownZone} schema={signUpInput} action={signUpAction} submitLabel="Make an account" start={{ timeZone: ownZone || "Europe/London" }}>
      <TextField name="displayName" label="Name that others see" autoComplete="name" hint="A first name is enough." />
      <TextField name="email" label="E-mail address" type="email" autoComplete="email" />
      <TextField
        name="password"
        label="Password"
        type="password"
        autoComplete="new-password"
        hint={`At least ${PASSWORD_CHARACTERS_AT_LEAST} characters; a few words in a row work well. Pasting is fine.`}
      />
      <SelectField name="timeZone" label="Time zone" options={zones.map((zone) => ({ value: zone, label: zone.replaceAll("_", " ") }))} />
      <TickField
        name="isAdultOrHelper"
        label="I have read that Notchbook is a journal and not medical advice, and that a licensed professional who knows me decides about settings."
      />
    </ActionForm>
  );
}
