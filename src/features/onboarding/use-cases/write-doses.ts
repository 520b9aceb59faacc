import "server-only";
import { upsertBackUpDoses } from "@/db/repositories/fallback-cards";
import { appendEvent } from "@/db/repositories/journal-events";
import { authorize, requireUser } from "@/domain/access/policy";
import { milliUnitsOrNull } from "@/domain/units";
import type { Context } from "@/lib/context";
import { writeDosesInput, type WriteDosesInput } from "../schema";

/**
 * A licensed educator of the circle marks the back-up doses on the fallback
 * card. The event keeps what they wrote, so that the card can say whose the
 * doses are for as long as they stand.
 */
export async function writeDoses(ctx: Context, input: WriteDosesInput): Promise<{ journalId: string }> {
  const { journalId, longActingUnits, rapidUnits } = writeDosesInput.parse(input);
  authorize(ctx.actor, "fallback.dose", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    const doses = { longActingMilliUnits: milliUnitsOrNull(longActingUnits), rapidMilliUnits: milliUnitsOrNull(rapidUnits) };
    await upsertBackUpDoses(tx, { journalId, ...doses, updatedAt: at });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "fallback.dose", subject: "fallback card", details: doses, requestId: ctx.requestId });
    return { journalId };
  });
}
