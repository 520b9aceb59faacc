import "server-only";
import { randomUUID } from "node:crypto";
import { findAccount, findAccountByEmail, setPasswordHash } from "@/db/repositories/accounts";
import { insertMail } from "@/db/repositories/outbox";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { hashPassword, isPasswordRight } from "@/lib/passwords";
import { countAttempt } from "@/lib/rate-limit";
import { PasswordChangedMail } from "../emails/password-changed-mail";
import { changePasswordInput } from "../schema";

/** A new password, for whoever knows the present one; told to the owner by mail. The caller ends the other sessions. @throws {AppError} INVALID_INPUT on `currentPassword` */
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
  const passwordHash = await hashPassword(password);
  const mail = await renderMail(PasswordChangedMail({ signedOut: "Every other device was signed out." }));
  const { email: toAddress } = secrets;
  return ctx.db.transaction(async (tx) => {
    await setPasswordHash(tx, userId, passwordHash);
    await insertMail(tx, { ...mail, kind: "password-changed", recipientId: userId, toAddress, subject: "Your password was changed", dedupeKey: `password-changed/${randomUUID()}`, requestId: ctx.requestId, createdAt: ctx.now() });
    return { userId };
  });
}
