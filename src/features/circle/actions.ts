"use server";

import { refresh } from "next/cache";
import { redirect } from "next/navigation";
import { formValues, toActionResult, type ActionResult } from "@/lib/action";
import type { Context } from "@/lib/context";
import type { AcceptInvitationInput, AddCommentInput, InviteHelperInput, LimitHelperInput } from "./schema";
import { acceptInvitation } from "./use-cases/accept-invitation";
import { addComment } from "./use-cases/add-comment";
import { inviteHelper } from "./use-cases/invite-helper";
import { leaveCircle } from "./use-cases/leave-circle";
import { limitHelper } from "./use-cases/limit-helper";
import { markCommentsRead } from "./use-cases/mark-comments-read";
import { removeHelper } from "./use-cases/remove-helper";
import { withdrawInvitation } from "./use-cases/withdraw-invitation";

type Previous = ActionResult | null;

/** Run it, and show the page as it stands afterwards. */
async function andRefresh<T>(work: (ctx: Context) => Promise<T>, form: FormData): Promise<ActionResult<T>> {
  const result = await toActionResult(work, form);
  if (result.ok) refresh();
  return result;
}

export async function inviteHelperAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return andRefresh((ctx) => inviteHelper(ctx, formValues(form) as InviteHelperInput), form);
}

export async function withdrawInvitationAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return andRefresh((ctx) => withdrawInvitation(ctx, formValues(form) as { journalId: string; invitationId: string }), form);
}

export async function limitHelperAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return andRefresh((ctx) => limitHelper(ctx, formValues(form) as LimitHelperInput), form);
}

export async function removeHelperAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return andRefresh((ctx) => removeHelper(ctx, formValues(form) as { journalId: string; userId: string }), form);
}

export async function acceptInvitationAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => acceptInvitation(ctx, formValues(form) as AcceptInvitationInput), form);
  if (!result.ok) return result;
  redirect(`/j/${result.data.journalId}/today`);
}

export async function leaveCircleAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  const result = await toActionResult((ctx) => leaveCircle(ctx, formValues(form) as { journalId: string }), form);
  if (!result.ok) return result;
  redirect("/journals");
}

export async function addCommentAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return andRefresh((ctx) => addComment(ctx, formValues(form) as AddCommentInput), form);
}

export async function markCommentsReadAction(_previous: Previous, form: FormData): Promise<ActionResult> {
  return andRefresh((ctx) => markCommentsRead(ctx, formValues(form) as { journalId: string; readUpTo: string }), form);
}
