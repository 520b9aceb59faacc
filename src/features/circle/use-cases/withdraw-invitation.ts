import "server-only";
import type { z } from "zod";
import { appendEvent } from "@/db/repositories/journal-events";
import { withdrawInvitation as withdraw } from "@/db/repositories/invitations";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { withdrawInvitationInput } from "../schema";

/**
 * Take an invitation back; its link leads nowhere from then on, and a mail that
 * has not left yet stays here.
 *
 * @throws {AppError} NOT_FOUND for one that is not open, FORBIDDEN
 */
export async function withdrawInvitation(ctx: Context, input: z.input<typeof withdrawInvitationInput>): Promise<void> {
  const { journalId, invitationId } = withdrawInvitationInput.parse(input);
  authorize(ctx.actor, "circle.manage", journalId);
  const { userId } = requireUser(ctx.actor);
  await ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    if (!(await withdraw(tx, journalId, invitationId, at))) throw new AppError("NOT_FOUND", `invitation ${invitationId}`);
    await appendEvent(tx, {
      journalId, at, actorId: userId, actorKind: "user", action: "circle.manage", subject: `invitation ${invitationId}`, details: { step: "withdrawn" }, requestId: ctx.requestId,
    });
  });
}
