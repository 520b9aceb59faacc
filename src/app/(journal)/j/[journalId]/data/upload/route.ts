import { AppError } from "@/domain/errors";
import { FILE_BYTES_AT_MOST } from "@/features/glucose/constants";
import { uploadFile } from "@/features/glucose/use-cases/upload-file";
import { apiRoute } from "@/lib/api";

const FORM_OVERHEAD_BYTES = 4096;

/**
 * The upload form of the Data page, which works without script: the file is
 * kept and the browser sent on to its preview, or back with a sentence.
 */
export const POST = apiRoute(async (ctx, request, { journalId = "" }) => {
  const back = (query: string) => new Response(null, { status: 303, headers: { Location: `/j/${journalId}/data${query}` } });
  const size = Number(request.headers.get("content-length") ?? Number.NaN);
  if (!Number.isFinite(size) || size > FILE_BYTES_AT_MOST + FORM_OVERHEAD_BYTES) throw new AppError("TOO_LARGE", `${size} bytes`);
  const file = (await request.formData()).get("file");
  if (!(file instanceof File) || file.size === 0) return back("?problem=none");
  try {
    const { importId } = await uploadFile(ctx, { journalId, fileName: file.name, bytes: new Uint8Array(await file.arrayBuffer()) });
    return back(`/${importId}`);
  } catch (error) {
    if (error instanceof AppError && error.code === "INVALID_INPUT") return back("?problem=unreadable");
    throw error;
  }
});
