import "server-only";
import { findAccount, setPasswordHash } from "@/db/repositories/accounts";
import { spendEmailToken } from "@/db/repositories/email-tokens";
import { insertMail } from "@/db/repositories/outbox";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { hashPassword } from "@/lib/passwords";
import { hashSecret } from "@/lib/secrets";
import { PasswordChangedMail } from "../emails/password-changed-mail";
import { resetPasswordInput } from "../schema";

/**
 * Spend a reset link and set the new password. The caller ends all sessions;
 * nobody is signed in by it.
 *
 * @throws {AppError} INVALID_INPUT on `token` when the link was used or has run out
 */
export async function resetPassword(ctx: Context, input: { token: string; password: string }): Promise<{ userId: string }> {
  const { token, password } = resetPasswordInput.parse(input);
  authorize(ctx.actor, "account.enter");
  const passwordHash = await hashPassword(password);
  const mail = await renderMail(PasswordChangedMail({ signedOut: "Every device was signed out." }));
  return ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    const userId = await spendEmailToken(tx, { tokenHash: hashSecret(token), purpose: "reset-password", at });
    const account = userId ? await findAccount(tx, userId) : undefined;
    if (!userId || !account) throw new AppError("INVALID_INPUT", "link spent", { token: ["This link was used already or has run out. Ask for a new one."] });
    await setPasswordHash(tx, userId, passwordHash);
    await insertMail(tx, { ...mail, kind: "password-changed", recipientId: userId, toAddress: account.email, subject: "Your password was changed", dedupeKey: `password-changed/${hashSecret(token)}`, requestId: ctx.requestId, createdAt: at });
    return { userId };
  });
}
