"use client";

import { ActionForm } from "@/components/form/action-form";
import { undoImportAction } from "../actions";
import { importInput } from "../schema";

export function UndoForm({ journalId, importId, label }: Readonly<{ journalId: string; importId: string; label: string }>) {
  return <ActionForm schema={importInput} action={undoImportAction} submitLabel={label} hidden={{ journalId, importId }} />;
}
