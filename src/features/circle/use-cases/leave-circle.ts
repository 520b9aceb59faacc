import "server-only";
import { z } from "zod";
import { revokeGrant } from "@/db/repositories/grants";
import { appendEvent } from "@/db/repositories/journal-events";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";

const leaveCircleInput = z.object({ journalId: z.uuid() });

/**
 * A helper ends their own way in. The person can ask them again.
 *
 * @throws {AppError} NOT_FOUND; FORBIDDEN for the person, who can't leave their own notebook
 */
export async function leaveCircle(ctx: Context, input: z.input<typeof leaveCircleInput>): Promise<void> {
  const { journalId } = leaveCircleInput.parse(input);
  authorize(ctx.actor, "circle.leave", journalId);
  const { userId } = requireUser(ctx.actor);
  await ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    if (!(await revokeGrant(tx, journalId, userId, at))) throw new AppError("NOT_FOUND", `journal ${journalId}`);
    await appendEvent(tx, {
      journalId, at, actorId: userId, actorKind: "user", action: "circle.leave", subject: `helper ${userId}`, requestId: ctx.requestId,
    });
  });
}
