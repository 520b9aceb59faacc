import { asc, eq, isNull } from "drizzle-orm";
import type { Db } from "@/db/client";
import { credentials, users } from "@/db/schema/people";

/** Hand in or renew a licence; a new text ends an earlier verification unless one is given. */
export async function upsertCredential(
  db: Db,
  credential: {
    userId: string;
    profession: string;
    licenceNumber: string;
    jurisdiction: string;
    expiresOn: string;
    submittedAt: Date;
    verifiedAt?: Date;
    verifiedBy?: string;
  },
): Promise<void> {
  const values = { ...credential, verifiedAt: credential.verifiedAt ?? null, verifiedBy: credential.verifiedBy ?? null };
  await db.insert(credentials).values(values).onConflictDoUpdate({ target: credentials.userId, set: values });
}

export async function findCredential(db: Db, userId: string) {
  const [row] = await db.select().from(credentials).where(eq(credentials.userId, userId));
  return row;
}

/** Licences that wait for an administrator, longest first. */
export async function listUnverifiedCredentials(db: Db) {
  return db
    .select({
      userId: credentials.userId,
      displayName: users.displayName,
      profession: credentials.profession,
      licenceNumber: credentials.licenceNumber,
      jurisdiction: credentials.jurisdiction,
      expiresOn: credentials.expiresOn,
      submittedAt: credentials.submittedAt,
    })
    .from(credentials)
    .innerJoin(users, eq(users.id, credentials.userId))
    .where(isNull(credentials.verifiedAt))
    .orderBy(asc(credentials.submittedAt));
}

export async function markCredentialVerified(db: Db, userId: string, verifiedBy: string, at: Date): Promise<boolean> {
  const rows = await db
    .update(credentials)
    .set({ verifiedAt: at, verifiedBy })
    .where(eq(credentials.userId, userId))
    .returning({ userId: credentials.userId });
  return rows.length > 0;
}
