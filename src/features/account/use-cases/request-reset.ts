import "server-only";
import { findAccountByEmail } from "@/db/repositories/accounts";
import { insertEmailToken } from "@/db/repositories/email-tokens";
import { insertMail } from "@/db/repositories/outbox";
import { authorize } from "@/domain/access/policy";
import { env } from "@/env";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { countAttempt } from "@/lib/rate-limit";
import { hashSecret, newSecret } from "@/lib/secrets";
import { RESET_LINK_MINUTES } from "../constants";
import { ResetPasswordMail } from "../emails/reset-password-mail";
import { requestResetInput } from "../schema";

/** Send a link to choose a new password, if there is such an account. The answer is the same either way. @throws {AppError} TOO_MANY */
export async function requestReset(ctx: Context, input: { email: string }): Promise<void> {
  const { email } = requestResetInput.parse(input);
  authorize(ctx.actor, "account.enter");
  await countAttempt(ctx.db, "reset-password", email);
  const secret = newSecret();
  const mail = await renderMail(ResetPasswordMail({ href: `${env.publicOrigin}/reset-password?token=${secret}` }));
  await ctx.db.transaction(async (tx) => {
    const account = await findAccountByEmail(tx, email);
    if (!account || account.closedAt) return;
    const at = ctx.now();
    const expiresAt = new Date(at.getTime() + RESET_LINK_MINUTES * 60_000);
    await insertEmailToken(tx, { tokenHash: hashSecret(secret), userId: account.id, purpose: "reset-password", createdAt: at, expiresAt });
    await insertMail(tx, { ...mail, kind: "reset-password", recipientId: account.id, toAddress: account.email, subject: "Choose a new password", dedupeKey: `reset-password/${hashSecret(secret)}`, requestId: ctx.requestId, createdAt: at });
  });
}
