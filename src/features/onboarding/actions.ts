"use server";

import { redirect } from "next/navigation";
import { fieldText, formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { CreateJournalInput, ProposeStartInput, SaveStepInput } from "./schema";
import { createJournal } from "./use-cases/create-journal";
import { proposeStart } from "./use-cases/propose-start";
import { saveStep } from "./use-cases/save-step";

type Previous = ActionResult | null;

export async function createJournalAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => createJournal(ctx, formValues(form) as CreateJournalInput), form);
  if (!result.ok) return result;
  redirect(`/j/${result.data.journalId}/start/about-you`);
}

export async function saveStepAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => saveStep(ctx, formValues(form) as SaveStepInput), form);
  if (!result.ok) return result;
  const isChange = form.get("returnTo") === "review";
  redirect(`/j/${fieldText(form, "journalId")}/start/${isChange ? "review" : result.data.next}`);
}

export async function proposeStartAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => proposeStart(ctx, formValues(form) as ProposeStartInput), form);
  if (!result.ok) return result;
  redirect(`/j/${fieldText(form, "journalId")}/changes/${result.data.number}`);
}
