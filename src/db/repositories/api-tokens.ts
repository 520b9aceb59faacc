import { and, desc, eq, gt, isNull } from "drizzle-orm";
import type { Db } from "@/db/client";
import { apiTokens } from "@/db/schema/operations";

/** Whose live token this is, by the hash of its secret; notes the use. */
export async function findTokenOwner(db: Db, tokenHash: string, now: Date) {
  const [row] = await db
    .update(apiTokens)
    .set({ lastUsedAt: now })
    .where(and(eq(apiTokens.tokenHash, tokenHash), isNull(apiTokens.revokedAt), gt(apiTokens.expiresAt, now)))
    .returning({ userId: apiTokens.userId, scope: apiTokens.scope });
  return row;
}

export async function insertToken(
  db: Db,
  token: { userId: string; tokenHash: string; label: string; scope: "read" | "write"; createdAt: Date; expiresAt: Date },
): Promise<void> {
  await db.insert(apiTokens).values(token);
}

/** The tokens of an account that still count, newest first; never their secrets. */
export async function listTokens(db: Db, userId: string, now: Date) {
  return db
    .select({
      id: apiTokens.id,
      label: apiTokens.label,
      scope: apiTokens.scope,
      createdAt: apiTokens.createdAt,
      expiresAt: apiTokens.expiresAt,
      lastUsedAt: apiTokens.lastUsedAt,
    })
    .from(apiTokens)
    .where(and(eq(apiTokens.userId, userId), isNull(apiTokens.revokedAt), gt(apiTokens.expiresAt, now)))
    .orderBy(desc(apiTokens.createdAt));
}

/** End a token of this account; says whether there was one that still counted. */
export async function revokeToken(db: Db, userId: string, tokenId: string, at: Date): Promise<boolean> {
  const rows = await db
    .update(apiTokens)
    .set({ revokedAt: at })
    .where(and(eq(apiTokens.id, tokenId), eq(apiTokens.userId, userId), isNull(apiTokens.revokedAt)))
    .returning({ id: apiTokens.id });
  return rows.length > 0;
}
