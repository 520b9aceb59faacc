import { and, asc, eq, gt, isNull } from "drizzle-orm";
import type { Db } from "@/db/client";
import { invitations, journals } from "@/db/schema/journals";
import { users } from "@/db/schema/people";

/** Neither accepted nor withdrawn, and within its time. */
const isOpen = (now: Date) =>
  and(isNull(invitations.acceptedAt), isNull(invitations.revokedAt), gt(invitations.expiresAt, now));

/** @returns the new invitation's id */
export async function insertInvitation(db: Db, invitation: typeof invitations.$inferInsert): Promise<string> {
  const [row] = await db.insert(invitations).values({ ...invitation, email: invitation.email.toLowerCase() }).returning({ id: invitations.id });
  if (!row) throw new Error("insert returned no row");
  return row.id;
}

/** The invitations of one journal that can still be accepted, oldest first. */
export async function listOpenInvitations(db: Db, journalId: string, now: Date) {
  return db
    .select({
      id: invitations.id,
      email: invitations.email,
      role: invitations.role,
      scopes: invitations.scopes,
      createdAt: invitations.createdAt,
      expiresAt: invitations.expiresAt,
      grantExpiresAt: invitations.grantExpiresAt,
    })
    .from(invitations)
    .where(and(eq(invitations.journalId, journalId), isOpen(now)))
    .orderBy(asc(invitations.createdAt));
}

function selectWithNames(db: Db) {
  return db
    .select({
      journalId: invitations.journalId,
      id: invitations.id,
      email: invitations.email,
      role: invitations.role,
      scopes: invitations.scopes,
      invitedBy: invitations.invitedBy,
      inviterName: users.displayName,
      journalName: journals.name,
      ownerId: journals.ownerId,
      expiresAt: invitations.expiresAt,
      grantExpiresAt: invitations.grantExpiresAt,
    })
    .from(invitations)
    .innerJoin(users, eq(users.id, invitations.invitedBy))
    .innerJoin(journals, eq(journals.id, invitations.journalId));
}

/** The open invitation behind a link, by the hash of its secret. */
export async function findOpenInvitation(db: Db, tokenHash: string, now: Date) {
  const [row] = await selectWithNames(db).where(and(eq(invitations.tokenHash, tokenHash), isOpen(now)));
  return row;
}

/** Every open invitation that was sent to one address, oldest first. */
export async function listInvitationsTo(db: Db, email: string, now: Date) {
  return selectWithNames(db).where(and(eq(invitations.email, email.toLowerCase()), isOpen(now))).orderBy(asc(invitations.createdAt));
}

/** Whether an invitation can still be accepted; asked when its mail is about to go out. */
export async function isInvitationOpen(db: Db, journalId: string, id: string, now: Date): Promise<boolean> {
  const rows = await db
    .select({ id: invitations.id })
    .from(invitations)
    .where(and(eq(invitations.journalId, journalId), eq(invitations.id, id), isOpen(now)));
  return rows.length > 0;
}

/** Use up an invitation: true for exactly one caller, within its time, and never again. */
export async function spendInvitation(
  db: Db,
  spent: { journalId: string; id: string; userId: string; at: Date },
): Promise<boolean> {
  const rows = await db
    .update(invitations)
    .set({ acceptedAt: spent.at, acceptedBy: spent.userId })
    .where(and(eq(invitations.journalId, spent.journalId), eq(invitations.id, spent.id), isOpen(spent.at)))
    .returning({ id: invitations.id });
  return rows.length > 0;
}

/** Take an invitation back; says whether it was still open. */
export async function withdrawInvitation(db: Db, journalId: string, id: string, at: Date): Promise<boolean> {
  const rows = await db
    .update(invitations)
    .set({ revokedAt: at })
    .where(and(eq(invitations.journalId, journalId), eq(invitations.id, id), isOpen(at)))
    .returning({ id: invitations.id });
  return rows.length > 0;
}

/** Take back every open invitation of a journal to one address, so that a newer one replaces it. */
export async function withdrawInvitationsTo(db: Db, journalId: string, email: string, at: Date): Promise<void> {
  await db
    .update(invitations)
    .set({ revokedAt: at })
    .where(and(eq(invitations.journalId, journalId), eq(invitations.email, email.toLowerCase()), isOpen(at)));
}
