import { boolean, date, index, pgTable, text, timestamp, uuid } from "drizzle-orm/pg-core";
import type { GlucoseUnit } from "@/domain/units";

/** An account. E-mail addresses are stored in lower case. */
export const users = pgTable("users", {
  id: uuid().primaryKey().defaultRandom(),
  email: text().notNull().unique(),
  displayName: text().notNull(),
  passwordHash: text().notNull(),
  emailVerifiedAt: timestamp({ withTimezone: true }),
  timeZone: text().notNull().default("UTC"),
  glucoseUnit: text().$type<GlucoseUnit>().notNull().default("mg/dL"),
  isAdministrator: boolean().notNull().default(false),
  createdAt: timestamp({ withTimezone: true }).notNull(),
  closedAt: timestamp({ withTimezone: true }),
});

/** A signed-in browser. `id` is the SHA-256 of the cookie's secret, never the secret itself. */
export const sessions = pgTable(
  "sessions",
  {
    id: text().primaryKey(),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull(),
    userAgent: text().notNull().default(""),
  },
  (t) => [index("sessions_user").on(t.userId)],
);

export type EmailTokenPurpose = "verify-email" | "reset-password";

/** A single-use link sent by e-mail; only the hash of its secret is kept. */
export const emailTokens = pgTable(
  "email_tokens",
  {
    tokenHash: text().primaryKey(),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    purpose: text().$type<EmailTokenPurpose>().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull(),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
    usedAt: timestamp({ withTimezone: true }),
  },
  (t) => [index("email_tokens_user").on(t.userId)],
);

/** An educator's licence. Approvals count only while `verifiedAt` is set and `expiresOn` lies ahead. */
export const credentials = pgTable("credentials", {
  userId: uuid()
    .primaryKey()
    .references(() => users.id, { onDelete: "cascade" }),
  profession: text().notNull(),
  licenceNumber: text().notNull(),
  jurisdiction: text().notNull(),
  expiresOn: date().notNull(),
  submittedAt: timestamp({ withTimezone: true }).notNull(),
  verifiedAt: timestamp({ withTimezone: true }),
  verifiedBy: uuid().references(() => users.id),
});
