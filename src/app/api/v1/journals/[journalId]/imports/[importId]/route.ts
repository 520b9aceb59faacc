import { importDetail } from "@/features/glucose/queries/imports";
import { undoImport } from "@/features/glucose/use-cases/undo-import";
import { apiRoute, json } from "@/lib/api";

/** How an import stands, and what came of it. */
export const GET = apiRoute(async (ctx, _request, { journalId = "", importId = "" }) => {
  const { found, refusals } = await importDetail(ctx, { journalId, importId });
  return json({
    importId, status: found.status, rows: found.rowCount, accepted: found.acceptedCount, duplicates: found.duplicateCount,
    refusedCount: found.refusedCount, refused: refusals, firstAt: found.firstAt, lastAt: found.lastAt, unit: found.unit, unitEvidence: found.unitEvidence,
  });
});

/** Take it out again, whole. */
export const DELETE = apiRoute(async (ctx, _request, { journalId = "", importId = "" }) => json(await undoImport(ctx, { journalId, importId })));
