"use client";

import { ActionForm } from "@/components/form/action-form";
import { TicksField } from "@/components/form/choices";
import { TextField } from "@/components/form/fields";
import type { Scope } from "@/domain/access/policy";
import { limitHelperAction } from "../actions";
import { SCOPE_OPTIONS } from "../constants";
import { limitHelperInput } from "../schema";

/** What one helper sees, and until when. */
export function LimitForm({
  journalId, userId, scopes, until,
}: Readonly<{ journalId: string; userId: string; scopes: ReadonlyArray<Scope>; until: string | null }>) {
  return (
    <ActionForm
      schema={limitHelperInput}
      action={limitHelperAction}
      submitLabel="Save"
      start={{ scopes, until: until ?? "" }}
      hidden={{ journalId, userId }}
      idPrefix={`limit-${userId}`}
    >
      <TicksField name="scopes" label="They see" options={SCOPE_OPTIONS} />
      <TextField name="until" label="Last day" type="date" isOptional hint="Left empty, it has no end." />
    </ActionForm>
  );
}
