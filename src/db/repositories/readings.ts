import { and, asc, eq, gte, lt } from "drizzle-orm";
import type { Db } from "@/db/client";
import { glucoseReadings } from "@/db/schema/glucose";

/** Readings of an interval in order of time, the end excluded. Bands: 0 very low … 4 very high. */
export async function listReadings(db: Db, journalId: string, from: Date, to: Date) {
  return db
    .select({ at: glucoseReadings.at, glucoseMgDl: glucoseReadings.glucoseMgDl, band: glucoseReadings.band, bound: glucoseReadings.bound })
    .from(glucoseReadings)
    .where(and(eq(glucoseReadings.journalId, journalId), gte(glucoseReadings.at, from), lt(glucoseReadings.at, to)))
    .orderBy(asc(glucoseReadings.at));
}

/** The same with the source of each reading, in order of source and time. */
export async function listReadingsBySource(db: Db, journalId: string, from: Date, to: Date) {
  return db
    .select({ source: glucoseReadings.source, at: glucoseReadings.at, glucoseMgDl: glucoseReadings.glucoseMgDl, band: glucoseReadings.band })
    .from(glucoseReadings)
    .where(and(eq(glucoseReadings.journalId, journalId), gte(glucoseReadings.at, from), lt(glucoseReadings.at, to)))
    .orderBy(asc(glucoseReadings.source), asc(glucoseReadings.at));
}
