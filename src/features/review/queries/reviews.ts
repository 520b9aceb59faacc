import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { listRollups } from "@/db/repositories/rollups";
import { listReviews } from "@/db/repositories/version-reviews";
import { findVersion, listProposed } from "@/db/repositories/versions";
import { findAccount } from "@/db/repositories/accounts";
import { authorize, requireUser } from "@/domain/access/policy";
import { activeFraction } from "@/domain/comparison/day-series";
import { dayNumberOf } from "@/domain/day-start";
import { AppError } from "@/domain/errors";
import { isoDayOf } from "@/domain/iso-day";
import { profileDifference } from "@/domain/settings/difference";
import { differenceLines } from "@/domain/settings/difference-text";
import type { StartingProfileAnswer } from "@/domain/settings/starting-answer";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";
import { reviewPageInput } from "../schema";

const DATA_DAYS = 14;

/** Proposals that wait for this educator, longest first, with lows and gate reasons marked. */
export async function reviewQueue(ctx: Context) {
  authorize(ctx.actor, "review.list");
  const actor = requireUser(ctx.actor);
  const journalIds = actor.grants.filter((g) => g.role === "educator").map((g) => g.journalId);
  const waiting = await listProposed(ctx.db, journalIds);
  return {
    isLicensed: actor.isLicensed,
    waiting: await Promise.all(
      waiting.map(async (version) => {
        const journal = await findJournal(ctx.db, version.journalId);
        const owner = journal ? await findAccount(ctx.db, journal.ownerId) : undefined;
        const figures = journal ? await lastDays(ctx, journal.id, journal.timeZone) : null;
        return {
          journalId: version.journalId, number: version.number, kind: version.kind, since: version.stateSince,
          personName: owner?.displayName ?? "", hasLows: (figures?.below70Fraction ?? 0) >= 0.04, gateReasons: journal?.gateReasons ?? [],
        };
      }),
    ),
  };
}

/** Everything an educator needs for one decision, on one page. @throws {AppError} NOT_FOUND, FORBIDDEN */
export async function reviewPage(ctx: Context, input: { journalId: string; number: number | string }) {
  const { journalId, number } = reviewPageInput.parse(input);
  authorize(ctx.actor, "version.review", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const version = await findVersion(ctx.db, journalId, number);
  if (!journal || !version) throw new AppError("NOT_FOUND", `version ${number}`);
  const parent = version.parentNumber === null ? undefined : await findVersion(ctx.db, journalId, version.parentNumber);
  const owner = await findAccount(ctx.db, journal.ownerId);
  await recordRead(ctx, journalId, `proposal of version ${number}`);
  return {
    journal, version, parent: parent ?? null,
    personName: owner?.displayName ?? "",
    lines: parent ? differenceLines(profileDifference(parent.profile, version.profile), journal.glucoseUnit) : [],
    arithmetic: (version.arithmetic ?? null) as StartingProfileAnswer | null,
    figures: await lastDays(ctx, journalId, journal.timeZone),
    reviews: (await listReviews(ctx.db, journalId)).filter((r) => r.number === number),
  };
}

export type ReviewView = Awaited<ReturnType<typeof reviewPage>>;

/** The last days' figures, with how much of them there is. */
async function lastDays(ctx: Context, journalId: string, zone: string) {
  const today = dayNumberOf(isoDayOf(ctx.now(), zone));
  const rows = await listRollups(ctx.db, journalId, "day", today - DATA_DAYS, today - 1);
  const readings = rows.reduce((sum, r) => sum + r.readings, 0);
  const share = (bands: number[]) => (readings === 0 ? null : rows.reduce((sum, r) => sum + bands.reduce((s, b) => s + (r.bandCounts[b] ?? 0), 0), 0) / readings);
  return {
    days: rows.filter((r) => activeFraction(r) >= 0.7).length,
    meanMgDl: readings === 0 ? null : rows.reduce((sum, r) => sum + r.sumMgDl, 0) / readings,
    inRangeFraction: share([2]), below70Fraction: share([0, 1]), below54Fraction: share([0]),
  };
}
