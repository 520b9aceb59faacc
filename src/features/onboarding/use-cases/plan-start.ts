import "server-only";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal, updateJournal } from "@/db/repositories/journals";
import { lockJournal } from "@/db/repositories/versions";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { planStartInput, type PlanStartInput } from "../schema";

/**
 * Write down, move or clear the planned start day. Opens nothing.
 *
 * @throws {AppError} CONFLICT once day 1 is set
 */
export async function planStart(ctx: Context, input: PlanStartInput): Promise<{ plannedStartOn: string | null }> {
  const { journalId, plannedStartOn } = planStartInput.parse(input);
  authorize(ctx.actor, "journal.edit", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    await lockJournal(tx, journalId);
    const journal = await findJournal(tx, journalId);
    if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
    if (journal.startedOn !== null) throw new AppError("CONFLICT", `day 1 was ${journal.startedOn}`);
    await updateJournal(tx, journalId, { plannedStartOn });
    await appendEvent(tx, { journalId, at: ctx.now(), actorId: userId, actorKind: "user", action: "journal.plan", subject: "journal", requestId: ctx.requestId });
    return { plannedStartOn };
  });
}
