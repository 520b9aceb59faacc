import { and, asc, desc, eq, gt, inArray, isNotNull, lte, ne, notExists, sql } from "drizzle-orm";
import { alias } from "drizzle-orm/pg-core";
import type { Db } from "@/db/client";
import { commentReads, comments } from "@/db/schema/circle";
import { journalGrants } from "@/db/schema/journals";
import { users } from "@/db/schema/people";
import type { CommentSubject } from "@/domain/access/comment-subject";

/** @returns the new comment's id */
export async function insertComment(db: Db, comment: typeof comments.$inferInsert): Promise<string> {
  const [row] = await db.insert(comments).values(comment).returning({ id: comments.id });
  if (!row) throw new Error("insert returned no row");
  return row.id;
}

/** Comments with the author's name and the role held in this journal, also after it ended. */
function selectComments(db: Db) {
  return db
    .select({
      id: comments.id,
      subject: comments.subject,
      subjectKey: comments.subjectKey,
      kind: comments.kind,
      body: comments.body,
      inReplyTo: comments.inReplyTo,
      authorId: comments.authorId,
      authorName: users.displayName,
      authorRole: journalGrants.role,
      createdAt: comments.createdAt,
    })
    .from(comments)
    .innerJoin(users, eq(users.id, comments.authorId))
    .leftJoin(journalGrants, and(eq(journalGrants.journalId, comments.journalId), eq(journalGrants.userId, comments.authorId)));
}

export type CommentRow = Awaited<ReturnType<typeof listThread>>[number];

/** What was written about one version, day or comparison, oldest first. */
export async function listThread(db: Db, journalId: string, subject: CommentSubject, subjectKey: string) {
  return selectComments(db)
    .where(and(eq(comments.journalId, journalId), eq(comments.subject, subject), eq(comments.subjectKey, subjectKey)))
    .orderBy(asc(comments.createdAt), asc(comments.id));
}

/** The latest comments of a journal about any of these kinds of subject, newest first. */
export async function listLatestComments(db: Db, journalId: string, subjects: ReadonlyArray<CommentSubject>, limit: number) {
  if (subjects.length === 0) return [];
  return selectComments(db)
    .where(and(eq(comments.journalId, journalId), inArray(comments.subject, [...subjects])))
    .orderBy(desc(comments.createdAt), desc(comments.id))
    .limit(limit);
}

const answer = alias(comments, "answer");

/** Questions of a journal that nobody but their author has answered by `now`, longest waiting first. */
export async function listOpenQuestions(db: Db, journalId: string, subjects: ReadonlyArray<CommentSubject>, now: Date) {
  if (subjects.length === 0) return [];
  const answers = db
    .select({ id: answer.id })
    .from(answer)
    .where(and(eq(answer.journalId, comments.journalId), eq(answer.inReplyTo, comments.id), ne(answer.authorId, comments.authorId), lte(answer.createdAt, now)));
  return selectComments(db)
    .where(
      and(
        eq(comments.journalId, journalId),
        eq(comments.kind, "question"),
        inArray(comments.subject, [...subjects]),
        lte(comments.createdAt, now),
        notExists(answers),
      ),
    )
    .orderBy(asc(comments.createdAt));
}

/** Up to when a reader has marked the comments of a journal as read; null for never. */
export async function findReadUpTo(db: Db, journalId: string, userId: string): Promise<Date | null> {
  const [row] = await db
    .select({ readUpTo: commentReads.readUpTo })
    .from(commentReads)
    .where(and(eq(commentReads.journalId, journalId), eq(commentReads.userId, userId)));
  return row?.readUpTo ?? null;
}

/** Move the reader's mark forward, never back. */
export async function markReadUpTo(db: Db, mark: { journalId: string; userId: string; readUpTo: Date }): Promise<void> {
  await db
    .insert(commentReads)
    .values(mark)
    .onConflictDoUpdate({
      target: [commentReads.journalId, commentReads.userId],
      set: { readUpTo: sql`greatest(${commentReads.readUpTo}, excluded.read_up_to)` },
    });
}

/** How many comments by others came after the reader's mark, in one journal. */
export async function countUnread(
  db: Db,
  reader: { journalId: string; userId: string; subjects: ReadonlyArray<CommentSubject> },
): Promise<number> {
  if (reader.subjects.length === 0) return 0;
  const readUpTo = await findReadUpTo(db, reader.journalId, reader.userId);
  const [row] = await db
    .select({ count: sql<number>`count(*)::int` })
    .from(comments)
    .where(
      and(
        eq(comments.journalId, reader.journalId),
        ne(comments.authorId, reader.userId),
        inArray(comments.subject, [...reader.subjects]),
        readUpTo ? gt(comments.createdAt, readUpTo) : isNotNull(comments.createdAt),
      ),
    );
  return row?.count ?? 0;
}
