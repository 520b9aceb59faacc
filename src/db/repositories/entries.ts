import { and, asc, between, desc, eq, gte, isNull, lt, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { dayFlags, entries } from "@/db/schema/diary";
import { users } from "@/db/schema/people";
import type { EntryKind } from "@/domain/journal/entry";

export type EntryRow = typeof entries.$inferSelect;
export type DayFlagRow = typeof dayFlags.$inferSelect;

export async function insertEntry(db: Db, entry: typeof entries.$inferInsert): Promise<string> {
  const [row] = await db.insert(entries).values(entry).returning({ id: entries.id });
  if (!row) throw new Error("insert returned no row");
  return row.id;
}

/** Entries within an interval that were not removed, in order of time; the end is excluded. */
export async function listEntries(db: Db, journalId: string, from: Date, to: Date, kind?: EntryKind) {
  return db
    .select({ id: entries.id, kind: entries.kind, at: entries.at, data: entries.data, createdBy: entries.createdBy, authorName: users.displayName })
    .from(entries)
    .innerJoin(users, eq(users.id, entries.createdBy))
    .where(
      and(
        eq(entries.journalId, journalId),
        gte(entries.at, from),
        lt(entries.at, to),
        isNull(entries.removedAt),
        kind ? eq(entries.kind, kind) : undefined,
      ),
    )
    .orderBy(asc(entries.at));
}

/** Hide an entry; it stays in the database with who and when. @returns false when there is none */
export async function removeEntry(db: Db, journalId: string, entryId: string, at: Date): Promise<boolean> {
  const rows = await db
    .update(entries)
    .set({ removedAt: at, updatedAt: at })
    .where(and(eq(entries.journalId, journalId), eq(entries.id, entryId), isNull(entries.removedAt)))
    .returning({ id: entries.id });
  return rows.length > 0;
}

/** The highest ketones logged since an instant, in µmol/L, or null. */
export async function findHighestKetones(db: Db, journalId: string, since: Date): Promise<number | null> {
  const [row] = await db
    .select({ highest: sql<number | null>`max((${entries.data}->>'ketonesMicroMolPerL')::int)` })
    .from(entries)
    .where(and(eq(entries.journalId, journalId), eq(entries.kind, "ketones"), gte(entries.at, since), isNull(entries.removedAt)));
  return row?.highest ?? null;
}

export async function insertDayFlag(db: Db, flag: typeof dayFlags.$inferInsert): Promise<void> {
  await db.insert(dayFlags).values(flag);
}

/** Flags that touch any day of a span, both ends included, in order. */
export async function listDayFlags(db: Db, journalId: string, firstDay: number, lastDay: number): Promise<DayFlagRow[]> {
  return db
    .select()
    .from(dayFlags)
    .where(and(eq(dayFlags.journalId, journalId), isNull(dayFlags.removedAt), gte(dayFlags.lastDay, firstDay), between(dayFlags.firstDay, firstDay - 400, lastDay)))
    .orderBy(asc(dayFlags.firstDay), desc(dayFlags.lastDay));
}

export async function removeDayFlag(db: Db, journalId: string, flagId: string, at: Date): Promise<boolean> {
  const rows = await db
    .update(dayFlags)
    .set({ removedAt: at })
    .where(and(eq(dayFlags.journalId, journalId), eq(dayFlags.id, flagId), isNull(dayFlags.removedAt)))
    .returning({ id: dayFlags.id });
  return rows.length > 0;
}
