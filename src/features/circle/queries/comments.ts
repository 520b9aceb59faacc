import "server-only";
import { z } from "zod";
import { findReadUpTo, listLatestComments, listOpenQuestions, listThread, type CommentRow } from "@/db/repositories/comments";
import { findJournal } from "@/db/repositories/journals";
import { COMMENT_SUBJECTS, READ_ACTION_OF_SUBJECT, readableSubjects, type CommentSubject } from "@/domain/access/comment-subject";
import { subjectText } from "@/domain/access/comment-place";
import { authorize, requireUser, type JournalRole } from "@/domain/access/policy";
import { momentText } from "@/domain/digest/date-text";
import { recordRead } from "@/lib/access";
import type { Context } from "@/lib/context";
import { threadInput, type ThreadInput } from "../schema";

const LATEST_AT_MOST = 200;

export type Comment = Readonly<{
  id: string;
  subject: CommentSubject;
  subjectKey: string;
  kind: "comment" | "question";
  body: string;
  inReplyTo: string | null;
  authorName: string;
  authorRole: JournalRole | null;
  isOwn: boolean;
  /** By somebody else, since the reader last marked this journal's comments as read. */
  isUnread: boolean;
  /** A question that nobody but its author has answered. */
  isOpen: boolean;
  createdAt: Date;
  /** The same on the journal's clock, in words. */
  when: string;
}>;

/**
 * What was said about one version, day or comparison, oldest first.
 *
 * @throws {AppError} UNAUTHENTICATED, NOT_FOUND, or FORBIDDEN for what is not shared with the reader
 */
export async function listComments(ctx: Context, input: ThreadInput): Promise<Comment[]> {
  const { journalId, subject, subjectKey } = threadInput.parse(input);
  authorize(ctx.actor, "comment.read", journalId);
  authorize(ctx.actor, READ_ACTION_OF_SUBJECT[subject], journalId);
  const { userId } = requireUser(ctx.actor);
  await recordRead(ctx, journalId, `comments on ${subjectText(subject, subjectKey)}`);
  return shown(ctx, journalId, userId, await listThread(ctx.db, journalId, subject, subjectKey));
}

/** The latest comments on everything the reader may see in a journal, newest first. */
export async function latestComments(ctx: Context, input: { journalId: string }): Promise<Comment[]> {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "comment.read", journalId);
  const { userId } = requireUser(ctx.actor);
  await recordRead(ctx, journalId, "all comments");
  const subjects = readableSubjects(ctx.actor, journalId);
  return shown(ctx, journalId, userId, await listLatestComments(ctx.db, journalId, subjects, LATEST_AT_MOST));
}

async function shown(ctx: Context, journalId: string, readerId: string, rows: ReadonlyArray<CommentRow>): Promise<Comment[]> {
  const journal = await findJournal(ctx.db, journalId);
  const readUpTo = await findReadUpTo(ctx.db, journalId, readerId);
  const open = new Set((await listOpenQuestions(ctx.db, journalId, COMMENT_SUBJECTS, ctx.now())).map(({ id }) => id));
  return rows.map(({ authorId, ...row }) => {
    const isOwn = authorId === readerId;
    const isUnread = !isOwn && (readUpTo === null || row.createdAt > readUpTo);
    return { ...row, isOwn, isUnread, isOpen: open.has(row.id), when: momentText(row.createdAt, journal?.timeZone ?? "UTC") };
  });
}
