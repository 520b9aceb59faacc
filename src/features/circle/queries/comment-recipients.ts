import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { findReadUpTo } from "@/db/repositories/comments";
import { findDigestPreference } from "@/db/repositories/digest-preferences";
import { listCircle } from "@/db/repositories/grants";
import { findJournal } from "@/db/repositories/journals";
import type { NewMail } from "@/db/repositories/outbox";
import { subjectPath } from "@/domain/access/comment-place";
import { READ_ACTION_OF_SUBJECT, type CommentSubject } from "@/domain/access/comment-subject";
import { authorize, can, requireUser } from "@/domain/access/policy";
import { env } from "@/env";
import { findActor } from "@/lib/actor";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { NewCommentMail } from "../emails/new-comment-mail";

type Said = Readonly<{ journalId: string; subject: CommentSubject; subjectKey: string; kind: "comment" | "question"; authorName: string }>;

/**
 * The mails that tell the others of a new comment: to those who may read it and
 * want to know. Until a reader marks the journal's comments as read there is
 * one a day, so that a conversation is not a shower of mail.
 */
export async function newCommentMails(ctx: Context, said: Said): Promise<NewMail[]> {
  const { journalId, subject, subjectKey, kind, authorName } = said;
  authorize(ctx.actor, "comment.write", journalId);
  const { userId } = requireUser(ctx.actor);
  const at = ctx.now();
  const journal = await findJournal(ctx.db, journalId);
  const owner = journal ? await findAccount(ctx.db, journal.ownerId) : undefined;
  const mails: NewMail[] = [];
  for (const member of await listCircle(ctx.db, journalId, at)) {
    if (member.userId === userId) continue;
    const actor = await findActor(ctx.db, member.userId, at);
    const account = await findAccount(ctx.db, member.userId);
    const { isToldOfComments } = await findDigestPreference(ctx.db, member.userId);
    if (!account || !isToldOfComments || !can(actor, READ_ACTION_OF_SUBJECT[subject], journalId)) continue;
    const readUpTo = await findReadUpTo(ctx.db, journalId, member.userId);
    const body = await renderMail(
      NewCommentMail({
        authorName, ownerName: owner?.displayName ?? "", isByOwner: owner?.id === userId, isOwn: member.role === "person", isQuestion: kind === "question",
        href: `${env.publicOrigin}${subjectPath(journalId, subject, subjectKey)}`, accountHref: `${env.publicOrigin}/account#mail`,
      }),
    );
    mails.push({
      ...body, kind: "new-comment", journalId, recipientId: member.userId, toAddress: account.email,
      subject: kind === "question" ? `${authorName} asks something in Notchbook` : `${authorName} wrote something in Notchbook`,
      dedupeKey: `new-comment/${journalId}/${member.userId}/${readUpTo?.getTime() ?? 0}/${at.toISOString().slice(0, 10)}`,
      requestId: ctx.requestId, createdAt: at,
    });
  }
  return mails;
}
