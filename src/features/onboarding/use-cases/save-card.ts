import "server-only";
import { upsertFallbackCard } from "@/db/repositories/fallback-cards";
import { appendEvent } from "@/db/repositories/journal-events";
import { authorize, requireUser } from "@/domain/access/policy";
import { milliUnitsOrNull } from "@/domain/units";
import type { Context } from "@/lib/context";
import { saveCardInput, type SaveCardInput } from "../schema";

/** The person writes their fallback card anew, at any time; the wizard's page shows the same card. */
export async function saveCard(ctx: Context, input: SaveCardInput): Promise<{ journalId: string }> {
  const { journalId, longActingUnits, rapidUnits, ...card } = saveCardInput.parse(input);
  authorize(ctx.actor, "fallback.write", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    await upsertFallbackCard(tx, { ...card, journalId, longActingMilliUnits: milliUnitsOrNull(longActingUnits), rapidMilliUnits: milliUnitsOrNull(rapidUnits), updatedAt: at });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "fallback.write", subject: "fallback card", requestId: ctx.requestId });
    return { journalId };
  });
}
