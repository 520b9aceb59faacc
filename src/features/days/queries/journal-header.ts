import "server-only";
import { z } from "zod";
import { findJournal } from "@/db/repositories/journals";
import { findAccount } from "@/db/repositories/accounts";
import { authorize, findGrant, type JournalRole } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { GlucoseUnit } from "@/domain/units";
import type { Context } from "@/lib/context";

export type JournalHeader = Readonly<{
  journalId: string;
  name: string;
  ownerName: string;
  role: JournalRole;
  timeZone: string;
  unit: GlucoseUnit;
  startedOn: string | null;
  plannedStartOn: string | null;
  /** Open: the person may see numbers without an educator. Null: the gate questions are not answered. */
  isGateOpen: boolean | null;
}>;

/** What the frame of every journal page says. @throws {AppError} UNAUTHENTICATED, NOT_FOUND */
export async function journalHeader(ctx: Context, input: { journalId: string }): Promise<JournalHeader> {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "journal.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const owner = journal ? await findAccount(ctx.db, journal.ownerId) : undefined;
  if (!journal || !owner) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  return {
    journalId,
    name: journal.name,
    ownerName: owner.displayName,
    role: findGrant(ctx.actor, journalId)?.role ?? "mentor",
    timeZone: journal.timeZone,
    unit: journal.glucoseUnit,
    startedOn: journal.startedOn,
    plannedStartOn: journal.plannedStartOn,
    isGateOpen: journal.gateReasons === null ? null : journal.gateReasons.length === 0,
  };
}
