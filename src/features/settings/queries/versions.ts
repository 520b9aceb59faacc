import "server-only";
import { findJournal, type JournalRow } from "@/db/repositories/journals";
import { listReviews } from "@/db/repositories/version-reviews";
import { findVersion, listVersions, type VersionRow } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { CHANGE_REASONS } from "@/domain/settings/change-reason";
import { profileDifference } from "@/domain/settings/difference";
import { differenceLines } from "@/domain/settings/difference-text";
import { EXPECTED_DIRECTIONS, EXPECTED_OUTCOMES, EXPECTED_WINDOWS, type Expectation } from "@/domain/settings/expectation";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";
import { journalInput, versionInput } from "../schema";

export type VersionSummary = Readonly<{
  number: number;
  revision: number;
  kind: VersionRow["kind"];
  state: VersionRow["state"];
  stateSince: Date;
  lines: ReadonlyArray<string>;
  reason: string;
  expectation: string | null;
  authorName: string;
  effectiveFrom: Date | null;
  effectiveUntil: Date | null;
  reviews: ReadonlyArray<Awaited<ReturnType<typeof listReviews>>[number]>;
}>;

/** "mean glucose in the night, 00:00 to 06:00 will fall", as the person said before the data. */
export function expectationText(expectation: Expectation | null): string | null {
  if (!expectation) return null;
  return `${EXPECTED_OUTCOMES[expectation.outcome]} ${EXPECTED_WINDOWS[expectation.window]} ${EXPECTED_DIRECTIONS[expectation.direction]}`;
}

function summarise(version: VersionRow, parent: VersionRow | undefined, journal: JournalRow, reviews: VersionSummary["reviews"]): VersionSummary {
  const reason = CHANGE_REASONS[version.reasonCode as keyof typeof CHANGE_REASONS] as string | undefined;
  return {
    number: version.number, revision: version.revision, kind: version.kind, state: version.state, stateSince: version.stateSince,
    lines: parent ? differenceLines(profileDifference(parent.profile, version.profile), journal.glucoseUnit) : [],
    reason: [reason, version.reasonText].filter(Boolean).join(". "),
    expectation: expectationText(version.expectation),
    authorName: version.authorName, effectiveFrom: version.effectiveFrom, effectiveUntil: version.effectiveUntil,
    reviews: reviews.filter((r) => r.number === version.number),
  };
}

/** The journal's spine: every version, newest first, with what it changed. @throws {AppError} NOT_FOUND, FORBIDDEN */
export async function changesOf(ctx: Context, input: { journalId: string }) {
  const { journalId } = journalInput.parse(input);
  authorize(ctx.actor, "version.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const versions = await listVersions(ctx.db, journalId);
  const reviews = await listReviews(ctx.db, journalId);
  await recordRead(ctx, journalId, "changes");
  const byNumber = new Map(versions.map((v) => [v.number, v]));
  return {
    journal,
    versions: versions.map((v) => summarise(v, v.parentNumber === null ? undefined : byNumber.get(v.parentNumber), journal, reviews)),
    current: versions.find((v) => v.state === "in-effect") ?? null,
  };
}

/** One version whole, with the one it came from. @throws {AppError} NOT_FOUND, FORBIDDEN */
export async function versionDetail(ctx: Context, input: { journalId: string; number: number | string }) {
  const { journalId, number } = versionInput.parse(input);
  authorize(ctx.actor, "version.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const version = await findVersion(ctx.db, journalId, number);
  if (!journal || !version) throw new AppError("NOT_FOUND", `version ${number}`);
  const parent = version.parentNumber === null ? undefined : await findVersion(ctx.db, journalId, version.parentNumber);
  const reviews = await listReviews(ctx.db, journalId);
  await recordRead(ctx, journalId, `version ${number}`);
  return { journal, version, summary: summarise(version, parent, journal, reviews) };
}
