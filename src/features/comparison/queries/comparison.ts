import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { listDayFlags } from "@/db/repositories/entries";
import { listReadings } from "@/db/repositories/readings";
import { listVersions } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import { describeFinding } from "@/domain/comparison/finding";
import type { OutcomeId } from "@/domain/comparison/outcomes";
import { timeOfDayBands } from "@/domain/comparison/time-of-day";
import { civilOf } from "@/domain/civil-time";
import { dayStart } from "@/domain/day-start";
import { AppError } from "@/domain/errors";
import { isoDayOfNumber } from "@/domain/iso-day";
import { DAY_FLAGS } from "@/domain/journal/day-flag";
import { profileDifference } from "@/domain/settings/difference";
import { differenceLines } from "@/domain/settings/difference-text";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";
import { comparisonInput } from "../schema";
import { compareVersion, livedVersions } from "./compare-version";

/** Everything the Compare page shows of one version. @throws {AppError} NOT_FOUND for a version with nothing before it */
export async function comparisonOf(ctx: Context, input: { journalId: string; number: number | string }) {
  const { journalId, number } = comparisonInput.parse(input);
  authorize(ctx.actor, "comparison.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const versions = await listVersions(ctx.db, journalId);
  const compared = await compareVersion(ctx, journal, versions, number);
  if (!compared) throw new AppError("NOT_FOUND", `nothing before version ${number}`);
  const { comparison, version, parent, data } = compared;
  await recordRead(ctx, journalId, `comparison of version ${number}`);
  const { sides } = comparison;
  const shownOutcome: OutcomeId = comparison.verdict === "more-lows" ? "day-lows" : comparison.outcome;
  const firstShown = Math.max(sides.before.first, comparison.days.changeDay - 29);
  const flags = await listDayFlags(ctx.db, journalId, firstShown, comparison.days.lastDay);
  return {
    journal, version, parent, comparison,
    finding: describeFinding(comparison, journal.glucoseUnit),
    lines: differenceLines(profileDifference(parent.profile, version.profile), journal.glucoseUnit),
    bands: await bands(ctx, journal, comparison),
    shownOutcome,
    /** Clean days after, of what is shown. */
    cleanAfter: shownOutcome === "day-lows" ? (comparison.lows.effect?.nAfter ?? 0) : comparison.after.length,
    series: data.series[shownOutcome].filter(({ day }) => day >= firstShown && day <= comparison.days.lastDay),
    flags: flags.map((flag) => ({ label: DAY_FLAGS[flag.code].label, firstDay: flag.firstDay, lastDay: flag.lastDay, note: flag.note })),
    comparable: livedVersions(versions, journal.timeZone).slice(1).map(({ version: v }) => v.number).toReversed(),
  };
}

export type ComparisonView = Awaited<ReturnType<typeof comparisonOf>>;

/** Before and after by time of day, from the very days the comparison used. */
async function bands(
  ctx: Context,
  journal: { id: string; timeZone: string },
  comparison: { before: ReadonlyArray<{ day: number }>; after: ReadonlyArray<{ day: number }> },
) {
  const side = async (days: ReadonlyArray<{ day: number }>) => {
    const [first, last] = [days[0]?.day, days.at(-1)?.day];
    if (first === undefined || last === undefined) return [];
    const used = new Set(days.map(({ day }) => day));
    const at = (day: number) => dayStart(isoDayOfNumber(day), journal.timeZone);
    const readings = await listReadings(ctx.db, journal.id, at(first), at(last + 1));
    return timeOfDayBands(
      readings.flatMap(({ at: instant, glucoseMgDl }) => {
        const { dayNumber, minuteOfDay } = civilOf(instant.getTime(), journal.timeZone);
        return used.has(dayNumber) ? [{ minute: minuteOfDay, glucoseMgDl }] : [];
      }),
    );
  };
  return { before: await side(comparison.before), after: await side(comparison.after) };
}
