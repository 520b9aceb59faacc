import "server-only";
import { deleteReadingsOf, dropChunks, findImport, updateImport } from "@/db/repositories/imports";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { authorize, requireUser } from "@/domain/access/policy";
import { civilOf } from "@/domain/civil-time";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { refreshRollups } from "../queries/refresh-rollups";
import { importInput } from "../schema";

/** Take one import out again, whole; the figures of its days are worked out anew. @throws {AppError} CONFLICT unless it is done, uploaded or stopped */
export async function undoImport(ctx: Context, input: { journalId: string; importId: string }): Promise<{ removed: number }> {
  const { journalId, importId } = importInput.parse(input);
  authorize(ctx.actor, "glucose.import", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const found = await findImport(tx, journalId, importId);
    const journal = await findJournal(tx, journalId);
    if (!found || !journal) throw new AppError("NOT_FOUND", `import ${importId}`);
    if (found.status === "undone" || found.status === "running") throw new AppError("CONFLICT", `import ${importId} is ${found.status}`);
    const instants = await deleteReadingsOf(tx, journalId, importId);
    await refreshRollups({ ...ctx, db: tx }, journal, instants.map((at) => civilOf(at.getTime(), journal.timeZone).dayNumber));
    await dropChunks(tx, journalId, importId);
    await updateImport(tx, journalId, importId, { status: "undone", finishedAt: ctx.now() });
    await appendEvent(tx, { journalId, at: ctx.now(), actorId: userId, actorKind: "user", action: "glucose.import", subject: `import ${importId} undone`, requestId: ctx.requestId });
    return { removed: instants.length };
  });
}
