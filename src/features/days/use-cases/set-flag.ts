import "server-only";
import { insertDayFlag } from "@/db/repositories/entries";
import { appendEvent } from "@/db/repositories/journal-events";
import { authorize, requireUser } from "@/domain/access/policy";
import { dayNumberOf } from "@/domain/day-start";
import type { Context } from "@/lib/context";
import { setFlagInput } from "../schema";

/** Mark days as unlike others. Flags set on this form count as set after looking at the glucose of those days. */
export async function setFlag(ctx: Context, input: unknown): Promise<void> {
  const { journalId, code, firstDay, lastDay, note } = setFlagInput.parse(input);
  authorize(ctx.actor, "flag.set", journalId);
  const { userId } = requireUser(ctx.actor);
  await ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    await insertDayFlag(tx, { journalId, code, firstDay: dayNumberOf(firstDay), lastDay: dayNumberOf(lastDay), strength: 2, note, isGraphSeen: true, setBy: userId, setAt: at });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "flag.set", subject: code, requestId: ctx.requestId });
  });
}
