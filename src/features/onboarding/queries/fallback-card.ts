import "server-only";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { findJournal } from "@/db/repositories/journals";
import { listVersions } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { backUpDoses } from "@/domain/settings/fallback";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";
import { z } from "zod";

/** The way back: what was before, the published back-up arithmetic of the version in effect, whom to call. */
export async function fallbackCard(ctx: Context, input: { journalId: string }) {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "fallback.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const card = await findFallbackCard(ctx.db, journalId);
  const current = (await listVersions(ctx.db, journalId)).find((v) => v.state === "in-effect");
  await recordRead(ctx, journalId, "fallback card");
  return { journal, card: card ?? null, current: current ?? null, backUp: current ? backUpDoses(current.profile.basal, null) : [] };
}
