"use client";

import { ActionForm } from "@/components/form/action-form";
import { TextField } from "@/components/form/fields";
import { putIntoEffectAction, returnToVersionAction, withdrawVersionAction } from "../actions";
import { GuardrailAnswers } from "./guardrail-answers";
import { effectInput, returnToInput, versionInput } from "../schema";

type Target = Readonly<{ journalId: string; number: number }>;

/** The person says since when these settings are on the device. */
export function EffectForm({ journalId, number, contentHash, now }: Target & Readonly<{ contentHash: string; now: string }>) {
  return (
    <ActionForm
      schema={effectInput}
      action={putIntoEffectAction}
      submitLabel="It is on my device"
      hidden={{ journalId, number: String(number), contentHash }}
      start={{ effectiveFrom: now }}
    >
      <TextField name="effectiveFrom" label="On the device since" type="datetime-local" hint="Nothing is sent to a device. Enter the settings there, have them read back, then say when." size={20} />
    </ActionForm>
  );
}

export function WithdrawForm({ journalId, number }: Target) {
  return <ActionForm schema={versionInput} action={withdrawVersionAction} submitLabel="Withdraw this version" hidden={{ journalId, number: String(number) }} />;
}

export function ReturnForm({ journalId, number, mayRecord }: Target & Readonly<{ mayRecord: boolean }>) {
  return (
    <ActionForm
      schema={returnToInput}
      action={returnToVersionAction}
      submitLabel={mayRecord ? `Go back to version ${number}` : `Ask to go back to version ${number}`}
      hidden={{ journalId, number: String(number) }}
    >
      <TextField name="reasonText" label="Why?" isOptional />
      <GuardrailAnswers />
    </ActionForm>
  );
}
