import { findAccount } from "@/db/repositories/accounts";
import { findDigestPreference } from "@/db/repositories/digest-preferences";
import { releaseDigest } from "@/db/repositories/digests";
import { isInvitationOpen } from "@/db/repositories/invitations";
import type { LeasedMail } from "@/db/repositories/outbox";
import type { Db } from "@/db/client";
import { findGrant } from "@/domain/access/policy";
import { doesBasisHold } from "@/domain/digest/basis";
import { findActor } from "./actor";
import type { MayStillSend } from "./mailer";

/**
 * What is asked of every mail at the moment of sending, not of writing. An
 * account that was closed gets none; a mail about a journal goes only to
 * somebody who can still come into it; an invitation that was withdrawn stays
 * here; of comments and weeks only those are told who still want it, and a
 * digest needs every right under which it was written.
 */
export function mailConsent(db: Db, now: () => Date): MayStillSend {
  return async (mail) => {
    if (mail.kind === "invitation") return isInvitationStillOpen(db, mail, now());
    if (!mail.recipientId) return mail.journalId === null;
    const account = await findAccount(db, mail.recipientId);
    if (!account || account.closedAt) return false;
    const actor = await findActor(db, mail.recipientId, now());
    if (mail.journalId && !findGrant(actor, mail.journalId)) return false;
    const preference = await findDigestPreference(db, mail.recipientId);
    if (mail.kind === "new-comment" && !preference.isToldOfComments) return false;
    const grants = actor.type === "user" ? actor.grants : [];
    if (!mail.basis || doesBasisHold(mail.basis, { level: preference.level, grants })) return true;
    if (mail.attempts === 1) await releaseDigest(db, mail.id);
    return false;
  };
}

/** The key of an invitation's mail is "invitation/" and its id. */
async function isInvitationStillOpen(db: Db, mail: LeasedMail, at: Date): Promise<boolean> {
  const id = mail.dedupeKey.split("/")[1] ?? "";
  return mail.journalId !== null && isInvitationOpen(db, mail.journalId, id, at);
}
