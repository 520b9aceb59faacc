import { desc, eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { accessLog } from "@/db/schema/journals";
import { users } from "@/db/schema/people";

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
