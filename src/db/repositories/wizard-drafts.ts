import { and, eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { wizardDrafts } from "@/db/schema/journals";
import type { DraftAnswers } from "@/domain/onboarding/draft";

export async function findDraft(db: Db, journalId: string) {
  const [row] = await db.select().from(wizardDrafts).where(eq(wizardDrafts.journalId, journalId));
  return row;
}

/** The draft under its row's lock, so that two devices save one after the other. */
export async function findDraftForUpdate(tx: Db, journalId: string) {
  const [row] = await tx.select().from(wizardDrafts).where(eq(wizardDrafts.journalId, journalId)).for("update");
  return row;
}

export async function insertDraft(db: Db, draft: { journalId: string; updatedAt: Date; updatedBy: string }): Promise<void> {
  await db.insert(wizardDrafts).values({ ...draft, answers: {} });
}

/** Save all answers if nobody saved since `rowVersion`. @returns the new count, or null when somebody did */
export async function updateDraft(
  db: Db,
  draft: { journalId: string; answers: DraftAnswers; rowVersion: number; updatedAt: Date; updatedBy: string },
): Promise<number | null> {
  const [row] = await db
    .update(wizardDrafts)
    .set({ answers: draft.answers, rowVersion: draft.rowVersion + 1, updatedAt: draft.updatedAt, updatedBy: draft.updatedBy })
    .where(and(eq(wizardDrafts.journalId, draft.journalId), eq(wizardDrafts.rowVersion, draft.rowVersion)))
    .returning({ rowVersion: wizardDrafts.rowVersion });
  return row?.rowVersion ?? null;
}
