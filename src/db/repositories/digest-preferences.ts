import { eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { digestPreferences } from "@/db/schema/mail";
import { DEFAULT_DIGEST_PREFERENCE, type DigestPreference } from "@/domain/digest/preference";

/** What an account chose, or the choice that stands before any was made. */
export async function findDigestPreference(db: Db, userId: string): Promise<DigestPreference> {
  const [row] = await db
    .select({
      level: digestPreferences.level,
      weekday: digestPreferences.weekday,
      minuteOfDay: digestPreferences.minuteOfDay,
      isToldOfComments: digestPreferences.isToldOfComments,
    })
    .from(digestPreferences)
    .where(eq(digestPreferences.userId, userId));
  return row ?? DEFAULT_DIGEST_PREFERENCE;
}

export async function saveDigestPreference(db: Db, userId: string, preference: DigestPreference, at: Date): Promise<void> {
  const values = { ...preference, updatedAt: at };
  await db
    .insert(digestPreferences)
    .values({ userId, ...values })
    .onConflictDoUpdate({ target: digestPreferences.userId, set: values });
}

/** End a reader's digests and leave the rest of the choice as it is. */
export async function switchDigestOff(db: Db, userId: string, at: Date): Promise<void> {
  await db
    .insert(digestPreferences)
    .values({ userId, ...DEFAULT_DIGEST_PREFERENCE, level: "off", updatedAt: at })
    .onConflictDoUpdate({ target: digestPreferences.userId, set: { level: "off", updatedAt: at } });
}
