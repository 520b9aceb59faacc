import { and, asc, between, desc, eq, inArray } from "drizzle-orm";
import type { Db } from "@/db/client";
import { dailyRollups, type DayPart } from "@/db/schema/glucose";

export type RollupRow = typeof dailyRollups.$inferSelect;

/** The daily figures of one part of the day, first to last day included, in order. */
export async function listRollups(db: Db, journalId: string, part: DayPart, firstDay: number, lastDay: number): Promise<RollupRow[]> {
  return db
    .select()
    .from(dailyRollups)
    .where(and(eq(dailyRollups.journalId, journalId), eq(dailyRollups.part, part), between(dailyRollups.dayNumber, firstDay, lastDay)))
    .orderBy(asc(dailyRollups.dayNumber));
}

/** The last day that has readings, or null. */
export async function findLastRollupDay(db: Db, journalId: string): Promise<number | null> {
  const [row] = await db
    .select({ day: dailyRollups.dayNumber })
    .from(dailyRollups)
    .where(and(eq(dailyRollups.journalId, journalId), eq(dailyRollups.part, "day")))
    .orderBy(desc(dailyRollups.dayNumber))
    .limit(1);
  return row?.day ?? null;
}

/** Replace the figures of the given days; days that have no row in `rows` end up without one. */
export async function replaceRollups(tx: Db, journalId: string, days: ReadonlyArray<number>, rows: ReadonlyArray<RollupRow>): Promise<void> {
  if (days.length === 0) return;
  await tx.delete(dailyRollups).where(and(eq(dailyRollups.journalId, journalId), inArray(dailyRollups.dayNumber, [...days])));
  for (let i = 0; i < rows.length; i += 500) await tx.insert(dailyRollups).values(rows.slice(i, i + 500));
}
