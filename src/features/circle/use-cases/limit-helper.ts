import "server-only";
import { limitGrant } from "@/db/repositories/grants";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { grantEnd } from "@/domain/access/grant-end";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { limitHelperInput, type LimitHelperInput } from "../schema";

/**
 * Change what a helper sees, and until when. It counts from their next request on.
 *
 * @throws {AppError} NOT_FOUND for somebody who is no helper here, FORBIDDEN, INVALID_INPUT at `until`
 */
export async function limitHelper(ctx: Context, input: LimitHelperInput): Promise<void> {
  const { journalId, userId, scopes, until } = limitHelperInput.parse(input);
  authorize(ctx.actor, "circle.manage", journalId);
  const person = requireUser(ctx.actor);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const expiresAt = grantEnd(until, journal.timeZone, ctx.now());
  await ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    if (!(await limitGrant(tx, { journalId, userId, scopes, expiresAt, now: at }))) throw new AppError("NOT_FOUND", `helper ${userId}`);
    await appendEvent(tx, {
      journalId, at, actorId: person.userId, actorKind: "user", action: "circle.manage", subject: `helper ${userId}`, details: { step: "limited", scopes, until }, requestId: ctx.requestId,
    });
  });
}
