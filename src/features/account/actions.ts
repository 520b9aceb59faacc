"use server";

import { refresh } from "next/cache";
import { headers } from "next/headers";
import { redirect } from "next/navigation";
import { formValues, toActionResult, type ActionResult } from "@/lib/action";
import { requestContext } from "@/lib/request-context";
import { revokeAllSessions, revokeSession } from "@/lib/session";
import { dropSessionCookie, startSession } from "@/lib/session-cookie";
import { clientAddress } from "@/lib/client-address";
import type { SignInInput, SignUpInput } from "./schema";
import { changePassword } from "./use-cases/change-password";
import { createToken } from "./use-cases/create-token";
import { endSession } from "./use-cases/end-session";
import { requestReset } from "./use-cases/request-reset";
import { resendVerification } from "./use-cases/resend-verification";
import { resetPassword } from "./use-cases/reset-password";
import { revokeToken } from "./use-cases/revoke-token";
import { signIn } from "./use-cases/sign-in";
import { signInToDemo } from "./use-cases/sign-in-to-demo";
import { signOut } from "./use-cases/sign-out";
import { signUp } from "./use-cases/sign-up";
import { submitCredential } from "./use-cases/submit-credential";
import { updateProfile } from "./use-cases/update-profile";
import { verifyEmail } from "./use-cases/verify-email";

type Previous = ActionResult | null;
const values = <T>(form: FormData) => formValues(form) as T;

/** The page behind the form shows what was changed. */
async function thenRefresh<T>(result: Promise<ActionResult<T>>): Promise<ActionResult<T>> {
  const known = await result;
  if (known.ok) refresh();
  return known;
}

export async function signUpAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult(async (ctx) => {
    const made = await signUp(ctx, values<SignUpInput>(form));
    if (made.userId) await startSession(made.userId, ctx.now());
  }, form);
  if (!result.ok) return result;
  redirect("/check-your-mail");
}

export async function signInAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult(async (ctx) => {
    const found = await signIn(ctx, values<SignInInput>(form), clientAddress(await headers()));
    await startSession(found.userId, ctx.now());
    return found.isEmailVerified ? found.next : "/check-your-mail";
  }, form);
  if (!result.ok) return result;
  redirect(result.data);
}

export async function demoSignInAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult(async (ctx) => {
    const found = await signInToDemo(ctx, values<{ role: string }>(form));
    await startSession(found.userId, ctx.now());
    return found.next;
  }, form);
  if (!result.ok) return result;
  redirect(result.data);
}

export async function signOutAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult(async (ctx) => {
    const { userId } = signOut(ctx);
    const { sessionId } = await requestContext();
    if (sessionId) await revokeSession(userId, sessionId);
    await dropSessionCookie();
  }, form);
  if (!result.ok) return result;
  redirect("/");
}

export async function verifyEmailAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => verifyEmail(ctx, values<{ token: string }>(form)), form);
  if (!result.ok) return result;
  redirect("/journals");
}

export async function resendVerificationAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return toActionResult((ctx) => resendVerification(ctx), form);
}

export async function requestResetAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return toActionResult((ctx) => requestReset(ctx, values<{ email: string }>(form)), form);
}

export async function resetPasswordAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult(async (ctx) => {
    const { userId } = await resetPassword(ctx, values<{ token: string; password: string }>(form));
    await revokeAllSessions(userId);
  }, form);
  if (!result.ok) return result;
  redirect("/sign-in");
}

export async function updateProfileAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return thenRefresh(toActionResult((ctx) => updateProfile(ctx, values(form)), form));
}

export async function changePasswordAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return thenRefresh(toActionResult(async (ctx) => {
    const { userId } = await changePassword(ctx, values(form));
    const { sessionId } = await requestContext();
    await revokeAllSessions(userId, sessionId ?? undefined);
  }, form));
}

export async function endSessionAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return thenRefresh(toActionResult(async (ctx) => {
    const { userId, sessionId } = endSession(ctx, values<{ sessionId: string }>(form));
    await revokeSession(userId, sessionId);
  }, form));
}

export async function submitCredentialAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return thenRefresh(toActionResult((ctx) => submitCredential(ctx, values(form)), form));
}

export async function createTokenAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return thenRefresh(toActionResult((ctx) => createToken(ctx, values(form)), form));
}

export async function revokeTokenAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return thenRefresh(toActionResult((ctx) => revokeToken(ctx, values(form)), form));
}
