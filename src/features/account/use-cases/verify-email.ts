import "server-only";
import { markEmailVerified } from "@/db/repositories/accounts";
import { spendEmailToken } from "@/db/repositories/email-tokens";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { hashSecret } from "@/lib/secrets";
import { verifyEmailInput } from "../schema";

/** Spend a verification link. @throws {AppError} INVALID_INPUT on `token` when it was used or has run out */
export async function verifyEmail(ctx: Context, input: { token: string }): Promise<{ userId: string }> {
  const { token } = verifyEmailInput.parse(input);
  authorize(ctx.actor, "account.enter");
  return ctx.db.transaction(async (tx) => {
    const userId = await spendEmailToken(tx, { tokenHash: hashSecret(token), purpose: "verify-email", at: ctx.now() });
    if (!userId) throw new AppError("INVALID_INPUT", "link spent", { token: ["This link was used already or has run out. Sign in to have a new one sent."] });
    await markEmailVerified(tx, userId, ctx.now());
    return { userId };
  });
}
