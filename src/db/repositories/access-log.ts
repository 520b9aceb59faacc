import { and, desc, eq, lt, notLike } from "drizzle-orm";
import type { Db } from "@/db/client";
import { accessLog } from "@/db/schema/journals";
import { users } from "@/db/schema/people";

/** How the log names what was read for a digest, at its head. */
export const DIGEST_READ = "digest: ";

export async function insertAccess(db: Db, access: typeof accessLog.$inferInsert): Promise<void> {
  await db.insert(accessLog).values(access);
}

/** Who looked at a journal, newest first. */
export async function listAccess(db: Db, journalId: string, limit: number) {
  return db
    .select({ at: accessLog.at, name: users.displayName, role: accessLog.role, what: accessLog.what })
    .from(accessLog)
    .innerJoin(users, eq(users.id, accessLog.userId))
    .where(eq(accessLog.journalId, journalId))
    .orderBy(desc(accessLog.at))
    .limit(limit);
}

/** When somebody last looked for themselves, before `before`: what a digest told them does not count. */
export async function findLastLook(db: Db, journalId: string, userId: string, before: Date): Promise<Date | null> {
  const [row] = await db
    .select({ at: accessLog.at })
    .from(accessLog)
    .where(and(eq(accessLog.journalId, journalId), eq(accessLog.userId, userId), lt(accessLog.at, before), notLike(accessLog.what, `${DIGEST_READ}%`)))
    .orderBy(desc(accessLog.at))
    .limit(1);
  return row?.at ?? null;
}
