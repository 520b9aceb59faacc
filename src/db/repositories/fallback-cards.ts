import { eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { fallbackCards } from "@/db/schema/journals";

type Card = typeof fallbackCards.$inferInsert;

export async function findFallbackCard(db: Db, journalId: string) {
  const [row] = await db.select().from(fallbackCards).where(eq(fallbackCards.journalId, journalId));
  return row;
}

export async function upsertFallbackCard(db: Db, card: Card): Promise<void> {
  await db.insert(fallbackCards).values(card).onConflictDoUpdate({ target: fallbackCards.journalId, set: card });
}

/** The back-up doses alone; a card that is not there yet begins with nothing else on it. */
export async function upsertBackUpDoses(
  db: Db,
  doses: { journalId: string; longActingMilliUnits: number | null; rapidMilliUnits: number | null; updatedAt: Date },
): Promise<void> {
  await db
    .insert(fallbackCards)
    .values({ ...doses, previousSetup: "", emergencyNumber: "", contacts: [] })
    .onConflictDoUpdate({ target: fallbackCards.journalId, set: doses });
}
