"use server";

import { redirect } from "next/navigation";
import { fieldText, formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { RunImportInput } from "./schema";
import { runImport } from "./use-cases/run-import";
import { undoImport } from "./use-cases/undo-import";

type Previous = ActionResult | null;

export async function runImportAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => runImport(ctx, formValues(form) as RunImportInput), form);
  if (!result.ok) return result;
  redirect(`/j/${fieldText(form, "journalId")}/data/${fieldText(form, "importId")}`);
}

export async function undoImportAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => undoImport(ctx, formValues(form) as { journalId: string; importId: string }), form);
  if (!result.ok) return result;
  redirect(`/j/${fieldText(form, "journalId")}/data`);
}
