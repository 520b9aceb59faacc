import "server-only";
import { createHash } from "node:crypto";
import { insertChunk, insertImport } from "@/db/repositories/imports";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { previewCsv } from "@/domain/exchange/csv/preview";
import type { Context } from "@/lib/context";
import { countAttempt } from "@/lib/rate-limit";
import { CHUNK_BYTES, FILE_BYTES_AT_MOST, PREVIEW_BYTES } from "../constants";
import { journalInput } from "../schema";

/**
 * Keep an uploaded file in pieces until it is decided how it is read. Nothing
 * of it counts as glucose yet.
 *
 * @throws {AppError} TOO_LARGE, or INVALID_INPUT on `file` in plain words when it is no such file
 */
export async function uploadFile(ctx: Context, input: { journalId: string; fileName: string; bytes: Uint8Array }): Promise<{ importId: string }> {
  const { journalId } = journalInput.parse(input);
  authorize(ctx.actor, "glucose.import", journalId);
  const { userId } = requireUser(ctx.actor);
  await countAttempt(ctx.db, "import", userId);
  const { bytes } = input;
  if (bytes.byteLength > FILE_BYTES_AT_MOST) throw new AppError("TOO_LARGE", `${bytes.byteLength} bytes`);
  const preview = previewCsv(bytes.subarray(0, PREVIEW_BYTES));
  if (typeof preview === "string") throw new AppError("INVALID_INPUT", "not a glucose file", { file: [preview] });

  return ctx.db.transaction(async (tx) => {
    const importId = await insertImport(tx, {
      journalId, status: "uploaded", fileName: plainFileName(input.fileName), fileHash: createHash("sha256").update(bytes).digest("hex"),
      byteCount: bytes.byteLength, source: "file", createdBy: userId, createdAt: ctx.now(),
    });
    for (let seq = 0; seq * CHUNK_BYTES < bytes.byteLength; seq += 1) {
      await insertChunk(tx, { journalId, importId, seq, bytes: Buffer.from(bytes.subarray(seq * CHUNK_BYTES, (seq + 1) * CHUNK_BYTES)) });
    }
    return { importId };
  });
}

/** A file's name for people to read, never for a path: letters, digits and a few signs. */
function plainFileName(name: string): string {
  return name.replace(/[^\p{L}\p{N} ._-]/gu, "").slice(-120) || "file";
}
