import { createHash } from "node:crypto";
import type { Pool } from "@/db/client";
import { insertImport, insertReadings } from "@/db/repositories/imports";
import { insertDeliveries } from "@/db/repositories/insulin";
import { replaceRollups } from "@/db/repositories/rollups";
import { bandOf } from "@/domain/glucose/band";
import { rollUp } from "@/domain/glucose/daily-rollup";
import type { DemoStory } from "@/domain/simulator/demo-story";
import type { DemoClock } from "./demo-clock";

const SLOT_MINUTES = 5;

/** The demo's trace and insulin up to now, with their roll-ups, as one import. */
export async function seedGlucose(
  db: Pool,
  story: DemoStory,
  target: { journalId: string; ownerId: string; dayOne: string; now: Date },
  at: DemoClock,
): Promise<void> {
  const { journalId, ownerId, now } = target;
  const seen = new Set<number>();
  const rows = story.rows.flatMap((row) => {
    const atMs = at(row).getTime();
    if (atMs > now.getTime() || seen.has(atMs)) return [];
    seen.add(atMs);
    return [{ ...row, atMs }];
  });
  const readings = rows.map((row, i) => ({
    line: i + 2, atMs: row.atMs, sourceValue: row.glucoseMgDl, sourceUnit: "mg/dL" as const, glucoseMgDl: row.glucoseMgDl, bound: null, band: bandOf(row.glucoseMgDl, "mg/dL"),
  }));
  const importId = await insertImport(db, {
    journalId, status: "done", fileName: "first-month.csv", fileHash: createHash("sha256").update(JSON.stringify(readings)).digest("hex"), byteCount: readings.length * 21,
    source: "file", unit: "mg/dL", timeZone: story.timeZone, rowCount: readings.length, acceptedCount: readings.length, createdBy: ownerId, createdAt: now, finishedAt: now,
    firstAt: new Date(readings[0]?.atMs ?? 0), lastAt: new Date(readings.at(-1)?.atMs ?? 0),
  });
  for (let i = 0; i < readings.length; i += 5000) await insertReadings(db, { journalId, importId, source: "file" }, readings.slice(i, i + 5000));
  const rollups = rollUp(readings, story.timeZone).map((row) => ({ ...row, journalId }));
  await replaceRollups(db, journalId, [...new Set(rollups.map((r) => r.dayNumber))], rollups);
  await insertDeliveries(
    db,
    rows.flatMap((row) => [
      { journalId, source: "file", at: new Date(row.atMs), kind: "basal" as const, milliUnits: row.basalMilliUnits, durationMinutes: SLOT_MINUTES },
      ...(row.bolusMilliUnits > 0 ? [{ journalId, source: "file", at: new Date(row.atMs), kind: "bolus" as const, milliUnits: row.bolusMilliUnits, durationMinutes: 0 }] : []),
    ]),
  );
}
