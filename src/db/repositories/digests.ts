import { and, eq, gt, isNotNull, isNull, ne, or, sql } from "drizzle-orm";
import type { Db } from "@/db/client";
import { digestPreferences, digests } from "@/db/schema/mail";
import { journalGrants } from "@/db/schema/journals";
import { users } from "@/db/schema/people";
import { DEFAULT_DIGEST_PREFERENCE } from "@/domain/digest/preference";

const { level, weekday, minuteOfDay } = DEFAULT_DIGEST_PREFERENCE;

/** The latest ISO week of a reader that has its digest. */
const lastIsoWeek = sql<string | null>`(select max(${digests.isoWeek}) from ${digests} where ${digests.userId} = ${users.id})`;

/** Not before the first grant that counts, nor before the present choice was made. */
const since = sql<Date>`greatest(min(${journalGrants.grantedAt}), max(${digestPreferences.updatedAt}))`.mapWith(users.createdAt);

/** Everyone who may get digests: verified, not closed, in some journal, and not switched off. */
export async function listDigestReaders(db: Db, now: Date, userId?: string) {
  return db
    .select({
      userId: users.id,
      timeZone: users.timeZone,
      weekday: sql<number>`coalesce(max(${digestPreferences.weekday}), ${weekday})::int`,
      minuteOfDay: sql<number>`coalesce(max(${digestPreferences.minuteOfDay}), ${minuteOfDay})::int`,
      since,
      lastIsoWeek,
    })
    .from(users)
    .innerJoin(
      journalGrants,
      and(
        eq(journalGrants.userId, users.id),
        isNull(journalGrants.revokedAt),
        or(isNull(journalGrants.expiresAt), gt(journalGrants.expiresAt, now)),
      ),
    )
    .leftJoin(digestPreferences, eq(digestPreferences.userId, users.id))
    .where(
      and(
        isNotNull(users.emailVerifiedAt),
        isNull(users.closedAt),
        ne(sql`coalesce(${digestPreferences.level}, ${level})`, "off"),
        userId === undefined ? undefined : eq(users.id, userId),
      ),
    )
    .groupBy(users.id);
}

/** Claim a reader's week: true for exactly one caller. In the transaction of the mail it belongs to. */
export async function insertDigest(tx: Db, digest: typeof digests.$inferInsert): Promise<boolean> {
  const rows = await tx.insert(digests).values(digest).onConflictDoNothing().returning({ userId: digests.userId });
  return rows.length > 0;
}

/** Give a week free again whose mail was dropped unsent, so that it is written anew. */
export async function releaseDigest(db: Db, outboxId: string): Promise<void> {
  await db.delete(digests).where(eq(digests.outboxId, outboxId));
}
