"use server";

import { redirect } from "next/navigation";
import { fieldText, formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { ChangeSettingInput, EffectInput } from "./schema";
import { changeSetting } from "./use-cases/change-setting";
import { putIntoEffect } from "./use-cases/put-into-effect";
import { returnToVersion } from "./use-cases/return-to-version";
import { withdrawVersion } from "./use-cases/withdraw-version";

type Previous = ActionResult | null;
type Target = { journalId: string; number: string };

const changesPage = (form: FormData, number: number) => `/j/${fieldText(form, "journalId")}/changes/${number}`;

export async function changeSettingAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => changeSetting(ctx, formValues(form) as ChangeSettingInput), form);
  if (!result.ok) return result;
  redirect(changesPage(form, result.data.number));
}

export async function putIntoEffectAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => putIntoEffect(ctx, formValues(form) as EffectInput), form);
  if (!result.ok) return result;
  redirect(changesPage(form, result.data.number));
}

export async function withdrawVersionAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => withdrawVersion(ctx, formValues(form) as Target), form);
  if (!result.ok) return result;
  redirect(changesPage(form, result.data.number));
}

export async function returnToVersionAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => returnToVersion(ctx, formValues(form) as Target), form);
  if (!result.ok) return result;
  redirect(changesPage(form, result.data.number));
}
