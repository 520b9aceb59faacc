"use client";

import { ActionForm } from "@/components/form/action-form";
import { ChoiceField, TicksField } from "@/components/form/choices";
import { TextField } from "@/components/form/fields";
import { inviteHelperAction } from "../actions";
import { INVITATION_DAYS, ROLE_OPTIONS, SCOPE_OPTIONS } from "../constants";
import { inviteHelperInput } from "../schema";

/** Ask somebody into the circle. */
export function InviteForm({ journalId }: Readonly<{ journalId: string }>) {
  return (
    <ActionForm
      schema={inviteHelperInput}
      action={inviteHelperAction}
      submitLabel="Send the invitation"
      start={{ role: "mentor", scopes: ["settings", "glucose", "entries"] }}
      hidden={{ journalId }}
      idPrefix="invite"
    >
      <TextField name="email" label="E-mail address" type="email" hint={`The link in the mail works once, within ${INVITATION_DAYS} days.`} />
      <ChoiceField name="role" label="They help as" options={ROLE_OPTIONS} />
      <TicksField name="scopes" label="They see" options={SCOPE_OPTIONS} hint="You can change this at any time." />
      <TextField name="until" label="Last day" type="date" isOptional hint="Left empty, it has no end." />
    </ActionForm>
  );
}
