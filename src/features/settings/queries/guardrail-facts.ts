import "server-only";
import { findHighestKetones, listDayFlags } from "@/db/repositories/entries";
import type { JournalRow } from "@/db/repositories/journals";
import { listRollups } from "@/db/repositories/rollups";
import type { VersionRow } from "@/db/repositories/versions";
import type { Db } from "@/db/client";
import { authorize } from "@/domain/access/policy";
import { dayNumberOf } from "@/domain/day-start";
import { isoDayOf } from "@/domain/iso-day";
import { daysLeftOut, FLAG_REACH_DAYS } from "@/domain/journal/day-flag";
import type { ChangeReason } from "@/domain/settings/change-reason";
import { profileDifference, type ProfileDifference } from "@/domain/settings/difference";
import type { GuardrailFacts } from "@/domain/settings/guardrail-facts";
import type { SettingFamily } from "@/domain/settings/family";
import type { SettingsProfile } from "@/domain/settings/profile";
import type { Context } from "@/lib/context";

const HOUR_MS = 3_600_000;
const DAY_MS = 24 * HOUR_MS;
const LOOK_BACK_DAYS = 3;

/** What the guardrails look at, gathered within the caller's transaction. */
export async function guardrailFacts(
  ctx: Omit<Context, "db"> & { db: Db },
  given: {
    journal: JournalRow;
    versions: ReadonlyArray<VersionRow>;
    difference: ProfileDifference;
    change: { profile: SettingsProfile; reason: { code: ChangeReason }; evidenceDays: ReadonlyArray<string> };
    at: Date;
    /** It goes to the educator, who decides before it can come into effect. */
    isReviewed: boolean;
  },
): Promise<GuardrailFacts> {
  const { journal, versions, difference, change, at } = given;
  authorize(ctx.actor, "version.propose", journal.id);
  const evidence = change.evidenceDays.map(dayNumberOf);
  const today = dayNumberOf(isoDayOf(at, journal.timeZone));
  const recent = await listRollups(ctx.db, journal.id, "day", today - LOOK_BACK_DAYS, today);
  const [firstDay, lastDay] = [Math.min(...evidence) - FLAG_REACH_DAYS, Math.max(...evidence) + FLAG_REACH_DAYS];
  const flags = evidence.length > 0 ? await listDayFlags(ctx.db, journal.id, firstDay, lastDay) : [];
  const leftOut = new Set(flags.flatMap(daysLeftOut));
  const readings = recent.reduce((sum, r) => sum + r.readings, 0);
  const low = recent.reduce((sum, r) => sum + (r.bandCounts[0] ?? 0) + (r.bandCounts[1] ?? 0), 0);
  const ketones = await findHighestKetones(ctx.db, journal.id, new Date(at.getTime() - DAY_MS));
  return {
    difference,
    proposed: change.profile,
    reason: change.reason.code,
    isStarting: false,
    isByEducator: false,
    lastChanged: lastChanged(versions, at),
    evidenceDays: evidence.length,
    flaggedEvidenceDays: evidence.filter((day) => leftOut.has(day)).length,
    lowFractionOfLast3Days: readings > 0 ? low / readings : null,
    highestKetonesMmolOfLast24Hours: ketones === null ? null : ketones / 1000,
    totalDailyDoseUnits: null,
    basalStepMilliUnits: journal.setup.basalStepMilliUnits,
    bolusStepMilliUnits: journal.setup.bolusStepMilliUnits,
    isGateOpen: journal.gateReasons !== null && journal.gateReasons.length === 0,
    isApproved: given.isReviewed,
    overrides: {},
  };
}

/** For each family, the last version in effect that changed it, and for how long it has been so. */
function lastChanged(versions: ReadonlyArray<VersionRow>, at: Date): GuardrailFacts["lastChanged"] {
  const lived = versions.filter((v) => v.effectiveFrom !== null).toSorted((a, b) => a.number - b.number);
  const last: Partial<Record<SettingFamily, { versionNumber: number; hours: number }>> = {};
  lived.forEach((version, i) => {
    const before = lived[i - 1];
    if (!before || !version.effectiveFrom) return;
    const hours = Math.floor((at.getTime() - version.effectiveFrom.getTime()) / HOUR_MS);
    for (const family of profileDifference(before.profile, version.profile).families) last[family] = { versionNumber: version.number, hours };
  });
  return last;
}
