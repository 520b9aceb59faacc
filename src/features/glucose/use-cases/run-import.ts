import "server-only";
import { Readable } from "node:stream";
import { parse } from "csv-parse";
import type { Db } from "@/db/client";
import { claimImport, dropChunks, findImport, insertReadings, insertRefusals, readChunks, updateImport } from "@/db/repositories/imports";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { PARSER_OPTIONS } from "@/domain/exchange/csv/dialect";
import { RowMapper, type CsvMapping, type MappedReading, type Refusal } from "@/domain/exchange/csv/row-mapper";
import { civilOf } from "@/domain/civil-time";
import type { Context } from "@/lib/context";
import { errorFields, logEvent } from "@/lib/log";
import { REFUSALS_KEPT, ROWS_A_STATEMENT, ROWS_AT_MOST, STALLED_AFTER_MS } from "../constants";
import { refreshRollups } from "../queries/refresh-rollups";
import { runImportInput, type RunImportInput } from "../schema";

export type ImportCounts = { rows: number; accepted: number; duplicates: number; refused: number; passedOver: number };

/**
 * Read an uploaded file as settled and store its readings: all of it or
 * nothing, roll-ups in the same transaction. Importing the same file again adds
 * no row. A run that was killed leaves nothing and can be started again.
 *
 * @throws {AppError} CONFLICT while another run has it or when it was read already; TOO_LARGE beyond the row limit
 */
export async function runImport(ctx: Context, input: RunImportInput): Promise<ImportCounts> {
  const { journalId, importId, ...mapping } = runImportInput.parse(input);
  authorize(ctx.actor, "glucose.import", journalId);
  const { userId } = requireUser(ctx.actor);
  const found = await findImport(ctx.db, journalId, importId);
  const journal = await findJournal(ctx.db, journalId);
  if (!found || !journal) throw new AppError("NOT_FOUND", `import ${importId}`);
  const at = ctx.now();
  if (!(await claimImport(ctx.db, journalId, importId, at, new Date(at.getTime() - STALLED_AFTER_MS)))) {
    throw new AppError("CONFLICT", `import ${importId} is ${found.status}`);
  }
  try {
    return await ctx.db.transaction(async (tx) => {
      const target = { journalId, importId, source: sourceOf(mapping) };
      const { counts, days, firstMs, lastMs, refusals } = await storeRows(tx, ctx, target, mapping, journal.timeZone);
      await insertRefusals(tx, journalId, importId, refusals);
      await refreshRollups({ ...ctx, db: tx }, journal, days);
      await updateImport(tx, journalId, importId, {
        status: "done", mapping, unit: mapping.unit, timeZone: mapping.timeZone, source: target.source,
        rowCount: counts.rows, acceptedCount: counts.accepted, duplicateCount: counts.duplicates, refusedCount: counts.refused,
        firstAt: firstMs === null ? null : new Date(firstMs), lastAt: lastMs === null ? null : new Date(lastMs), finishedAt: ctx.now(),
      });
      await dropChunks(tx, journalId, importId);
      await appendEvent(tx, { journalId, at: ctx.now(), actorId: userId, actorKind: "user", action: "glucose.import", subject: `import ${importId}`, details: { ...counts }, requestId: ctx.requestId });
      return counts;
    });
  } catch (error) {
    const reason = error instanceof AppError && error.code === "TOO_LARGE" ? `The file has more than ${ROWS_AT_MOST} rows.` : "It stopped before the end. Nothing was stored.";
    await updateImport(ctx.db, journalId, importId, { status: "stopped", stopReason: reason });
    logEvent("error", "import.stopped", { requestId: ctx.requestId, importId, ...errorFields(error) });
    throw error;
  }
}

/** One person of a file of several is a source of its own; nothing is ever averaged across sources. */
function sourceOf(mapping: CsvMapping): string {
  return mapping.subject ? `file:${mapping.subject}` : "file";
}

async function storeRows(tx: Db, ctx: Context, target: { journalId: string; importId: string; source: string }, mapping: CsvMapping, zone: string) {
  const mapper = new RowMapper(mapping);
  const counts: ImportCounts = { rows: 0, accepted: 0, duplicates: 0, refused: 0, passedOver: 0 };
  const refusals: Refusal[] = [];
  const days = new Set<number>();
  let batch: MappedReading[] = [];
  let firstMs: number | null = null;
  let lastMs: number | null = null;

  const flush = async () => {
    const added = await insertReadings(tx, target, batch);
    counts.accepted += added;
    counts.duplicates += batch.length - added;
    batch = [];
    await updateImport(ctx.db, target.journalId, target.importId, { rowCount: counts.rows, heartbeatAt: ctx.now() });
  };
  for await (const { record, line } of rowsOf(readChunks(tx, target.journalId, target.importId), mapping)) {
    counts.rows += 1;
    if (counts.rows > ROWS_AT_MOST) throw new AppError("TOO_LARGE", `more than ${ROWS_AT_MOST} rows`);
    const outcome = mapper.map(record, line);
    if ("reading" in outcome) {
      const { reading } = outcome;
      batch.push(reading);
      days.add(civilOf(reading.atMs, zone).dayNumber);
      firstMs = firstMs === null ? reading.atMs : Math.min(firstMs, reading.atMs);
      lastMs = lastMs === null ? reading.atMs : Math.max(lastMs, reading.atMs);
      if (batch.length >= ROWS_A_STATEMENT) await flush();
    } else if ("refusal" in outcome) {
      counts.refused += 1;
      if (refusals.length < REFUSALS_KEPT) refusals.push(outcome.refusal);
    } else if ("duplicate" in outcome) counts.duplicates += 1;
    else counts.passedOver += 1;
  }
  await flush();
  return { counts, days: [...days], firstMs, lastMs, refusals };
}

/** The file's rows below its header, with their line numbers, streamed. */
async function* rowsOf(chunks: AsyncIterable<Buffer>, mapping: CsvMapping): AsyncGenerator<{ record: string[]; line: number }> {
  const decoder = new TextDecoder(mapping.encoding);
  async function* text() {
    for await (const chunk of chunks) yield decoder.decode(chunk, { stream: true });
    yield decoder.decode();
  }
  const parser = Readable.from(text()).pipe(parse({ ...PARSER_OPTIONS, delimiter: mapping.delimiter, info: true }));
  let index = -1;
  for await (const { record, info } of parser as AsyncIterable<{ record: string[]; info: { lines: number } }>) {
    index += 1;
    if (index > mapping.headerRow) yield { record, line: info.lines };
  }
}
