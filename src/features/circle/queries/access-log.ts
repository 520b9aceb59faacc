import "server-only";
import { z } from "zod";
import { listAccess } from "@/db/repositories/access-log";
import { findJournal } from "@/db/repositories/journals";
import { authorize, type JournalRole } from "@/domain/access/policy";
import { momentText } from "@/domain/digest/date-text";
import { AppError } from "@/domain/errors";
import { isoDayOf } from "@/domain/iso-day";
import type { Context } from "@/lib/context";

const LOOKS_AT_MOST = 1000;

export type AccessLine = Readonly<{
  /** The latest of the looks that stand in this line, and the same on the journal's clock in words. */
  at: Date;
  when: string;
  times: number;
  name: string;
  role: JournalRole;
  what: string;
}>;

/**
 * Who looked at what, and when, newest first. Looks of one helper at the same
 * thing on one day that follow each other stand in one line. For the person alone.
 */
export async function accessLines(ctx: Context, input: { journalId: string }): Promise<AccessLine[]> {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "access-log.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const { timeZone } = journal;
  const lines: AccessLine[] = [];
  for (const look of await listAccess(ctx.db, journalId, LOOKS_AT_MOST)) {
    const last = lines.at(-1);
    const isAgain = last && last.name === look.name && last.what === look.what && isoDayOf(last.at, timeZone) === isoDayOf(look.at, timeZone);
    if (isAgain) lines[lines.length - 1] = { ...last, times: last.times + 1 };
    else lines.push({ ...look, when: momentText(look.at, timeZone), times: 1 });
  }
  return lines;
}
