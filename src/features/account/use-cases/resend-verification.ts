import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { insertEmailToken } from "@/db/repositories/email-tokens";
import { insertMail } from "@/db/repositories/outbox";
import { authorize, requireUser } from "@/domain/access/policy";
import { env } from "@/env";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { countAttempt } from "@/lib/rate-limit";
import { hashSecret, newSecret } from "@/lib/secrets";
import { VERIFY_LINK_HOURS } from "../constants";
import { VerifyEmailMail } from "../emails/verify-email-mail";

/** Send the verification link once more to the signed-in account. @throws {AppError} TOO_MANY */
export async function resendVerification(ctx: Context): Promise<void> {
  authorize(ctx.actor, "account.use");
  const { userId, isEmailVerified } = requireUser(ctx.actor);
  if (isEmailVerified) return;
  await countAttempt(ctx.db, "reset-password", userId);
  const account = await findAccount(ctx.db, userId);
  if (!account) return;
  const secret = newSecret();
  const mail = await renderMail(VerifyEmailMail({ name: account.displayName, href: `${env.publicOrigin}/verify-email?token=${secret}` }));
  await ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    const expiresAt = new Date(at.getTime() + VERIFY_LINK_HOURS * 3_600_000);
    await insertEmailToken(tx, { tokenHash: hashSecret(secret), userId, purpose: "verify-email", createdAt: at, expiresAt });
    await insertMail(tx, { ...mail, kind: "verify-email", recipientId: userId, toAddress: account.email, subject: "Verify your e-mail address", dedupeKey: `verify-email/${hashSecret(secret)}`, requestId: ctx.requestId, createdAt: at });
  });
}
