"use server";

import { refresh } from "next/cache";
import { formValues, toActionResult, type ActionResult } from "@/lib/action";
import { verifyCredential } from "./use-cases/verify-credential";

export async function verifyCredentialAction(_previous: ActionResult | null, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => verifyCredential(ctx, formValues(form) as { userId: string }), form);
  if (result.ok) refresh();
  return result;
}
