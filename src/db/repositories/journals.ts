import { eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { journals } from "@/db/schema/journals";

export type NewJournal = typeof journals.$inferInsert;
export type JournalRow = typeof journals.$inferSelect;

/** @returns the new journal's id */
export async function insertJournal(db: Db, journal: NewJournal): Promise<string> {
  const [row] = await db.insert(journals).values(journal).returning({ id: journals.id });
  if (!row) throw new Error("insert returned no row");
  return row.id;
}

export async function findJournal(db: Db, journalId: string): Promise<JournalRow | undefined> {
  const [row] = await db.select().from(journals).where(eq(journals.id, journalId));
  return row;
}

export async function updateJournal(
  db: Db,
  journalId: string,
  changes: Partial<Pick<JournalRow, "name" | "timeZone" | "glucoseUnit" | "plannedStartOn" | "startedOn" | "therapy" | "setup" | "gateReasons">>,
): Promise<void> {
  await db.update(journals).set(changes).where(eq(journals.id, journalId));
}
