import { and, between, eq, gte, isNull, lt, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { entries } from "@/db/schema/diary";
import { dailyRollups } from "@/db/schema/glucose";

/**
 * Whole civil days of one journal added up from their roll-ups, both ends
 * included. `coveredMinutes` is what the readings stand for, of `minutes`.
 *
 * @param firstDay days since 1970-01-01
 */
export async function addUpGlucoseDays(db: Db, journalId: string, firstDay: number, lastDay: number) {
  const [row] = await db
    .select({
      days: sql<number>`count(*) filter (where ${dailyRollups.readings} > 0)::int`,
      readings: sql<number>`coalesce(sum(${dailyRollups.readings}), 0)::int`,
      below: sql<number>`coalesce(sum(${dailyRollups.bandCounts}[1] + ${dailyRollups.bandCounts}[2]), 0)::int`,
      inRange: sql<number>`coalesce(sum(${dailyRollups.bandCounts}[3]), 0)::int`,
      coveredMinutes: sql<number>`coalesce(sum(least(${dailyRollups.readings} * ${dailyRollups.intervalMinutes}, ${dailyRollups.minutesInPart})), 0)::int`,
    })
    .from(dailyRollups)
    .where(and(eq(dailyRollups.journalId, journalId), eq(dailyRollups.part, "day"), between(dailyRollups.dayNumber, firstDay, lastDay)));
  return row ?? { days: 0, readings: 0, below: 0, inRange: 0, coveredMinutes: 0 };
}

/** On how many civil days of a zone something was logged, from `from` until before `until`. */
export async function countLoggedDays(db: Db, journalId: string, from: Date, until: Date, zone: string): Promise<number> {
  const [row] = await db
    .select({ days: sql<number>`count(distinct (${entries.at} at time zone ${zone})::date)::int` })
    .from(entries)
    .where(and(eq(entries.journalId, journalId), isNull(entries.removedAt), gte(entries.at, from), lt(entries.at, until)));
  return row?.days ?? 0;
}
