import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { insertComment, listThread } from "@/db/repositories/comments";
import { appendEvent } from "@/db/repositories/journal-events";
import { insertMail } from "@/db/repositories/outbox";
import { findVersion } from "@/db/repositories/versions";
import { subjectText } from "@/domain/access/comment-place";
import { READ_ACTION_OF_SUBJECT } from "@/domain/access/comment-subject";
import { authorize, findGrant, requireUser } from "@/domain/access/policy";
import { findSettingNumber } from "@/domain/access/setting-number";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { countAttempt } from "@/lib/rate-limit";
import { NUMBER_SENTENCE } from "../constants";
import { newCommentMails } from "../queries/comment-recipients";
import { addCommentInput, type AddCommentInput } from "../schema";

/**
 * Say or ask something about a version, a day or a comparison; the others who
 * may read it are told by mail that there is something, not what.
 *
 * A mentor's comment that names a number for a setting is stopped and can be
 * sent as a question instead.
 *
 * @throws {AppError} NOT_FOUND, FORBIDDEN, TOO_MANY, INVALID_INPUT at `body`
 */
export async function addComment(ctx: Context, input: AddCommentInput): Promise<{ commentId: string }> {
  const { journalId, subject, subjectKey, kind, body, inReplyTo } = addCommentInput.parse(input);
  authorize(ctx.actor, "comment.write", journalId);
  authorize(ctx.actor, READ_ACTION_OF_SUBJECT[subject], journalId);
  const { userId } = requireUser(ctx.actor);
  const isMentor = findGrant(ctx.actor, journalId)?.role === "mentor";
  if (isMentor && kind === "comment" && findSettingNumber(body) !== null) {
    throw new AppError("INVALID_INPUT", "a mentor's comment with a setting number", { body: [NUMBER_SENTENCE] });
  }
  await countAttempt(ctx.db, "comment", userId);
  const author = await findAccount(ctx.db, userId);
  const mails = await newCommentMails(ctx, { journalId, subject, subjectKey, kind, authorName: author?.displayName ?? "" });

  return ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    if (subject !== "day" && !(await findVersion(tx, journalId, Number(subjectKey)))) throw new AppError("NOT_FOUND", `version ${subjectKey}`);
    const thread = inReplyTo ? await listThread(tx, journalId, subject, subjectKey) : [];
    if (inReplyTo && !thread.some(({ id }) => id === inReplyTo)) throw new AppError("NOT_FOUND", `comment ${inReplyTo}`);
    const commentId = await insertComment(tx, { journalId, subject, subjectKey, kind, body, inReplyTo: inReplyTo ?? null, authorId: userId, createdAt: at });
    await appendEvent(tx, {
      journalId, at, actorId: userId, actorKind: "user", action: "comment.write", subject: subjectText(subject, subjectKey), details: { commentId, kind }, requestId: ctx.requestId,
    });
    for (const mail of mails) await insertMail(tx, mail);
    return { commentId };
  });
}
