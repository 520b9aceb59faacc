import "server-only";
import { findImport, listImports, listRefusals, readChunks } from "@/db/repositories/imports";
import { findJournal } from "@/db/repositories/journals";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { previewCsv, type CsvPreview } from "@/domain/exchange/csv/preview";
import type { Context } from "@/lib/context";
import { PREVIEW_BYTES } from "../constants";
import { importInput, journalInput } from "../schema";

const REFUSALS_SHOWN = 200;

/** The files brought into a journal, newest first. */
export async function importsOf(ctx: Context, input: { journalId: string }) {
  const { journalId } = journalInput.parse(input);
  authorize(ctx.actor, "glucose.import", journalId);
  return listImports(ctx.db, journalId);
}

/** One import: its preview while it waits, its report once it is done. @throws {AppError} NOT_FOUND */
export async function importDetail(ctx: Context, input: { journalId: string; importId: string }) {
  const { journalId, importId } = importInput.parse(input);
  authorize(ctx.actor, "glucose.import", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const found = await findImport(ctx.db, journalId, importId);
  if (!journal || !found) throw new AppError("NOT_FOUND", `import ${importId}`);
  const isOpen = found.status === "uploaded" || found.status === "stopped" || found.status === "running";
  return {
    journal, found,
    preview: isOpen ? await previewOf(ctx, journalId, importId) : null,
    refusals: await listRefusals(ctx.db, journalId, importId, REFUSALS_SHOWN),
  };
}

async function previewOf(ctx: Context, journalId: string, importId: string): Promise<CsvPreview | null> {
  const pieces: Buffer[] = [];
  let size = 0;
  for await (const piece of readChunks(ctx.db, journalId, importId)) {
    pieces.push(piece);
    size += piece.byteLength;
    if (size >= PREVIEW_BYTES) break;
  }
  const preview = previewCsv(Buffer.concat(pieces).subarray(0, PREVIEW_BYTES));
  return typeof preview === "string" ? null : preview;
}
