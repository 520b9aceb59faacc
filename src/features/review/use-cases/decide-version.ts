import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { insertMail } from "@/db/repositories/outbox";
import { insertReview } from "@/db/repositories/version-reviews";
import { findVersionForUpdate, moveVersion, type VersionRow } from "@/db/repositories/versions";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { assertEdge, type VersionState } from "@/domain/journal/version-lifecycle";
import { assertNotOwnProposal, assertSameContent } from "@/domain/journal/version-lifecycle-rules";
import { env } from "@/env";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { DecisionMail } from "../emails/decision-mail";

export type Decision = Readonly<{
  journalId: string;
  number: number;
  contentHash: string;
  event: "approve" | "return" | "decline";
  reasonCode: string;
  remarks: string;
  reviewOn: string | null;
  /** The signed words, once it is known what was decided on. */
  signOff: (version: VersionRow) => string;
}>;

const DECIDED = { approve: "approved", return: "returned", decline: "declined" } as const;

/**
 * One signed decision on one snapshot: the review, the state, the journal's
 * event and the mail are one transaction. Of two educators who decide at once,
 * the second meets a conflict.
 *
 * @throws {AppError} FORBIDDEN without a live licence or on one's own proposal,
 *   STALE when the content is not what was shown, CONFLICT for a version that does not wait
 */
export async function decideVersion(ctx: Context, decision: Decision): Promise<{ number: number; state: VersionState }> {
  const { journalId, number } = decision;
  authorize(ctx.actor, "version.review", journalId);
  const { userId } = requireUser(ctx.actor);
  const mail = await renderMail(DecisionMail({ number, href: `${env.publicOrigin}/j/${journalId}/changes/${number}` }));

  return ctx.db.transaction(async (tx) => {
    const version = await findVersionForUpdate(tx, journalId, number);
    const journal = await findJournal(tx, journalId);
    if (!version || !journal) throw new AppError("NOT_FOUND", `version ${number}`);
    assertNotOwnProposal(version, userId);
    assertSameContent(version, decision.contentHash);
    const at = ctx.now();
    const state = assertEdge(version.state, decision.event);
    const approval = decision.event === "approve" ? { approvedHash: version.contentHash, reviewOn: decision.reviewOn } : {};
    if (!(await moveVersion(tx, { journalId, number, from: version.state, to: state, at }, approval))) {
      throw new AppError("CONFLICT", `version ${number} is no longer ${version.state}`);
    }
    await insertReview(tx, {
      journalId, number, revision: version.revision, decision: DECIDED[decision.event], reviewerId: userId,
      contentHash: version.contentHash, signOffText: decision.signOff(version), reasonCode: decision.reasonCode,
      remarks: decision.remarks, reviewOn: decision.reviewOn, at,
    });
    const details = { decision: DECIDED[decision.event], revision: version.revision };
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "version.review", subject: `version ${number}`, details, requestId: ctx.requestId });
    const owner = await findAccount(tx, journal.ownerId);
    if (owner) {
      await insertMail(tx, {
        ...mail, kind: "decision", journalId, recipientId: owner.id, toAddress: owner.email, subject: "Your educator has decided",
        dedupeKey: `decision/${journalId}/${number}/${version.revision}/${decision.event}`, requestId: ctx.requestId, createdAt: at,
      });
    }
    return { number, state };
  });
}
