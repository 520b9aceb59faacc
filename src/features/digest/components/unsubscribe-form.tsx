"use client";

import { ActionForm } from "@/components/form/action-form";
import { unsubscribeAction } from "../actions";
import { unsubscribeInput } from "../schema";

export function UnsubscribeForm({ token }: Readonly<{ token: string }>) {
  return <ActionForm schema={unsubscribeInput} action={unsubscribeAction} submitLabel="End them" hidden={{ token }} />;
}
