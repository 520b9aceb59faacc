"use client";

import { z } from "zod";
import { ActionForm } from "@/components/form/action-form";
import type { FormAction } from "@/components/form/form-state";

const nothingToType = z.looseObject({});

/** One button that does one thing; what it is about goes along unseen. */
export function PressForm({
  action, label, hidden, kind,
}: Readonly<{ action: FormAction; label: string; hidden: Readonly<Record<string, string>>; kind?: "next" | "other" }>) {
  return (
    <ActionForm schema={nothingToType} action={action} submitLabel={label} hidden={hidden} submitKind={kind} />
  );
}
