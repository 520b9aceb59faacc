import { and, eq, gt, isNull } from "drizzle-orm";
import type { Db } from "@/db/client";
import { emailTokens, type EmailTokenPurpose } from "@/db/schema/people";

export async function insertEmailToken(
  db: Db,
  token: { tokenHash: string; userId: string; purpose: EmailTokenPurpose; createdAt: Date; expiresAt: Date },
): Promise<void> {
  await db.insert(emailTokens).values(token);
}

/** Use up a link: true for exactly one caller, within its time, and never again. @returns whose it was */
export async function spendEmailToken(
  db: Db,
  token: { tokenHash: string; purpose: EmailTokenPurpose; at: Date },
): Promise<string | null> {
  const [row] = await db
    .update(emailTokens)
    .set({ usedAt: token.at })
    .where(
      and(
        eq(emailTokens.tokenHash, token.tokenHash),
        eq(emailTokens.purpose, token.purpose),
        isNull(emailTokens.usedAt),
        gt(emailTokens.expiresAt, token.at),
      ),
    )
    .returning({ userId: emailTokens.userId });
  return row?.userId ?? null;
}
