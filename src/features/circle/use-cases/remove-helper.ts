import "server-only";
import type { z } from "zod";
import { findAccount } from "@/db/repositories/accounts";
import { revokeGrant } from "@/db/repositories/grants";
import { withdrawInvitationsTo } from "@/db/repositories/invitations";
import { appendEvent } from "@/db/repositories/journal-events";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { removeHelperInput } from "../schema";

/**
 * End a helper's way in. It counts from their next request on; mail about the
 * notebook that has not left yet stays here, and no open invitation lets them back.
 *
 * @throws {AppError} NOT_FOUND for somebody who is no helper here, FORBIDDEN
 */
export async function removeHelper(ctx: Context, input: z.input<typeof removeHelperInput>): Promise<void> {
  const { journalId, userId } = removeHelperInput.parse(input);
  authorize(ctx.actor, "circle.manage", journalId);
  const person = requireUser(ctx.actor);
  await ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    if (!(await revokeGrant(tx, journalId, userId, at))) throw new AppError("NOT_FOUND", `helper ${userId}`);
    const helper = await findAccount(tx, userId);
    if (helper) await withdrawInvitationsTo(tx, journalId, helper.email, at);
    await appendEvent(tx, {
      journalId, at, actorId: person.userId, actorKind: "user", action: "circle.manage", subject: `helper ${userId}`, details: { step: "removed" }, requestId: ctx.requestId,
    });
  });
}
