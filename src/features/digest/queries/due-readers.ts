import "server-only";
import { listDigestReaders } from "@/db/repositories/digests";
import { authorize } from "@/domain/access/policy";
import { isSlotDue, latestSlot } from "@/domain/digest/slot";
import type { Context } from "@/lib/context";

/** Everyone whose weekly moment has come and who has no digest for that week yet. For the job only. */
export async function dueReaders(ctx: Context): Promise<string[]> {
  authorize(ctx.actor, "digest.send");
  const nowMs = ctx.now().getTime();
  const readers = await listDigestReaders(ctx.db, ctx.now());
  return readers
    .filter((reader) => isSlotDue(latestSlot(nowMs, reader.timeZone, reader), nowMs, reader.lastIsoWeek, reader.since.getTime()))
    .map(({ userId }) => userId);
}
