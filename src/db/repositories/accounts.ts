import { count, eq, isNull } from "drizzle-orm";
import type { Db } from "@/db/client";
import { credentials, users } from "@/db/schema/people";
import type { GlucoseUnit } from "@/domain/units";

/** An account with what the actor is built from. */
export async function findAccount(db: Db, userId: string) {
  const [row] = await db
    .select({
      id: users.id,
      email: users.email,
      displayName: users.displayName,
      timeZone: users.timeZone,
      glucoseUnit: users.glucoseUnit,
      emailVerifiedAt: users.emailVerifiedAt,
      isAdministrator: users.isAdministrator,
      closedAt: users.closedAt,
      licenceVerifiedAt: credentials.verifiedAt,
      licenceExpiresOn: credentials.expiresOn,
    })
    .from(users)
    .leftJoin(credentials, eq(credentials.userId, users.id))
    .where(eq(users.id, userId));
  return row;
}

/** The account of an e-mail address with its password hash, for sign-in only. */
export async function findAccountByEmail(db: Db, email: string) {
  const [row] = await db
    .select({
      id: users.id,
      email: users.email,
      displayName: users.displayName,
      passwordHash: users.passwordHash,
      emailVerifiedAt: users.emailVerifiedAt,
      closedAt: users.closedAt,
    })
    .from(users)
    .where(eq(users.email, email.toLowerCase()));
  return row;
}

/** Adds an account unless its e-mail address has one; says whether it did. */
export async function insertAccount(
  db: Db,
  account: {
    email: string;
    displayName: string;
    passwordHash: string;
    timeZone: string;
    glucoseUnit: GlucoseUnit;
    createdAt: Date;
    emailVerifiedAt?: Date;
    isAdministrator?: boolean;
  },
): Promise<string | null> {
  const [row] = await db
    .insert(users)
    .values({ ...account, email: account.email.toLowerCase() })
    .onConflictDoNothing({ target: users.email })
    .returning({ id: users.id });
  return row?.id ?? null;
}

export async function markEmailVerified(db: Db, userId: string, at: Date): Promise<void> {
  await db.update(users).set({ emailVerifiedAt: at }).where(eq(users.id, userId));
}

export async function setPasswordHash(db: Db, userId: string, passwordHash: string): Promise<void> {
  await db.update(users).set({ passwordHash }).where(eq(users.id, userId));
}

export async function updateAccount(
  db: Db,
  userId: string,
  changes: { displayName: string; timeZone: string; glucoseUnit: GlucoseUnit },
): Promise<void> {
  await db.update(users).set(changes).where(eq(users.id, userId));
}

/** How many accounts there are, and how many of them have verified their address. */
export async function countAccounts(db: Db): Promise<{ all: number; verified: number }> {
  const [row] = await db.select({ all: count(), verified: count(users.emailVerifiedAt) }).from(users).where(isNull(users.closedAt));
  return row ?? { all: 0, verified: 0 };
}
