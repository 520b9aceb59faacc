import "server-only";
import { findAccount, findAccountByEmail, setPasswordHash } from "@/db/repositories/accounts";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { hashPassword, isPasswordRight } from "@/lib/passwords";
import { countAttempt } from "@/lib/rate-limit";
import { changePasswordInput } from "../schema";

/** A new password, for whoever knows the present one. The caller ends the other sessions. @throws {AppError} INVALID_INPUT on `currentPassword` */
export async function changePassword(ctx: Context, input: unknown): Promise<{ userId: string }> {
  const { currentPassword, password } = changePasswordInput.parse(input);
  authorize(ctx.actor, "account.use");
  const { userId } = requireUser(ctx.actor);
  await countAttempt(ctx.db, "sign-in", userId);
  const account = await findAccount(ctx.db, userId);
  const secrets = account ? await findAccountByEmail(ctx.db, account.email) : undefined;
  if (!secrets || !(await isPasswordRight(secrets.passwordHash, currentPassword))) {
    throw new AppError("INVALID_INPUT", "present password", { currentPassword: ["This is not your present password."] });
  }
  await setPasswordHash(ctx.db, userId, await hashPassword(password));
  return { userId };
}
