import "server-only";
import type { Db } from "@/db/client";
import { listDayFlags } from "@/db/repositories/entries";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { listCircle } from "@/db/repositories/grants";
import type { JournalRow } from "@/db/repositories/journals";
import { listRollups } from "@/db/repositories/rollups";
import { listVersions } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import { dayNumberOf } from "@/domain/day-start";
import { DAY_FLAGS } from "@/domain/journal/day-flag";
import type { ReadinessFacts } from "@/domain/journal/readiness";
import type { Context } from "@/lib/context";

const LOOK_BACK_DAYS = 30;

/** What the readiness list looks at, but for the person's own ticks of the day; within the caller's transaction where there is one. */
export async function readinessFacts(
  ctx: Omit<Context, "db"> & { db: Db },
  { journal, startDay }: { journal: JournalRow; startDay: string },
): Promise<Omit<ReadinessFacts, "hasKetoneStrips" | "hasFastCarbohydrate">> {
  authorize(ctx.actor, "journal.edit", journal.id);
  const card = await findFallbackCard(ctx.db, journal.id);
  const versions = await listVersions(ctx.db, journal.id);
  const day = dayNumberOf(startDay);
  const glucose = await listRollups(ctx.db, journal.id, "day", day - LOOK_BACK_DAYS, day);
  const flags = await listDayFlags(ctx.db, journal.id, day, day);
  const circle = await listCircle(ctx.db, journal.id, ctx.now());
  return {
    isGateOpen: journal.gateReasons === null ? null : journal.gateReasons.length === 0,
    startingState: versions.find(({ kind }) => kind === "starting")?.state ?? null,
    hasPreviousSetup: (card?.previousSetup ?? "") !== "",
    hasBackUpDose: (card?.longActingMilliUnits ?? card?.rapidMilliUnits ?? null) !== null,
    hasContact: (card?.contacts.length ?? 0) > 0,
    daysOfGlucose: glucose.filter(({ readings }) => readings > 0).length,
    hasMentor: circle.some(({ role }) => role === "mentor"),
    flagsOnStartDay: flags.flatMap(({ code }) => (code in DAY_FLAGS ? [DAY_FLAGS[code]] : [])).filter(({ effect }) => effect === "leave-out").map(({ label }) => label),
  };
}
