import "server-only";
import { insertEntry } from "@/db/repositories/entries";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { entryDataSchema, type EntryData } from "@/domain/journal/entry";
import { instantOfLocal } from "@/domain/local-time";
import type { Context } from "@/lib/context";
import { logDoseInput, logKetonesInput, logMealInput, logNoteInput } from "../schema";

const MINUTE_MS = 60_000;

/** A meal, as it really was. */
export function logMeal(ctx: Context, input: unknown): Promise<{ entryId: string }> {
  const { journalId, at, ...meal } = logMealInput.parse(input);
  return store(ctx, journalId, at, { kind: "meal", ...meal });
}

/** A dose that was given. Written down only; nothing is worked out from it for a live moment. */
export function logDose(ctx: Context, input: unknown): Promise<{ entryId: string }> {
  const { journalId, at, units, ...dose } = logDoseInput.parse(input);
  return store(ctx, journalId, at, { kind: "dose", milliUnits: Math.round(units * 1000), ...dose });
}

export function logNote(ctx: Context, input: unknown): Promise<{ entryId: string }> {
  const { journalId, at, text } = logNoteInput.parse(input);
  return store(ctx, journalId, at, { kind: "note", text });
}

export function logKetones(ctx: Context, input: unknown): Promise<{ entryId: string }> {
  const { journalId, at, ketonesMmolPerL } = logKetonesInput.parse(input);
  return store(ctx, journalId, at, { kind: "ketones", ketonesMicroMolPerL: Math.round(ketonesMmolPerL * 1000) });
}

async function store(ctx: Context, journalId: string, local: string, given: EntryData): Promise<{ entryId: string }> {
  const data = entryDataSchema.parse(given);
  authorize(ctx.actor, "entry.log", journalId);
  const { userId } = requireUser(ctx.actor);
  return ctx.db.transaction(async (tx) => {
    const journal = await findJournal(tx, journalId);
    if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
    const at = instantOfLocal(local, journal.timeZone, "at");
    const now = ctx.now();
    if (at.getTime() > now.getTime() + 5 * MINUTE_MS) throw new AppError("INVALID_INPUT", "at", { at: ["This lies ahead. Log it when it has happened."] });
    const entryId = await insertEntry(tx, { journalId, kind: data.kind, at, data, createdBy: userId, createdAt: now, updatedAt: now });
    await appendEvent(tx, { journalId, at: now, actorId: userId, actorKind: "user", action: "entry.log", subject: data.kind, requestId: ctx.requestId });
    return { entryId };
  });
}
