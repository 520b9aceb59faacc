import "server-only";
import { insertAccount } from "@/db/repositories/accounts";
import { insertEmailToken } from "@/db/repositories/email-tokens";
import { insertMail } from "@/db/repositories/outbox";
import { authorize } from "@/domain/access/policy";
import { env } from "@/env";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { hashPassword } from "@/lib/passwords";
import { countAttempt } from "@/lib/rate-limit";
import { hashSecret, newSecret } from "@/lib/secrets";
import { VERIFY_LINK_HOURS } from "../constants";
import { VerifyEmailMail } from "../emails/verify-email-mail";
import { AccountExistsMail } from "../emails/account-exists-mail";
import { signUpInput, type SignUpInput } from "../schema";

/**
 * Make an account and send the link that verifies its e-mail address.
 *
 * An address that has an account already gets a mail that says so; the answer
 * on the page is the same, so that nobody learns who has an account.
 *
 * @throws {AppError} TOO_MANY
 */
export async function signUp(ctx: Context, input: SignUpInput): Promise<{ email: string; userId: string | null }> {
  const { displayName, email, password, timeZone } = signUpInput.parse(input);
  authorize(ctx.actor, "account.enter");
  await countAttempt(ctx.db, "sign-up", email);

  const secret = newSecret();
  const passwordHash = await hashPassword(password);
  const verifyMail = await renderMail(VerifyEmailMail({ name: displayName, href: `${env.publicOrigin}/verify-email?token=${secret}` }));
  const existsMail = await renderMail(AccountExistsMail({ href: `${env.publicOrigin}/reset-password` }));

  return ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    const userId = await insertAccount(tx, { displayName, email, passwordHash, timeZone, glucoseUnit: "mg/dL", createdAt: at });
    const mail = { toAddress: email, requestId: ctx.requestId, createdAt: at };
    if (!userId) {
      await insertMail(tx, { ...mail, ...existsMail, kind: "account-exists", subject: "You already have a Notchbook account", dedupeKey: `account-exists/${secret}` });
      return { email, userId: null };
    }
    const expiresAt = new Date(at.getTime() + VERIFY_LINK_HOURS * 3_600_000);
    await insertEmailToken(tx, { tokenHash: hashSecret(secret), userId, purpose: "verify-email", createdAt: at, expiresAt });
    await insertMail(tx, { ...mail, ...verifyMail, kind: "verify-email", recipientId: userId, subject: "Verify your e-mail address", dedupeKey: `verify-email/${hashSecret(secret)}` });
    return { email, userId };
  });
}
