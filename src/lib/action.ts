import "server-only";
import { forbidden, notFound, redirect, unstable_rethrow } from "next/navigation";
import { headers } from "next/headers";
import { z } from "zod";
import { AppError, type ErrorCode } from "@/domain/errors";
import { assertSameOrigin } from "./same-origin";
import { logEvent } from "./log";
import { requestContext } from "./request-context";
import type { Context } from "./context";

/** What a form gets back: nothing yet, done, or a refusal with the fields to mend and what had been typed. */
export type ActionResult<T = unknown> =
  | { ok: true; data: T }
  | { ok: false; code: ErrorCode; message: string; fields: Record<string, string[]>; typed: Record<string, string> };

/** Sentences for refusals that no field carries. */
const MESSAGES: Record<ErrorCode, string> = {
  INVALID_INPUT: "There is a problem with what was typed.",
  INVALID_RANGE: "There is a problem with what was typed.",
  INVALID_READING: "There is a problem with what was typed.",
  UNAUTHENTICATED: "You are signed out. Sign in again; what you typed stays here.",
  FORBIDDEN: "Your role in this journal does not include this.",
  NOT_FOUND: "This is not here, or not shared with you.",
  CONFLICT: "This has changed since you opened it. Reload to see how it stands now.",
  STALE: "This was changed on another device since you opened it.",
  GATE_CLOSED: "This needs your educator first. You can write it down and send it now.",
  TOO_LARGE: "This is larger than what can be taken in.",
  TOO_MANY: "That was tried many times in a row. Wait a few minutes, then go on.",
  UNAVAILABLE: "This could not be saved just now. Nothing was changed; send it again in a moment.",
};

/** The refusal as a value. Anything that is not a refusal is a bug and is thrown on. */
export function refusal(error: unknown, typed: Record<string, string> = {}): Extract<ActionResult, { ok: false }> {
  if (error instanceof z.ZodError) {
    const fields: Record<string, string[]> = {};
    for (const issue of error.issues) (fields[issue.path.join(".") || "form"] ??= []).push(issue.message);
    return { ok: false, code: "INVALID_INPUT", message: MESSAGES.INVALID_INPUT, fields, typed };
  }
  if (error instanceof AppError) {
    return { ok: false, code: error.code, message: MESSAGES[error.code], fields: { ...error.fields }, typed };
  }
  throw error;
}

/**
 * Run one use-case for a form or a call from the page: same-origin check, the
 * request's context, refusals as values. An action holds no rule of its own.
 */
export async function toActionResult<T>(
  work: (ctx: Context) => Promise<T>,
  form?: FormData,
): Promise<ActionResult<T>> {
  assertSameOrigin(await headers());
  const ctx = await requestContext();
  try {
    return { ok: true, data: await work(ctx) };
  } catch (error) {
    unstable_rethrow(error);
    if (error instanceof AppError) {
      logEvent("warn", "action.refused", { requestId: ctx.requestId, code: error.code, reason: error.message });
    }
    return refusal(error, form ? typedText(form) : {});
  }
}

/**
 * A form as a plain object. "blocks.0.rate" is the rate of the first block, as
 * the form library names fields; a name sent more than once becomes a list.
 */
export function formValues(form: FormData): Record<string, unknown> {
  const values: Record<string, unknown> = Object.create(null) as Record<string, unknown>;
  for (const path of new Set(form.keys())) {
    if (path.startsWith("$ACTION")) continue;
    const sent = form.getAll(path);
    place(values, path.split("."), sent.length === 1 ? sent[0] : sent);
  }
  return { ...values };
}

const FORBIDDEN_KEY = /^(__proto__|constructor|prototype)$/;
const LONGEST_LIST = 200;

function place(values: Record<string, unknown>, keys: string[], value: unknown): void {
  if (keys.some((key) => FORBIDDEN_KEY.test(key) || (/^\d+$/.test(key) && Number(key) >= LONGEST_LIST))) return;
  let at = values;
  for (const [i, key] of keys.slice(0, -1).entries()) {
    const next = at[key];
    if (next === null || typeof next !== "object") at[key] = /^\d+$/.test(keys[i + 1] ?? "") ? [] : {};
    at = at[key] as Record<string, unknown>;
  }
  at[keys[keys.length - 1] ?? ""] = value;
}

/** One text field of a form; empty when it is absent or a file. */
export function fieldText(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === "string" ? value : "";
}

const SECRET_FIELD = /password|token|secret/i;

function typedText(form: FormData): Record<string, string> {
  const typed: Record<string, string> = {};
  for (const [key, value] of form.entries()) {
    if (typeof value === "string" && !SECRET_FIELD.test(key) && !key.startsWith("$ACTION")) typed[key] = value;
  }
  return typed;
}

/** An unforeseen error under the request's id, which its page shows and the log carries. Redirects and the like keep the mark they have. */
function withReference(error: unknown, requestId: string): unknown {
  return error instanceof Error && !("digest" in error) ? Object.assign(error, { digest: requestId }) : error;
}

/**
 * Run a read for a page; refusals become the page's status: signed out goes to
 * sign-in, a stranger sees 404, too weak a role 403.
 */
export async function forPage<T>(work: (ctx: Context) => Promise<T>): Promise<T> {
  const ctx = await requestContext();
  try {
    return await work(ctx);
  } catch (error) {
    if (error instanceof z.ZodError) notFound();
    if (!(error instanceof AppError)) throw withReference(error, ctx.requestId);
    if (error.code === "UNAUTHENTICATED") redirect(`/sign-in?next=${encodeURIComponent((await headers()).get("x-path") ?? "/")}`);
    if (error.code === "NOT_FOUND") notFound();
    if (error.code === "FORBIDDEN") {
      if (ctx.actor.type === "user" && !ctx.actor.isEmailVerified) redirect("/check-your-mail");
      forbidden();
    }
    throw error;
  }
}
