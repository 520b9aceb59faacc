import "server-only";
import { z } from "zod";
import { findReadUpTo, listLatestComments, listThread, type CommentRow } from "@/db/repositories/comments";
import { READ_ACTION_OF_SUBJECT, readableSubjects, type CommentSubject } from "@/domain/access/comment-subject";
import { subjectText } from "@/domain/access/comment-place";
import { authorize, requireUser, type JournalRole } from "@/domain/access/policy";
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
  createdAt: Date;
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
  const readUpTo = await findReadUpTo(ctx.db, journalId, userId);
  return (await listThread(ctx.db, journalId, subject, subjectKey)).map((row) => shown(row, userId, readUpTo));
}

/** The latest comments on everything the reader may see in a journal, newest first. */
export async function latestComments(ctx: Context, input: { journalId: string }): Promise<Comment[]> {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "comment.read", journalId);
  const { userId } = requireUser(ctx.actor);
  await recordRead(ctx, journalId, "all comments");
  const readUpTo = await findReadUpTo(ctx.db, journalId, userId);
  const rows = await listLatestComments(ctx.db, journalId, readableSubjects(ctx.actor, journalId), LATEST_AT_MOST);
  return rows.map((row) => shown(row, userId, readUpTo));
}

function shown({ authorId, ...row }: CommentRow, readerId: string, readUpTo: Date | null): Comment {
  const isOwn = authorId === readerId;
  return { ...row, isOwn, isUnread: !isOwn && (readUpTo === null || row.createdAt > readUpTo) };
}
