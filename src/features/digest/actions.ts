"use server";

import { refresh } from "next/cache";
import { redirect } from "next/navigation";
import { formValues, toActionResult, type ActionResult } from "@/lib/action";
import { lentFinding } from "@/lib/lent-findings";
import type { DigestPreferenceInput } from "./schema";
import { saveDigestPreference } from "./use-cases/save-digest-preference";
import { sendDigestNow } from "./use-cases/send-digest-now";
import { unsubscribe } from "./use-cases/unsubscribe";

type Previous = ActionResult | null;

export async function saveDigestPreferenceAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => saveDigestPreference(ctx, formValues(form) as DigestPreferenceInput), form);
  if (result.ok) refresh();
  return result;
}

export async function sendDigestNowAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return toActionResult((ctx) => sendDigestNow(ctx, lentFinding), form);
}

export async function unsubscribeAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => unsubscribe(ctx, formValues(form) as { token: string }), form);
  if (!result.ok) return result;
  redirect("/unsubscribe?done=yes");
}
