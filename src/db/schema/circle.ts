import { index, pgTable, primaryKey, text, timestamp, uuid } from "drizzle-orm/pg-core";
import type { CommentSubject } from "@/domain/access/comment-subject";
import { journals } from "./journals";
import { users } from "./people";

/** A comment or question. `subjectKey` is a version number or an ISO date. */
export const comments = pgTable(
  "comments",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    subject: text().$type<CommentSubject>().notNull(),
    subjectKey: text().notNull(),
    kind: text().$type<"comment" | "question">().notNull(),
    body: text().notNull(),
    inReplyTo: uuid(),
    authorId: uuid()
      .notNull()
      .references(() => users.id),
    createdAt: timestamp({ withTimezone: true }).notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.journalId, t.id] }),
    index("comments_subject").on(t.journalId, t.subject, t.subjectKey),
    index("comments_at").on(t.journalId, t.createdAt),
  ],
);

/** Up to when a reader has seen the comments of a journal. */
export const commentReads = pgTable(
  "comment_reads",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    readUpTo: timestamp({ withTimezone: true }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.userId] })],
);
