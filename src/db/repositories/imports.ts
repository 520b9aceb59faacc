import { and, asc, desc, eq, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { glucoseReadings, importChunks, importRefusals, imports } from "@/db/schema/glucose";
import type { MappedReading, Refusal } from "@/domain/exchange/csv/row-mapper";

export type ImportRow = typeof imports.$inferSelect;

export async function insertImport(db: Db, row: typeof imports.$inferInsert): Promise<string> {
  const [inserted] = await db.insert(imports).values(row).returning({ id: imports.id });
  if (!inserted) throw new Error("insert returned no row");
  return inserted.id;
}

export async function insertChunk(db: Db, chunk: { journalId: string; importId: string; seq: number; bytes: Buffer }): Promise<void> {
  await db.insert(importChunks).values(chunk);
}

/** The pieces of an uploaded file, one after another. */
export async function* readChunks(db: Db, journalId: string, importId: string): AsyncGenerator<Buffer> {
  for (let seq = 0; ; seq += 1) {
    const [row] = await db
      .select({ bytes: importChunks.bytes })
      .from(importChunks)
      .where(and(eq(importChunks.journalId, journalId), eq(importChunks.importId, importId), eq(importChunks.seq, seq)));
    if (!row) return;
    yield row.bytes;
  }
}

export async function dropChunks(db: Db, journalId: string, importId: string): Promise<void> {
  await db.delete(importChunks).where(and(eq(importChunks.journalId, journalId), eq(importChunks.importId, importId)));
}

export async function findImport(db: Db, journalId: string, importId: string): Promise<ImportRow | undefined> {
  const [row] = await db.select().from(imports).where(and(eq(imports.journalId, journalId), eq(imports.id, importId)));
  return row;
}

export async function listImports(db: Db, journalId: string): Promise<ImportRow[]> {
  return db.select().from(imports).where(eq(imports.journalId, journalId)).orderBy(desc(imports.createdAt)).limit(50);
}

export async function updateImport(db: Db, journalId: string, importId: string, changes: Partial<ImportRow>): Promise<void> {
  await db.update(imports).set(changes).where(and(eq(imports.journalId, journalId), eq(imports.id, importId)));
}

/** Take an uploaded (or stalled) import for this run; false when another run has it. */
export async function claimImport(db: Db, journalId: string, importId: string, at: Date, stalledBefore: Date): Promise<boolean> {
  const rows = await db
    .update(imports)
    .set({ status: "running", heartbeatAt: at, stopReason: "", rowCount: 0 })
    .where(
      and(
        eq(imports.journalId, journalId),
        eq(imports.id, importId),
        sql`(${imports.status} in ('uploaded', 'stopped') or (${imports.status} = 'running' and ${imports.heartbeatAt} < ${stalledBefore.toISOString()}::timestamptz))`,
      ),
    )
    .returning({ id: imports.id });
  return rows.length > 0;
}

/**
 * Add readings in one statement per block. Arrays cost the same as COPY and,
 * unlike COPY through this driver, name a bad row and never hang.
 *
 * @returns how many were new
 */
export async function insertReadings(
  tx: Db,
  target: { journalId: string; importId: string; source: string },
  readings: ReadonlyArray<MappedReading>,
): Promise<number> {
  const list = (values: ReadonlyArray<string | number | null>) => sql`${sql.param(values)}`;
  const rows = await tx.execute<{ at: string }>(sql`
    insert into ${glucoseReadings} (journal_id, source, at, glucose_mg_dl, source_value, source_unit, bound, band, import_id)
    select ${target.journalId}::uuid, ${target.source}, r.at, r.mgdl, r.value, r.unit, r.bound, r.band, ${target.importId}::uuid
    from unnest(
      ${list(readings.map((r) => new Date(r.atMs).toISOString()))}::text[]::timestamptz[],
      ${list(readings.map((r) => r.glucoseMgDl))}::float8[],
      ${list(readings.map((r) => r.sourceValue))}::float4[],
      ${list(readings.map((r) => r.sourceUnit))}::text[],
      ${list(readings.map((r) => r.bound))}::text[],
      ${list(readings.map((r) => r.band))}::int2[]
    ) as r(at, mgdl, value, unit, bound, band)
    on conflict do nothing
    returning at`);
  return rows.length;
}

export async function insertRefusals(tx: Db, journalId: string, importId: string, refusals: ReadonlyArray<Refusal>): Promise<void> {
  for (let i = 0; i < refusals.length; i += 1000) {
    await tx.insert(importRefusals).values(refusals.slice(i, i + 1000).map((r) => ({ ...r, journalId, importId }))).onConflictDoNothing();
  }
}

export async function listRefusals(db: Db, journalId: string, importId: string, limit: number) {
  return db
    .select({ line: importRefusals.line, reason: importRefusals.reason, text: importRefusals.text })
    .from(importRefusals)
    .where(and(eq(importRefusals.journalId, journalId), eq(importRefusals.importId, importId)))
    .orderBy(asc(importRefusals.line))
    .limit(limit);
}

/** Take the readings of one import out again. @returns their instants, so that the days can be worked out anew */
export async function deleteReadingsOf(tx: Db, journalId: string, importId: string): Promise<Date[]> {
  const rows = await tx
    .delete(glucoseReadings)
    .where(and(eq(glucoseReadings.journalId, journalId), eq(glucoseReadings.importId, importId)))
    .returning({ at: glucoseReadings.at });
  return rows.map((r) => r.at);
}

