import "server-only";
import type { z } from "zod";
import { findAccount } from "@/db/repositories/accounts";
import { switchDigestOff } from "@/db/repositories/digest-preferences";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { logEvent } from "@/lib/log";
import { readUnsubscribeToken } from "@/lib/secrets";
import { unsubscribeInput } from "../schema";

/**
 * End a reader's weekly mails by the link that stands in each of them. The
 * link's own proof is all that is asked; a second time changes nothing.
 *
 * @throws {AppError} NOT_FOUND for a link that was not made here
 */
export async function unsubscribe(ctx: Context, input: z.input<typeof unsubscribeInput>): Promise<void> {
  const { token } = unsubscribeInput.parse(input);
  authorize(ctx.actor, "account.enter");
  const userId = readUnsubscribeToken(token);
  if (!userId || !(await findAccount(ctx.db, userId))) throw new AppError("NOT_FOUND", "unsubscribe link not known");
  await switchDigestOff(ctx.db, userId, ctx.now());
  logEvent("info", "digest.unsubscribed", { userId, requestId: ctx.requestId });
}
