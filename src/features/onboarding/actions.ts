"use server";

import { refresh } from "next/cache";
import { redirect } from "next/navigation";
import { fieldText, formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { ChooseTextInput, CreateJournalInput, PlanStartInput, ProposeStartInput, RecordStartInput, SaveCardInput, SaveStepInput, StartJournalInput, WriteDosesInput } from "./schema";
import { chooseText } from "./use-cases/choose-text";
import { createJournal } from "./use-cases/create-journal";
import { editBlocks } from "./use-cases/edit-blocks";
import { planStart } from "./use-cases/plan-start";
import { proposeStart } from "./use-cases/propose-start";
import { recordStart } from "./use-cases/record-start";
import { saveCard } from "./use-cases/save-card";
import { saveStep } from "./use-cases/save-step";
import { startJournal } from "./use-cases/start-journal";
import { writeDoses } from "./use-cases/write-doses";

type Previous = ActionResult | null;

export async function createJournalAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => createJournal(ctx, formValues(form) as CreateJournalInput), form);
  if (!result.ok) return result;
  redirect(`/j/${result.data.journalId}/start/about-you`);
}

/** Saves a page; a press of the block editor that comes without script saves the changed rows instead. */
export async function saveStepAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const page = (step: string) => `/j/${fieldText(form, "journalId")}/start/${step}`;
  const isChange = form.get("returnTo") === "review";
  if (form.has("edit")) {
    const edited = await toActionResult((ctx) => editBlocks(ctx, formValues(form)), form);
    if (!edited.ok) return edited;
    redirect(`${page(edited.data.step)}${isChange ? "?return=review" : ""}`);
  }
  const result = await toActionResult((ctx) => saveStep(ctx, formValues(form) as SaveStepInput), form);
  if (!result.ok) return result;
  refresh();
  redirect(page(result.data.isAside ? result.data.next : isChange ? "review" : result.data.next));
}

export async function chooseTextAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => chooseText(ctx, formValues(form) as ChooseTextInput), form);
  if (result.ok) refresh();
  return result;
}

export async function proposeStartAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => proposeStart(ctx, formValues(form) as ProposeStartInput), form);
  if (!result.ok) return result;
  redirect(`/j/${fieldText(form, "journalId")}/changes/${result.data.number}`);
}

export async function recordStartAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => recordStart(ctx, formValues(form) as RecordStartInput), form);
  if (!result.ok) return result;
  redirect(`/j/${fieldText(form, "journalId")}/changes/${result.data.number}`);
}

export async function planStartAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => planStart(ctx, formValues(form) as PlanStartInput), form);
  if (result.ok) refresh();
  return result;
}

export async function startJournalAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => startJournal(ctx, formValues(form) as StartJournalInput), form);
  if (result.ok) refresh();
  return result;
}

export async function saveCardAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => saveCard(ctx, formValues(form) as SaveCardInput), form);
  if (!result.ok) return result;
  redirect(`/j/${result.data.journalId}/fallback`);
}

export async function writeDosesAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => writeDoses(ctx, formValues(form) as WriteDosesInput), form);
  if (result.ok) refresh();
  return result;
}
