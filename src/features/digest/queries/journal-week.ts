import "server-only";
import { DIGEST_READ, findLastLook } from "@/db/repositories/access-log";
import { findAccount } from "@/db/repositories/accounts";
import { listOpenQuestions } from "@/db/repositories/comments";
import { findJournal } from "@/db/repositories/journals";
import { listVersions, type VersionRow } from "@/db/repositories/versions";
import { addUpGlucoseDays, countLoggedDays } from "@/db/repositories/week-figures";
import { subjectText } from "@/domain/access/comment-place";
import { readableSubjects } from "@/domain/access/comment-subject";
import { authorize, can, type Action, type Actor, type Grant } from "@/domain/access/policy";
import { dayNumberOf, dayStart } from "@/domain/day-start";
import { isoDayOf } from "@/domain/iso-day";
import { followUpsOf } from "@/domain/digest/follow-ups";
import { versionNews } from "@/domain/digest/version-news";
import type { FindingOf, GlucoseShares, JournalWeek } from "@/domain/digest/week";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";

/** Findings told of one journal at most: the present version and what it replaced. */
const FINDINGS_AT_MOST = 4;
const MINUTES_PER_DAY = 1440;

export type WeekInput = Readonly<{
  reader: Extract<Actor, { type: "user" }>;
  readerZone: string;
  grant: Grant;
  /** The seven civil days, as ISO dates, and the day after them. */
  from: string;
  to: string;
  today: string;
  areFindingsWanted: boolean;
}>;

/**
 * One journal over a week, cut to what both the reader may see and the caller
 * may read. Changes are told over the week, to a helper since their own last look.
 *
 * @returns `null` when the journal is gone
 */
export async function journalWeek(ctx: Context, input: WeekInput, findingOf: FindingOf): Promise<JournalWeek | null> {
  const { reader, readerZone: zone, grant: { journalId, role }, from, to, today } = input;
  authorize(ctx.actor, "journal.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const owner = journal ? await findAccount(ctx.db, journal.ownerId) : undefined;
  if (!journal || !owner) return null;

  const may = (action: Action) => can(reader, action, journalId) && can(ctx.actor, action, journalId);
  const span = { from: dayStart(from, zone), until: dayStart(today, zone) };
  const look = role === "mentor" || role === "family" ? await findLastLook(ctx.db, journalId, reader.userId, ctx.now()) : null;
  const versions = may("version.read") ? await listVersions(ctx.db, journalId) : null;
  const told = may("comparison.read") && input.areFindingsWanted ? (versions ?? []).filter((version) => wasInEffect(version, span)) : [];
  await recordRead(ctx, journalId, `${DIGEST_READ}the week`);
  const questions = await listOpenQuestions(ctx.db, journalId, readableSubjects(reader, journalId), ctx.now());
  const week = may("glucose.read") ? await addUp(ctx, journalId, to, 7) : null;
  const fortnight = week && role === "educator" ? await addUp(ctx, journalId, to, 14) : null;

  return {
    journalId,
    name: journal.name,
    ownerName: owner.displayName,
    role,
    lookedOn: look ? isoDayOf(look, zone) : null,
    versions: versions && versionNews(versions, look ? { from: look, until: ctx.now() } : span, zone),
    findings: await findingsOf(journalId, told, findingOf),
    glucoseDays: week?.daysWithReadings ?? null,
    loggedDays: may("entry.read")
      ? await countLoggedDays(ctx.db, journalId, dayStart(from, journal.timeZone), dayStart(to, journal.timeZone, 1), journal.timeZone)
      : null,
    week: week?.shares ?? null,
    fortnight: fortnight?.shares ?? null,
    questions: questions
      .filter(({ authorId }) => authorId !== reader.userId)
      .map(({ authorName, subject, subjectKey }) => ({ askedBy: authorName, about: subjectText(subject, subjectKey) })),
    waiting: (versions ?? [])
      .filter(({ state }) => state === "proposed")
      .map(({ number, stateSince }) => ({ versionNumber: number, since: isoDayOf(stateSince, zone) }))
      .toSorted((a, b) => a.since.localeCompare(b.since)),
    followUps: followUpsOf(versions ?? [], today),
  };
}

function wasInEffect({ effectiveFrom, effectiveUntil, parentNumber }: VersionRow, span: { from: Date; until: Date }): boolean {
  if (!effectiveFrom || parentNumber === null) return false;
  return effectiveFrom < span.until && (effectiveUntil === null || effectiveUntil >= span.from);
}

async function findingsOf(journalId: string, versions: ReadonlyArray<VersionRow>, findingOf: FindingOf) {
  const found: { versionNumber: number; text: string }[] = [];
  for (const { number } of versions.slice(0, FINDINGS_AT_MOST)) {
    const text = await findingOf(journalId, number);
    if (text) found.push({ versionNumber: number, text });
  }
  return found;
}

async function addUp(ctx: Context, journalId: string, to: string, days: number): Promise<{ daysWithReadings: number; shares: GlucoseShares | null }> {
  const last = dayNumberOf(to);
  const sum = await addUpGlucoseDays(ctx.db, journalId, last - days + 1, last);
  if (sum.readings === 0) return { daysWithReadings: 0, shares: null };
  const shares = {
    days,
    inRangeFraction: sum.inRange / sum.readings,
    belowFraction: sum.below / sum.readings,
    coveredFraction: Math.min(1, sum.coveredMinutes / (days * MINUTES_PER_DAY)),
  };
  return { daysWithReadings: sum.days, shares };
}
