import { boolean, index, integer, jsonb, pgTable, primaryKey, smallint, text, timestamp, uuid } from "drizzle-orm/pg-core";
import type { DigestBasis, DigestLevel } from "@/domain/digest/basis";
import { users } from "./people";

export type OutboxState = "waiting" | "sent" | "dropped" | "dead";

/**
 * Mail to be sent, written in the transaction of what caused it. The body is
 * stored as rendered, so that a retry under the same key is byte for byte equal.
 */
export const outbox = pgTable(
  "outbox",
  {
    id: uuid().primaryKey().defaultRandom(),
    kind: text().notNull(),
    journalId: uuid(),
    recipientId: uuid(),
    toAddress: text().notNull(),
    subject: text().notNull(),
    html: text().notNull(),
    text: text().notNull(),
    headers: jsonb().$type<Record<string, string>>().notNull(),
    /** The level and grants a digest was written under; no longer so at sending, it is not sent. */
    basis: jsonb().$type<DigestBasis>(),
    dedupeKey: text().notNull().unique(),
    state: text().$type<OutboxState>().notNull(),
    attempts: integer().notNull().default(0),
    nextAttemptAt: timestamp({ withTimezone: true }).notNull(),
    leaseUntil: timestamp({ withTimezone: true }),
    providerId: text(),
    lastError: text().notNull().default(""),
    requestId: text().notNull().default(""),
    createdAt: timestamp({ withTimezone: true }).notNull(),
    sentAt: timestamp({ withTimezone: true }),
  },
  (t) => [index("outbox_due").on(t.state, t.nextAttemptAt)],
);

/** How much of a week a reader wants by e-mail, and when in their own zone. No row: links, Monday 08:00, told of comments. */
export const digestPreferences = pgTable("digest_preferences", {
  userId: uuid()
    .primaryKey()
    .references(() => users.id, { onDelete: "cascade" }),
  level: text().$type<DigestLevel>().notNull(),
  /** 1 Monday … 7 Sunday. */
  weekday: smallint().notNull(),
  minuteOfDay: smallint().notNull(),
  /** Whether a new comment is told by e-mail, without its text. */
  isToldOfComments: boolean().notNull().default(true),
  updatedAt: timestamp({ withTimezone: true }).notNull(),
});

/** One digest per reader and ISO week, whatever crashes. */
export const digests = pgTable(
  "digests",
  {
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    isoWeek: text().notNull(),
    outboxId: uuid().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.userId, t.isoWeek] })],
);
