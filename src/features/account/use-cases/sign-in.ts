import "server-only";
import { findAccountByEmail } from "@/db/repositories/accounts";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { isPasswordRight, spendPasswordCheck } from "@/lib/passwords";
import { countAttempt, forgetAttempts } from "@/lib/rate-limit";
import { signInInput, type SignInInput } from "../schema";

const SAME_WORDS = "This e-mail address and password do not belong together.";

/**
 * Check an address and a password. An unknown address costs the same time and
 * gets the same words as a password that does not match. Attempts are counted
 * per account and, where it is known, per network address `from`.
 *
 * @throws {AppError} INVALID_INPUT on `password`, TOO_MANY
 */
export async function signIn(
  ctx: Context, input: SignInInput, from = "",
): Promise<{ userId: string; isEmailVerified: boolean; next: string }> {
  const { email, password, next } = signInInput.parse(input);
  authorize(ctx.actor, "account.enter");
  if (from) await countAttempt(ctx.db, "sign-in-address", from);
  await countAttempt(ctx.db, "sign-in", email);
  const account = await findAccountByEmail(ctx.db, email);
  const isRight = account ? await isPasswordRight(account.passwordHash, password) : await spendPasswordCheck(password).then(() => false);
  if (!account || !isRight || account.closedAt) throw new AppError("INVALID_INPUT", "sign-in refused", { password: [SAME_WORDS] });
  await forgetAttempts(ctx.db, "sign-in", email);
  return { userId: account.id, isEmailVerified: account.emailVerifiedAt !== null, next: localPath(next) };
}

/** Only a path of our own: one slash, no scheme, no second slash or backslash. */
export function localPath(next: string | undefined): string {
  return next && /^\/(?![/\\])[\w\-/?=&%.~#[\]]*$/.test(next) ? next : "/journals";
}
