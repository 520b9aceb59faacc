"use server";

import { redirect } from "next/navigation";
import { formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { SignUpInput } from "./schema";
import { signUp } from "./use-cases/sign-up";

type Previous = ActionResult | null;

export async function signUpAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => signUp(ctx, formValues(form) as SignUpInput), form);
  if (!result.ok) return result;
  redirect("/check-your-mail");
}
