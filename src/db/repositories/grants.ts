import { and, asc, eq, gt, isNull, ne, or } from "drizzle-orm";
import type { Db } from "@/db/client";
import { journalGrants, journals } from "@/db/schema/journals";
import { users } from "@/db/schema/people";
import type { Grant, JournalRole, Scope } from "@/domain/access/policy";

const isLive = (now: Date) =>
  and(isNull(journalGrants.revokedAt), or(isNull(journalGrants.expiresAt), gt(journalGrants.expiresAt, now)));

/** The grants of one account that count at `now`. */
export async function listLiveGrants(db: Db, userId: string, now: Date): Promise<Grant[]> {
  return db
    .select({ journalId: journalGrants.journalId, role: journalGrants.role, scopes: journalGrants.scopes })
    .from(journalGrants)
    .where(and(eq(journalGrants.userId, userId), isLive(now)));
}

/** The people who can come into one journal at `now`, its owner included. */
export async function listCircle(db: Db, journalId: string, now: Date) {
  return db
    .select({
      userId: journalGrants.userId,
      displayName: users.displayName,
      role: journalGrants.role,
      scopes: journalGrants.scopes,
      grantedAt: journalGrants.grantedAt,
      expiresAt: journalGrants.expiresAt,
    })
    .from(journalGrants)
    .innerJoin(users, eq(users.id, journalGrants.userId))
    .where(and(eq(journalGrants.journalId, journalId), isLive(now)))
    .orderBy(asc(journalGrants.grantedAt));
}

/** The journals an account can open, with its role in each. */
export async function listJournalsOf(db: Db, userId: string, now: Date) {
  return db
    .select({
      journalId: journals.id,
      name: journals.name,
      ownerId: journals.ownerId,
      ownerName: users.displayName,
      role: journalGrants.role,
      startedOn: journals.startedOn,
      timeZone: journals.timeZone,
    })
    .from(journalGrants)
    .innerJoin(journals, eq(journals.id, journalGrants.journalId))
    .innerJoin(users, eq(users.id, journals.ownerId))
    .where(and(eq(journalGrants.userId, userId), isLive(now)))
    .orderBy(asc(journalGrants.grantedAt));
}

/** Gives or renews a grant; a withdrawn one comes back with the new terms. */
export async function upsertGrant(
  db: Db,
  grant: {
    journalId: string;
    userId: string;
    role: JournalRole;
    scopes: Scope[];
    grantedAt: Date;
    grantedBy: string;
    expiresAt: Date | null;
  },
): Promise<void> {
  await db
    .insert(journalGrants)
    .values(grant)
    .onConflictDoUpdate({
      target: [journalGrants.journalId, journalGrants.userId],
      set: { ...grant, revokedAt: null },
    });
}

/** Ends a helper's grant, never the person's own; says whether there was a live one. */
export async function revokeGrant(db: Db, journalId: string, userId: string, at: Date): Promise<boolean> {
  const rows = await db
    .update(journalGrants)
    .set({ revokedAt: at })
    .where(and(eq(journalGrants.journalId, journalId), eq(journalGrants.userId, userId), ne(journalGrants.role, "person"), isLive(at)))
    .returning({ userId: journalGrants.userId });
  return rows.length > 0;
}

/** Change what a helper sees and until when; says whether there was a live grant to change. */
export async function limitGrant(
  db: Db,
  grant: { journalId: string; userId: string; scopes: Scope[]; expiresAt: Date | null; now: Date },
): Promise<boolean> {
  const { journalId, userId, scopes, expiresAt, now } = grant;
  const rows = await db
    .update(journalGrants)
    .set({ scopes, expiresAt })
    .where(and(eq(journalGrants.journalId, journalId), eq(journalGrants.userId, userId), ne(journalGrants.role, "person"), isLive(now)))
    .returning({ userId: journalGrants.userId });
  return rows.length > 0;
}
