import "server-only";
import { randomUUID } from "node:crypto";
import { findAccount } from "@/db/repositories/accounts";
import { insertMail } from "@/db/repositories/outbox";
import { authorize, requireUser } from "@/domain/access/policy";
import { isoDayOf } from "@/domain/iso-day";
import type { FindingOf } from "@/domain/digest/week";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { countAttempt } from "@/lib/rate-limit";
import { digestLetter } from "../emails/digest-letter";
import { composeDigest } from "../queries/digest";

/**
 * Send the signed-in reader the week up to today, besides the weekly one.
 *
 * @throws {AppError} CONFLICT when there is nothing to send: switched off, or no notebook; TOO_MANY
 */
export async function sendDigestNow(ctx: Context, findingOf: FindingOf): Promise<{ toAddress: string }> {
  authorize(ctx.actor, "digest.choose");
  const { userId } = requireUser(ctx.actor);
  await countAttempt(ctx.db, "digest", userId);
  const account = await findAccount(ctx.db, userId);
  const today = isoDayOf(ctx.now(), account?.timeZone ?? "UTC");
  const composed = await composeDigest(ctx, { userId, today }, findingOf);
  if (!composed) throw new AppError("CONFLICT", "no digest to send");

  const { digest, basis, toAddress, displayName } = composed;
  const letter = await digestLetter(digest, { userId, displayName });
  const id = randomUUID();
  await insertMail(ctx.db, {
    ...letter, id, kind: "digest-now", recipientId: userId, toAddress, basis,
    dedupeKey: `digest-now/${id}`, requestId: ctx.requestId, createdAt: ctx.now(),
  });
  return { toAddress };
}
