import { and, eq, gte, lt, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { insulinDeliveries } from "@/db/schema/glucose";

/**
 * Insulin delivered per civil day and in its 00:00-06:00, with the minutes of
 * basal that are logged, so that a caller can tell a whole log from a torn one.
 */
export async function listInsulinByDay(db: Db, journalId: string, zone: string, from: Date, to: Date) {
  const local = sql`(${insulinDeliveries.at} at time zone ${zone})`;
  const isNight = sql`extract(hour from ${local}) < 6`;
  const rows = await db
    .select({
      day: sql<number>`(${local}::date - date '1970-01-01')::int`,
      milliUnits: sql<number>`sum(${insulinDeliveries.milliUnits})::int`,
      basalMinutes: sql<number>`coalesce(sum(${insulinDeliveries.durationMinutes}) filter (where ${insulinDeliveries.kind} = 'basal'), 0)::int`,
      nightMilliUnits: sql<number>`coalesce(sum(${insulinDeliveries.milliUnits}) filter (where ${isNight}), 0)::int`,
      nightBasalMinutes: sql<number>`coalesce(sum(${insulinDeliveries.durationMinutes}) filter (where ${insulinDeliveries.kind} = 'basal' and ${isNight}), 0)::int`,
    })
    .from(insulinDeliveries)
    .where(and(eq(insulinDeliveries.journalId, journalId), gte(insulinDeliveries.at, from), lt(insulinDeliveries.at, to)))
    .groupBy(sql`1`)
    .orderBy(sql`1`);
  return rows;
}

/** Add deliveries; one that is there already stays as it is. */
export async function insertDeliveries(db: Db, rows: ReadonlyArray<typeof insulinDeliveries.$inferInsert>): Promise<void> {
  for (let i = 0; i < rows.length; i += 2000) {
    await db.insert(insulinDeliveries).values(rows.slice(i, i + 2000)).onConflictDoNothing();
  }
}
