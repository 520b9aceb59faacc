import { and, asc, desc, eq, inArray, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { journals } from "@/db/schema/journals";
import { users } from "@/db/schema/people";
import { settingsVersions, versionStates } from "@/db/schema/settings";
import type { VersionState } from "@/domain/journal/version-lifecycle";

export type NewVersion = typeof settingsVersions.$inferInsert;
export type VersionRow = typeof settingsVersions.$inferSelect & {
  state: VersionState;
  stateSince: Date;
  approvedHash: string | null;
  reviewOn: string | null;
  effectiveFrom: Date | null;
  effectiveUntil: Date | null;
  authorName: string;
};

/** Each number once, as it stands: its latest revision with its state. */
function selectVersions(db: Db) {
  return db
    .select({
      journalId: settingsVersions.journalId,
      number: settingsVersions.number,
      revision: settingsVersions.revision,
      parentNumber: settingsVersions.parentNumber,
      kind: settingsVersions.kind,
      profile: settingsVersions.profile,
      contentHash: settingsVersions.contentHash,
      reasonCode: settingsVersions.reasonCode,
      reasonText: settingsVersions.reasonText,
      expectation: settingsVersions.expectation,
      evidenceDays: settingsVersions.evidenceDays,
      lookAgainOn: settingsVersions.lookAgainOn,
      revertRule: settingsVersions.revertRule,
      guardrails: settingsVersions.guardrails,
      arithmetic: settingsVersions.arithmetic,
      authorId: settingsVersions.authorId,
      createdAt: settingsVersions.createdAt,
      state: versionStates.state,
      stateSince: versionStates.stateSince,
      approvedHash: versionStates.approvedHash,
      reviewOn: versionStates.reviewOn,
      effectiveFrom: versionStates.effectiveFrom,
      effectiveUntil: versionStates.effectiveUntil,
      authorName: users.displayName,
    })
    .from(versionStates)
    .innerJoin(
      settingsVersions,
      and(
        eq(settingsVersions.journalId, versionStates.journalId),
        eq(settingsVersions.number, versionStates.number),
        eq(settingsVersions.revision, versionStates.revision),
      ),
    )
    .innerJoin(users, eq(users.id, settingsVersions.authorId));
}

/** All versions of a journal, newest number first. */
export async function listVersions(db: Db, journalId: string): Promise<VersionRow[]> {
  return selectVersions(db).where(eq(versionStates.journalId, journalId)).orderBy(desc(versionStates.number));
}

export async function findVersion(db: Db, journalId: string, number: number): Promise<VersionRow | undefined> {
  const [row] = await selectVersions(db).where(and(eq(versionStates.journalId, journalId), eq(versionStates.number, number)));
  return row;
}

/** Take the journal's lock for the rest of the transaction: numbers stay gapless, races have one winner. */
export async function lockJournal(tx: Db, journalId: string): Promise<void> {
  await tx.select({ id: journals.id }).from(journals).where(eq(journals.id, journalId)).for("update");
}

/** The version as it stands, after taking the journal's lock. */
export async function findVersionForUpdate(tx: Db, journalId: string, number: number): Promise<VersionRow | undefined> {
  await lockJournal(tx, journalId);
  return findVersion(tx, journalId, number);
}

/** The next number of a journal. Call after `lockJournal`. */
export async function nextVersionNumber(tx: Db, journalId: string): Promise<number> {
  const [row] = await tx
    .select({ next: sql<number>`coalesce(max(${versionStates.number}), 0)::int + 1` })
    .from(versionStates)
    .where(eq(versionStates.journalId, journalId));
  return row?.next ?? 1;
}

/** Add an immutable snapshot; a first revision also opens its state row. */
export async function insertVersion(tx: Db, version: NewVersion, state: VersionState): Promise<void> {
  await tx.insert(settingsVersions).values(version);
  const { journalId, number, revision, createdAt } = version;
  await tx
    .insert(versionStates)
    .values({ journalId, number, revision, state, stateSince: createdAt })
    .onConflictDoUpdate({
      target: [versionStates.journalId, versionStates.number],
      set: { revision, state, stateSince: createdAt, approvedHash: null, reviewOn: null },
    });
}

/**
 * Move a version from one state to another; false when it was no longer there,
 * so that of two racing moves exactly one is told yes.
 */
export async function moveVersion(
  tx: Db,
  move: { journalId: string; number: number; from: VersionState; to: VersionState; at: Date },
  changes: Partial<Pick<VersionRow, "approvedHash" | "reviewOn" | "effectiveFrom" | "effectiveUntil">> = {},
): Promise<boolean> {
  const rows = await tx
    .update(versionStates)
    .set({ ...changes, state: move.to, stateSince: move.at })
    .where(
      and(
        eq(versionStates.journalId, move.journalId),
        eq(versionStates.number, move.number),
        eq(versionStates.state, move.from),
      ),
    )
    .returning({ number: versionStates.number });
  return rows.length > 0;
}

/** Proposals that wait in any of these journals, longest first. */
export async function listProposed(db: Db, journalIds: ReadonlyArray<string>): Promise<VersionRow[]> {
  if (journalIds.length === 0) return [];
  return selectVersions(db)
    .where(and(inArray(versionStates.journalId, [...journalIds]), eq(versionStates.state, "proposed")))
    .orderBy(asc(versionStates.stateSince));
}

/** Every revision of one number, oldest first: what was proposed, returned, mended. */
export async function listRevisions(db: Db, journalId: string, number: number) {
  return db
    .select()
    .from(settingsVersions)
    .where(and(eq(settingsVersions.journalId, journalId), eq(settingsVersions.number, number)))
    .orderBy(asc(settingsVersions.revision));
}
