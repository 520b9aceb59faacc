import "server-only";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { findLastEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { listVersions, type VersionRow } from "@/db/repositories/versions";
import { authorize, can } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { backUpDoses } from "@/domain/settings/fallback";
import type { StartingProfileAnswer } from "@/domain/settings/starting-answer";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";
import { z } from "zod";

/**
 * The way back: what was before, whom to call, the back-up doses as written down
 * and by whom, and the published back-up arithmetic. With a closed gate the
 * arithmetic shows once an educator has approved, and to the educator.
 */
export async function fallbackCard(ctx: Context, input: { journalId: string }) {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "fallback.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const card = (await findFallbackCard(ctx.db, journalId)) ?? null;
  const versions = await listVersions(ctx.db, journalId);
  const written = await findLastEvent(ctx.db, journalId, "fallback.dose");
  await recordRead(ctx, journalId, "fallback card");
  const isGateOpen = journal.gateReasons !== null && journal.gateReasons.length === 0;
  const mayWriteDoses = can(ctx.actor, "fallback.dose", journalId);
  const isShown = (version: VersionRow) => version.approvedHash !== null || isGateOpen || mayWriteDoses;
  const current = versions.find((v) => v.state === "in-effect" && isShown(v)) ?? null;
  const basis = current ?? versions.find((v) => ["approved", "proposed"].includes(v.state) && isShown(v)) ?? null;
  const isEducators =
    card !== null && written !== undefined && written.details.longActingMilliUnits === card.longActingMilliUnits && written.details.rapidMilliUnits === card.rapidMilliUnits;
  return {
    card,
    current,
    basis: basis ? { number: basis.number, state: basis.state } : null,
    backUp: basis ? backUpDoses(basis.profile.basal, dailyDoseOfStart(versions)) : [],
    writtenBy: isEducators ? { name: written.actorName ?? "an educator", at: written.at } : null,
    mayWriteDoses,
    mayEdit: can(ctx.actor, "fallback.write", journalId),
  };
}

/** The pump dose that the start was worked out from, as stored beside it. */
function dailyDoseOfStart(versions: ReadonlyArray<VersionRow>): number | null {
  const arithmetic = versions.find(({ kind }) => kind === "starting")?.arithmetic as StartingProfileAnswer | null | undefined;
  return arithmetic?.totalDailyDose.cautious ?? null;
}
