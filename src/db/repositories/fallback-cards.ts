import { eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { fallbackCards } from "@/db/schema/journals";

export async function findFallbackCard(db: Db, journalId: string) {
  const [row] = await db.select().from(fallbackCards).where(eq(fallbackCards.journalId, journalId));
  return row;
}

export async function upsertFallbackCard(db: Db, card: typeof fallbackCards.$inferInsert): Promise<void> {
  await db.insert(fallbackCards).values(card).onConflictDoUpdate({ target: fallbackCards.journalId, set: card });
}
