"use client";

import { z } from "zod";
import { ActionForm } from "@/components/form/action-form";
import { ChoiceField } from "@/components/form/choices";
import { TextField } from "@/components/form/fields";
import { createTokenAction } from "../actions";
import { TOKEN_DAYS } from "../constants";
import { createTokenInput } from "../schema";

const made = z.object({ secret: z.string() });
const SCOPES = [{ value: "read", label: "read" }, { value: "write", label: "read and write" }];

/** Makes a token and shows its secret, this once. */
export function TokenForm() {
  return (
    <ActionForm
      schema={createTokenInput}
      action={createTokenAction}
      submitLabel="Make a token"
      submitKind="other"
      start={{ scope: "read" }}
      idPrefix="token"
      isEmptiedWhenDone
      done={(data) => (
        <>
          <p>Here it is, this once. Copy it now; only its fingerprint is kept.</p>
          <p className="mt-1 font-mono break-all select-all">{made.parse(data).secret}</p>
        </>
      )}
    >
      <TextField name="label" label="What it is for" hint={`It ends by itself after ${TOKEN_DAYS} days.`} />
      <ChoiceField name="scope" label="What it may do" options={SCOPES} isInline />
    </ActionForm>
  );
}
