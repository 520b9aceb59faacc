"use server";

import { refresh } from "next/cache";
import { formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { Context } from "@/lib/context";
import { logDose, logKetones, logMeal, logNote } from "./use-cases/log-entry";
import { removeEntry } from "./use-cases/remove-entry";
import { setFlag } from "./use-cases/set-flag";

type Previous = ActionResult | null;

async function saved(work: (ctx: Context) => Promise<unknown>, form: FormData): Promise<ActionResult> {
  const result = await toActionResult(work, form);
  if (result.ok) refresh();
  return result;
}

export async function logMealAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return saved((ctx) => logMeal(ctx, formValues(form)), form);
}

export async function logDoseAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return saved((ctx) => logDose(ctx, formValues(form)), form);
}

export async function logNoteAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return saved((ctx) => logNote(ctx, formValues(form)), form);
}

export async function logKetonesAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return saved((ctx) => logKetones(ctx, formValues(form)), form);
}

export async function removeEntryAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return saved((ctx) => removeEntry(ctx, formValues(form) as { journalId: string; entryId: string }), form);
}

export async function setFlagAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return saved((ctx) => setFlag(ctx, formValues(form)), form);
}
