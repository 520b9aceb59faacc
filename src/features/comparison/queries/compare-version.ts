import "server-only";
import type { Db } from "@/db/client";
import type { JournalRow } from "@/db/repositories/journals";
import type { VersionRow } from "@/db/repositories/versions";
import { authorize, type Actor } from "@/domain/access/policy";
import { compare, type Comparison } from "@/domain/comparison/compare";
import { governedParts } from "@/domain/comparison/governed-parts";
import { primaryOutcome } from "@/domain/comparison/outcomes";
import { programmedMeans } from "@/domain/comparison/programmed";
import { dayNumberOf } from "@/domain/day-start";
import { isoDayOf } from "@/domain/iso-day";
import { profileDifference } from "@/domain/settings/difference";
import { dayData, type DayData } from "./day-data";

/** How far back a comparison looks: 28 days before, and earlier versions for their day-to-day swings. */
const REACH_BACK_DAYS = 92;

export type ComparedVersion = Readonly<{ comparison: Comparison; version: VersionRow; parent: VersionRow; data: DayData }>;

/** Versions that were in effect, oldest first, with the civil day each began. */
export function livedVersions(versions: ReadonlyArray<VersionRow>, zone: string) {
  return versions
    .flatMap((version) => (version.effectiveFrom ? [{ version, day: dayNumberOf(isoDayOf(version.effectiveFrom, zone)) }] : []))
    .toSorted((a, b) => a.version.number - b.version.number);
}

/** The comparison of one version with the one in effect before it; null for the first, or one never in effect. */
export async function compareVersion(
  ctx: { actor: Actor; db: Db; now: () => Date },
  journal: JournalRow,
  versions: ReadonlyArray<VersionRow>,
  number: number,
): Promise<ComparedVersion | null> {
  authorize(ctx.actor, "comparison.read", journal.id);
  const lived = livedVersions(versions, journal.timeZone);
  const at = lived.findIndex(({ version }) => version.number === number);
  const [current, parent, next] = [lived[at], lived[at - 1], lived[at + 1]];
  if (!current || !parent) return null;
  const { version, day: changeDay } = current;
  const difference = profileDifference(parent.version.profile, version.profile);
  const isBundle = difference.families.length > 1;
  const outcome = primaryOutcome(version.expectation, isBundle);
  const yesterday = dayNumberOf(isoDayOf(ctx.now(), journal.timeZone)) - 1;
  const lastDay = next ? next.day - 1 : yesterday;
  const needsEvents = outcome.startsWith("breakfast") || outcome.startsWith("lunch") || outcome.startsWith("dinner") || outcome.startsWith("correction");
  const data = await dayData(ctx, journal, { firstDay: changeDay - REACH_BACK_DAYS, lastDay }, needsEvents);
  const first = lived[0];
  const comparison = compare({
    version: version.number,
    against: parent.version.number,
    changeDay,
    lastDay,
    hasVersionEnded: next !== undefined,
    outcome,
    isBundle,
    isAimFewerHighs: version.expectation?.outcome !== "lows",
    targetHighMgDl: Math.max(...parent.version.profile.target.map((t) => t.highMgDl)),
    earlierChanges: lived.slice(0, at).map(({ version: v, day }, i) => {
      const before = lived[i - 1]?.version;
      return { day, parts: before ? governedParts(profileDifference(before.profile, v.profile)) : ["night", "breakfast", "lunch", "dinner", "corrections"] };
    }),
    systemStartDay: first ? first.day : null,
    series: data.series,
    below54Percent: data.below54Percent,
    insulin: data.insulin,
    programmed: programmedMeans(parent.version.profile),
  });
  return { comparison, version, parent: parent.version, data };
}
