import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { authorize, can } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { isoDayOf } from "@/domain/iso-day";
import { readiness } from "@/domain/journal/readiness";
import type { Context } from "@/lib/context";
import { z } from "zod";
import { readinessFacts } from "./readiness-facts";

/** Where a journal stands on its plan; the readiness list only for the person, before day 1. */
export async function planOf(ctx: Context, input: { journalId: string }) {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "journal.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const today = isoDayOf(ctx.now(), journal.timeZone);
  const isAhead = journal.startedOn === null && can(ctx.actor, "journal.edit", journalId);
  const startDay = journal.plannedStartOn !== null && journal.plannedStartOn > today ? journal.plannedStartOn : today;
  const facts = isAhead ? await readinessFacts(ctx, { journal, startDay }) : null;
  return {
    therapy: journal.therapy,
    startedOn: journal.startedOn,
    plannedStartOn: journal.plannedStartOn,
    today,
    /** The two ticks of the day are made in the form, so they are not missing here. */
    readiness: facts ? readiness({ ...facts, hasKetoneStrips: true, hasFastCarbohydrate: true }) : null,
  };
}
