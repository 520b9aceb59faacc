import { and, asc, desc, eq, isNull, lt, lte, or, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { outbox } from "@/db/schema/mail";
import type { DigestBasis } from "@/domain/digest/basis";

export type NewMail = {
  /** Given where something else has to point at it. */
  id?: string;
  kind: string;
  journalId?: string;
  recipientId?: string;
  toAddress: string;
  subject: string;
  html: string;
  text: string;
  headers?: Record<string, string>;
  basis?: DigestBasis;
  /** Same key, same mail: it is written once, however often this is called. */
  dedupeKey: string;
  requestId: string;
  createdAt: Date;
};

/** Write a mail to be sent, in the caller's transaction. @returns its id, or null when the key was there already */
export async function insertMail(db: Db, mail: NewMail): Promise<string | null> {
  const [row] = await db
    .insert(outbox)
    .values({ ...mail, headers: mail.headers ?? {}, state: "waiting", nextAttemptAt: mail.createdAt })
    .onConflictDoNothing({ target: outbox.dedupeKey })
    .returning({ id: outbox.id });
  return row?.id ?? null;
}

export type LeasedMail = typeof outbox.$inferSelect;

/** Take the next due mail for this worker alone until `leaseUntil`; a dead worker's lease runs out. */
export async function leaseMail(db: Db, now: Date, leaseUntil: Date): Promise<LeasedMail | undefined> {
  const due = db
    .select({ id: outbox.id })
    .from(outbox)
    .where(
      and(
        eq(outbox.state, "waiting"),
        lte(outbox.nextAttemptAt, now),
        or(isNull(outbox.leaseUntil), lt(outbox.leaseUntil, now)),
      ),
    )
    .orderBy(asc(outbox.nextAttemptAt))
    .limit(1)
    .for("update", { skipLocked: true });
  const [row] = await db
    .update(outbox)
    .set({ leaseUntil, attempts: sql`${outbox.attempts} + 1` })
    .where(eq(outbox.id, sql`(${due})`))
    .returning();
  return row;
}

export async function markSent(db: Db, id: string, providerId: string, at: Date): Promise<void> {
  await db.update(outbox).set({ state: "sent", providerId, sentAt: at, leaseUntil: null, lastError: "" }).where(eq(outbox.id, id));
}

export async function markForRetry(db: Db, id: string, nextAttemptAt: Date, error: string): Promise<void> {
  await db.update(outbox).set({ nextAttemptAt, leaseUntil: null, lastError: error }).where(eq(outbox.id, id));
}

export async function markEnded(db: Db, id: string, state: "dropped" | "dead", error: string): Promise<void> {
  await db.update(outbox).set({ state, leaseUntil: null, lastError: error }).where(eq(outbox.id, id));
}

/** What the administrator sees of the mail: counts and addresses' kinds, never contents. */
export async function countMailByState(db: Db) {
  return db
    .select({ state: outbox.state, kind: outbox.kind, count: sql<number>`count(*)::int` })
    .from(outbox)
    .groupBy(outbox.state, outbox.kind)
    .orderBy(desc(outbox.state));
}
