"use server";

import { redirect } from "next/navigation";
import { formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { ApproveVersionInput, DeclineVersionInput, ReturnVersionInput } from "./schema";
import { approveVersion } from "./use-cases/approve-version";
import { declineVersion } from "./use-cases/decline-version";
import { returnVersion } from "./use-cases/return-version";

type Previous = ActionResult | null;

export async function approveVersionAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => approveVersion(ctx, formValues(form) as ApproveVersionInput), form);
  if (!result.ok) return result;
  redirect("/review?decided=approved");
}

export async function returnVersionAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => returnVersion(ctx, formValues(form) as ReturnVersionInput), form);
  if (!result.ok) return result;
  redirect("/review?decided=returned");
}

export async function declineVersionAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => declineVersion(ctx, formValues(form) as DeclineVersionInput), form);
  if (!result.ok) return result;
  redirect("/review?decided=declined");
}
