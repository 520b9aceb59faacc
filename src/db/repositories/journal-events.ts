import { desc, eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { journalEvents } from "@/db/schema/journals";

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
