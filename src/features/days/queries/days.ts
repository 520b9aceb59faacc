import "server-only";
import { listDayFlags, listEntries } from "@/db/repositories/entries";
import { findJournal } from "@/db/repositories/journals";
import { listReadings } from "@/db/repositories/readings";
import { findLastRollupDay, listRollups } from "@/db/repositories/rollups";
import { listVersions } from "@/db/repositories/versions";
import { authorize, can } from "@/domain/access/policy";
import { civilOf } from "@/domain/civil-time";
import { activeFraction, MEASURES } from "@/domain/comparison/day-series";
import { dayNumberOf, dayStart } from "@/domain/day-start";
import { AppError } from "@/domain/errors";
import { isoDayOf, isoDayOfNumber } from "@/domain/iso-day";
import { DAY_FLAGS } from "@/domain/journal/day-flag";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";
import { dayInput, journalInput } from "../schema";

const DAYS_LISTED = 90;

/** The days that have glucose, newest first, from their roll-ups. */
export async function daysOf(ctx: Context, input: { journalId: string }) {
  const { journalId } = journalInput.parse(input);
  authorize(ctx.actor, "glucose.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const last = (await findLastRollupDay(ctx.db, journalId)) ?? dayNumberOf(isoDayOf(ctx.now(), journal.timeZone));
  const [rows, flags] = await Promise.all([
    listRollups(ctx.db, journalId, "day", last - DAYS_LISTED, last),
    listDayFlags(ctx.db, journalId, last - DAYS_LISTED, last),
  ]);
  await recordRead(ctx, journalId, "days");
  return rows.toReversed().map((row) => ({
    isoDay: isoDayOfNumber(row.dayNumber),
    dayOfJournal: journal.startedOn ? row.dayNumber - dayNumberOf(journal.startedOn) + 1 : null,
    inRangePercent: MEASURES.inRangePercent(row),
    below70Percent: MEASURES.below70Percent(row),
    meanMgDl: MEASURES.meanMgDl(row),
    activeFraction: activeFraction(row),
    flags: flags.filter((f) => f.firstDay <= row.dayNumber && row.dayNumber <= f.lastDay).map((f) => DAY_FLAGS[f.code].label),
  }));
}

/** One civil day: its trace, what was logged, what was flagged, the version in effect. */
export async function dayOf(ctx: Context, input: { journalId: string; date: string }) {
  const { journalId, date } = dayInput.parse(input);
  authorize(ctx.actor, "glucose.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const [from, to] = [dayStart(date, journal.timeZone), dayStart(date, journal.timeZone, 1)];
  const day = dayNumberOf(date);
  const maySeeEntries = can(ctx.actor, "entry.read", journalId);
  const [readings, entries, flags, versions] = await Promise.all([
    listReadings(ctx.db, journalId, from, to),
    maySeeEntries ? listEntries(ctx.db, journalId, from, to) : Promise.resolve([]),
    listDayFlags(ctx.db, journalId, day, day),
    listVersions(ctx.db, journalId),
  ]);
  await recordRead(ctx, journalId, `day ${date}`);
  const minuteOf = (instant: Date) => civilOf(instant.getTime(), journal.timeZone).minuteOfDay;
  const inEffect = versions.find((v) => v.effectiveFrom && v.effectiveFrom < to && (!v.effectiveUntil || v.effectiveUntil > from));
  return {
    journal, date,
    dayOfJournal: journal.startedOn ? day - dayNumberOf(journal.startedOn) + 1 : null,
    points: readings.map((r) => ({ minute: minuteOf(r.at), glucoseMgDl: r.glucoseMgDl })),
    entries: entries.map((e) => ({ id: e.id, minute: minuteOf(e.at), data: e.data, authorName: e.authorName })),
    flags: flags.map((f) => ({ label: DAY_FLAGS[f.code].label, note: f.note })),
    version: inEffect ? { number: inEffect.number, since: inEffect.effectiveFrom } : null,
  };
}

export type DayView = Awaited<ReturnType<typeof dayOf>>;
