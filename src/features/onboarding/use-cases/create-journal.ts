import "server-only";
import { upsertGrant } from "@/db/repositories/grants";
import { appendEvent } from "@/db/repositories/journal-events";
import { insertJournal } from "@/db/repositories/journals";
import { insertDraft } from "@/db/repositories/wizard-drafts";
import { SCOPES } from "@/domain/access/permissions";
import { authorize, requireUser } from "@/domain/access/policy";
import { milliUnitsFromUnits } from "@/domain/units";
import type { Context } from "@/lib/context";
import { createJournalInput, type CreateJournalInput } from "../schema";

/** A new journal with its person's own grant and an empty draft of the starting profile. */
export async function createJournal(ctx: Context, input: CreateJournalInput): Promise<{ journalId: string }> {
  const { pump, sensor, controller, insulin, basalStepUnits, bolusStepUnits, ...journal } = createJournalInput.parse(input);
  authorize(ctx.actor, "journal.create");
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    const setup = { pump, sensor, controller, insulin, basalStepMilliUnits: milliUnitsFromUnits(basalStepUnits), bolusStepMilliUnits: milliUnitsFromUnits(bolusStepUnits) };
    const journalId = await insertJournal(tx, { ...journal, ownerId: userId, setup, createdAt: at });
    await upsertGrant(tx, { journalId, userId, role: "person", scopes: [...SCOPES], grantedAt: at, grantedBy: userId, expiresAt: null });
    await insertDraft(tx, { journalId, updatedAt: at, updatedBy: userId });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "journal.create", subject: "journal", requestId: ctx.requestId });
    return { journalId };
  });
}
