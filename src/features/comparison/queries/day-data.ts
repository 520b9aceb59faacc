import "server-only";
import type { Db } from "@/db/client";
import { listDayFlags, listEntries } from "@/db/repositories/entries";
import { listInsulinByDay } from "@/db/repositories/insulin";
import type { JournalRow } from "@/db/repositories/journals";
import { listReadings } from "@/db/repositories/readings";
import { listRollups } from "@/db/repositories/rollups";
import { authorize, type Actor } from "@/domain/access/policy";
import { civilOf } from "@/domain/civil-time";
import type { InsulinDay } from "@/domain/comparison/adjusted";
import { seriesOf } from "@/domain/comparison/day-series";
import type { DayValue } from "@/domain/comparison/day-value";
import { eventSeries } from "@/domain/comparison/event-series";
import { MEAL_STARTS } from "@/domain/comparison/governed-parts";
import type { OutcomeId } from "@/domain/comparison/outcomes";
import { dayStart } from "@/domain/day-start";
import { isoDayOfNumber } from "@/domain/iso-day";
import { DAY_FLAGS, daysLeftOut, FLAG_REACH_DAYS } from "@/domain/journal/day-flag";

const WHOLE_LOG_FRACTION = 0.95;
const NIGHT_MINUTES = 360;

export type DayData = Readonly<{
  series: Readonly<Record<OutcomeId, ReadonlyArray<DayValue>>>;
  below54Percent: ReadonlyArray<DayValue>;
  insulin: Readonly<{ night: ReadonlyArray<InsulinDay>; day: ReadonlyArray<InsulinDay> }>;
  days: Awaited<ReturnType<typeof listRollups>>;
}>;

/** Everything the engine may look at between two days, from roll-ups; raw rows only for hours after meals or corrections. */
export async function dayData(
  ctx: { actor: Actor; db: Db },
  journal: JournalRow,
  span: { firstDay: number; lastDay: number },
  needsEvents: boolean,
): Promise<DayData> {
  authorize(ctx.actor, "comparison.read", journal.id);
  const { firstDay, lastDay } = span;
  const from = dayStart(isoDayOfNumber(firstDay), journal.timeZone);
  const to = dayStart(isoDayOfNumber(lastDay + 1), journal.timeZone);
  const [days, nights, flags, insulinDays, meals] = await Promise.all([
    listRollups(ctx.db, journal.id, "day", firstDay, lastDay),
    listRollups(ctx.db, journal.id, "night", firstDay, lastDay),
    listDayFlags(ctx.db, journal.id, firstDay - FLAG_REACH_DAYS, lastDay + FLAG_REACH_DAYS),
    listInsulinByDay(ctx.db, journal.id, journal.timeZone, from, to),
    listEntries(ctx.db, journal.id, from, to, "meal"),
  ]);
  const leftOut = new Map(flags.flatMap((flag) => daysLeftOut(flag).map((day) => [day, DAY_FLAGS[flag.code].label.toLowerCase()] as const)));
  const events = needsEvents ? await eventOutcomes(ctx.db, journal, from, to, meals, leftOut) : NO_EVENTS;
  const carbs = new Map<number, number>();
  for (const { at, data } of meals) {
    const day = civilOf(at.getTime(), journal.timeZone).dayNumber;
    if (data.kind === "meal") carbs.set(day, (carbs.get(day) ?? 0) + data.carbohydrateGrams);
  }
  const glucoseOf = (rows: typeof days) => new Map(rows.map((r) => [r.dayNumber, r]));
  const [byDay, byNight] = [glucoseOf(days), glucoseOf(nights)];
  return {
    days,
    series: {
      "day-time-in-range": seriesOf(days, "inRangePercent", leftOut),
      "day-mean": seriesOf(days, "meanMgDl", leftOut),
      "day-lows": seriesOf(days, "below70Percent", leftOut),
      "night-mean": seriesOf(nights, "meanMgDl", leftOut),
      "night-time-in-range": seriesOf(nights, "inRangePercent", leftOut),
      ...events,
    },
    below54Percent: seriesOf(days, "below54Percent", leftOut),
    insulin: {
      night: insulinDays.flatMap((r) => {
        const night = byNight.get(r.day);
        if (!night || r.nightBasalMinutes < WHOLE_LOG_FRACTION * NIGHT_MINUTES) return [];
        return [{ day: r.day, glucoseMgDl: night.sumMgDl / night.readings, insulinUnits: r.nightMilliUnits / 1000, carbohydrateGrams: 0 }];
      }),
      day: insulinDays.flatMap((r) => {
        const day = byDay.get(r.day);
        if (!day || r.basalMinutes < WHOLE_LOG_FRACTION * day.minutesInPart) return [];
        return [{ day: r.day, glucoseMgDl: day.sumMgDl / day.readings, insulinUnits: r.milliUnits / 1000, carbohydrateGrams: carbs.get(r.day) ?? 0 }];
      }),
    },
  };
}

type Events = Pick<DayData["series"], "breakfast-mean" | "lunch-mean" | "dinner-mean" | "correction-in-range">;
const NO_EVENTS: Events = { "breakfast-mean": [], "lunch-mean": [], "dinner-mean": [], "correction-in-range": [] };

async function eventOutcomes(
  db: Db,
  journal: JournalRow,
  from: Date,
  to: Date,
  meals: Awaited<ReturnType<typeof listEntries>>,
  leftOut: ReadonlyMap<number, string>,
): Promise<Events> {
  const readings = (await listReadings(db, journal.id, from, to)).map((r) => ({ atMs: r.at.getTime(), glucoseMgDl: r.glucoseMgDl, isInRange: r.band === 2 }));
  const doses = await listEntries(db, journal.id, from, to, "dose");
  const placed = (rows: typeof meals) =>
    rows.map((row) => {
      const { dayNumber, minuteOfDay } = civilOf(row.at.getTime(), journal.timeZone);
      return { atMs: row.at.getTime(), day: dayNumber, minute: minuteOfDay, data: row.data };
    });
  const atMeals = placed(meals).filter(({ data }) => data.kind === "meal" && data.carbohydrateGrams >= 15);
  const corrections = placed(doses).filter(({ data }) => data.kind === "dose" && data.doseKind === "correction");
  const window = { from: 0, to: 240, value: "mean", intervalMinutes: 5 } as const;
  const meal = ([start, end]: readonly [number, number]) =>
    eventSeries(atMeals.filter(({ minute }) => start <= minute && minute < end), readings, window, leftOut);
  return {
    "breakfast-mean": meal(MEAL_STARTS.breakfast),
    "lunch-mean": meal(MEAL_STARTS.lunch),
    "dinner-mean": meal(MEAL_STARTS.dinner),
    "correction-in-range": eventSeries(corrections, readings, { from: 120, to: 240, value: "in-range", intervalMinutes: 5 }, leftOut),
  };
}
