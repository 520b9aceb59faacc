import "server-only";
import { randomUUID } from "node:crypto";
import { z } from "zod";
import { DIGEST_READ, insertAccess } from "@/db/repositories/access-log";
import { insertDigest, listDigestReaders } from "@/db/repositories/digests";
import { insertMail } from "@/db/repositories/outbox";
import { authorize } from "@/domain/access/policy";
import { isSlotDue, latestSlot } from "@/domain/digest/slot";
import type { FindingOf } from "@/domain/digest/week";
import type { Context } from "@/lib/context";
import { digestLetter } from "../emails/digest-letter";
import { composeDigest } from "../queries/digest";

const sendDigestInput = z.object({ userId: z.uuid() });

/**
 * Write one reader's digest, if their weekly moment has come and there is none
 * for that week. The claim on the week and the mail are one transaction: a
 * crash leaves both or neither, and of two workers one writes it.
 *
 * @returns the mail's id, or null when nothing was due
 * @throws {AppError} FORBIDDEN for anybody but the weekly job
 */
export async function sendDigest(ctx: Context, input: z.input<typeof sendDigestInput>, findingOf: FindingOf): Promise<string | null> {
  const { userId } = sendDigestInput.parse(input);
  authorize(ctx.actor, "digest.send");
  const at = ctx.now();
  const [reader] = await listDigestReaders(ctx.db, at, userId);
  if (!reader) return null;
  const slot = latestSlot(at.getTime(), reader.timeZone, reader);
  if (!isSlotDue(slot, at.getTime(), reader.lastIsoWeek, reader.since.getTime())) return null;
  const composed = await composeDigest(ctx, { userId, today: slot.on }, findingOf);
  if (!composed) return null;

  const { digest, basis, toAddress, displayName } = composed;
  const letter = await digestLetter(digest, { userId, displayName });

  return ctx.db.transaction(async (tx) => {
    const id = randomUUID();
    if (!(await insertDigest(tx, { userId, isoWeek: slot.isoWeek, outboxId: id, createdAt: at }))) return null;
    await insertMail(tx, {
      ...letter, id, kind: "weekly-digest", recipientId: userId, toAddress, basis,
      dedupeKey: `weekly-digest/${id}`, requestId: ctx.requestId, createdAt: at,
    });
    for (const { journalId, role } of basis.grants) {
      if (role !== "person") await insertAccess(tx, { journalId, userId, role, what: `${DIGEST_READ}the week, ${basis.level}`, at });
    }
    return id;
  });
}
