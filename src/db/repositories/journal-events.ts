import { and, desc, eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { journalEvents } from "@/db/schema/journals";
import { users } from "@/db/schema/people";

export type JournalEvent = {
  journalId: string;
  at: Date;
  actorId: string | null;
  actorKind: "user" | "job";
  /** The policy's action, which is also what happened. */
  action: string;
  subject: string;
  details?: Record<string, unknown>;
  requestId: string;
};

/** Append what happened, in the transaction of the change, so that neither exists without the other. */
export async function appendEvent(db: Db, event: JournalEvent): Promise<void> {
  await db.insert(journalEvents).values({ ...event, details: event.details ?? {} });
}

export async function listEvents(db: Db, journalId: string, limit: number) {
  return db.select().from(journalEvents).where(eq(journalEvents.journalId, journalId)).orderBy(desc(journalEvents.at)).limit(limit);
}

/** The last time something happened, with the name of who did it; undefined when it never did. */
export async function findLastEvent(db: Db, journalId: string, action: string) {
  const [row] = await db
    .select({ at: journalEvents.at, actorId: journalEvents.actorId, actorName: users.displayName, details: journalEvents.details })
    .from(journalEvents)
    .leftJoin(users, eq(users.id, journalEvents.actorId))
    .where(and(eq(journalEvents.journalId, journalId), eq(journalEvents.action, action)))
    .orderBy(desc(journalEvents.at))
    .limit(1);
  return row;
}
