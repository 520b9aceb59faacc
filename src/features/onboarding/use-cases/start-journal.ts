import "server-only";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal, updateJournal } from "@/db/repositories/journals";
import { lockJournal } from "@/db/repositories/versions";
import { authorize, requireUser } from "@/domain/access/policy";
import { addDays } from "@/domain/day-start";
import { AppError } from "@/domain/errors";
import { isoDayOf } from "@/domain/iso-day";
import { readiness } from "@/domain/journal/readiness";
import { APPROVAL_LAPSES_AFTER_DAYS } from "@/domain/journal/version-lifecycle-rules";
import type { Context } from "@/lib/context";
import { readinessFacts } from "../queries/readiness-facts";
import { startJournalInput, type StartJournalInput } from "../schema";

/**
 * Open the start day: day 1 of the journal is today or one of the days that an
 * approval lives. Refused while anything of the readiness list is missing; the
 * list is looked at again here, whatever the page showed.
 *
 * @throws {AppError} CONFLICT once day 1 is set; INVALID_INPUT naming what is missing
 */
export async function startJournal(ctx: Context, input: StartJournalInput): Promise<{ startedOn: string }> {
  const { journalId, startedOn, hasKetoneStrips, hasFastCarbohydrate } = startJournalInput.parse(input);
  authorize(ctx.actor, "journal.edit", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    await lockJournal(tx, journalId);
    const journal = await findJournal(tx, journalId);
    if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
    if (journal.startedOn !== null) throw new AppError("CONFLICT", `day 1 was ${journal.startedOn}`);
    const at = ctx.now();
    const today = isoDayOf(at, journal.timeZone);
    const refuse = (sentence: string) => new AppError("INVALID_INPUT", "startedOn", { startedOn: [sentence] });
    if (startedOn > today) throw refuse("This day lies ahead. Write it down as the planned day, and open it when it comes.");
    if (startedOn < addDays(today, -APPROVAL_LAPSES_AFTER_DAYS)) throw refuse(`Day 1 lies at most ${APPROVAL_LAPSES_AFTER_DAYS} days back.`);
    const facts = await readinessFacts({ ...ctx, db: tx }, { journal, startDay: startedOn });
    const { blocks } = readiness({ ...facts, hasKetoneStrips, hasFastCarbohydrate });
    if (blocks.length > 0) throw new AppError("INVALID_INPUT", "not ready", { form: blocks.map(({ text }) => text) });
    await updateJournal(tx, journalId, { startedOn });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "journal.start", subject: "journal", requestId: ctx.requestId });
    return { startedOn };
  });
}
