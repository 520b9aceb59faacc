import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";

/** One's own account, without its secrets. */
export async function ownAccount(ctx: Context) {
  authorize(ctx.actor, "account.use");
  const account = await findAccount(ctx.db, requireUser(ctx.actor).userId);
  if (!account) throw new AppError("UNAUTHENTICATED", "no account");
  const { email, displayName, timeZone, glucoseUnit } = account;
  return { email, displayName, timeZone, glucoseUnit };
}
