import "server-only";
import type { Db } from "@/db/client";
import type { JournalRow } from "@/db/repositories/journals";
import { listReadingsBySource } from "@/db/repositories/readings";
import { replaceRollups } from "@/db/repositories/rollups";
import { authorize, type Actor } from "@/domain/access/policy";
import { dayStart } from "@/domain/day-start";
import { rollUp } from "@/domain/glucose/daily-rollup";
import { isoDayOfNumber } from "@/domain/iso-day";

const DAYS_AT_ONCE = 31;

/** Work out the figures of these civil days anew, in the caller's transaction. One source a day: the one with most readings. */
export async function refreshRollups(ctx: { actor: Actor; db: Db }, journal: JournalRow, days: ReadonlyArray<number>): Promise<void> {
  authorize(ctx.actor, "glucose.import", journal.id);
  const sorted = [...new Set(days)].sort((a, b) => a - b);
  while (sorted.length > 0) {
    const first = sorted[0] ?? 0;
    const stretch = sorted.splice(0, sorted.findIndex((day) => day >= first + DAYS_AT_ONCE) === -1 ? sorted.length : sorted.findIndex((day) => day >= first + DAYS_AT_ONCE));
    const last = stretch.at(-1) ?? first;
    const at = (day: number) => dayStart(isoDayOfNumber(day), journal.timeZone);
    const readings = await listReadingsBySource(ctx.db, journal.id, at(first), at(last + 1));
    const bySource = new Map<string, { atMs: number; glucoseMgDl: number; band: number }[]>();
    for (const { source, at: instant, glucoseMgDl, band } of readings) {
      const list = bySource.get(source) ?? [];
      list.push({ atMs: instant.getTime(), glucoseMgDl, band });
      bySource.set(source, list);
    }
    const fullest = new Map<string, ReturnType<typeof rollUp>[number]>();
    for (const list of bySource.values()) {
      for (const row of rollUp(list, journal.timeZone)) {
        const key = `${row.part}${row.dayNumber}`;
        const known = fullest.get(key);
        if (!known || row.readings > known.readings) fullest.set(key, row);
      }
    }
    const wanted = new Set(stretch);
    const rows = [...fullest.values()].filter((row) => wanted.has(row.dayNumber)).map((row) => ({ ...row, journalId: journal.id }));
    await replaceRollups(ctx.db, journal.id, stretch, rows);
  }
}
