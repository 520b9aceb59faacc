import "server-only";
import { z } from "zod";
import { listAccess } from "@/db/repositories/access-log";
import { findJournal } from "@/db/repositories/journals";
import { authorize, type JournalRole } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";

const LINES_AT_MOST = 500;

export type AccessLine = Readonly<{ at: Date; name: string; role: JournalRole; what: string }>;

/** Who looked at what, and when, newest first. For the person alone. */
export async function accessLines(ctx: Context, input: { journalId: string }): Promise<{ lines: AccessLine[]; timeZone: string }> {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "access-log.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  return { lines: await listAccess(ctx.db, journalId, LINES_AT_MOST), timeZone: journal.timeZone };
}
