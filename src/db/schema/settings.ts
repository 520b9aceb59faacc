import { date, index, integer, jsonb, pgTable, primaryKey, text, timestamp, uuid } from "drizzle-orm/pg-core";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { Expectation } from "@/domain/settings/expectation";
import type { SettingsProfile } from "@/domain/settings/profile";
import { journals } from "./journals";
import { users } from "./people";

export type VersionKind = "starting" | "change" | "undo";

/** A guardrail that fired and what the person answered to it. */
export type GuardrailAnswer = { code: string; severity: string; text: string; answer: string };

/**
 * One immutable settings snapshot. The application's database role may insert
 * and read here, never update or delete; a mended proposal is a new revision
 * of the same number.
 */
export const settingsVersions = pgTable(
  "settings_versions",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    number: integer().notNull(),
    revision: integer().notNull(),
    parentNumber: integer(),
    kind: text().$type<VersionKind>().notNull(),
    profile: jsonb().$type<SettingsProfile>().notNull(),
    /** SHA-256, hex, of the canonical profile text. */
    contentHash: text().notNull(),
    reasonCode: text().notNull(),
    reasonText: text().notNull(),
    expectation: jsonb().$type<Expectation>(),
    evidenceDays: jsonb().$type<string[]>().notNull(),
    lookAgainOn: date(),
    revertRule: text().notNull(),
    guardrails: jsonb().$type<GuardrailAnswer[]>().notNull(),
    /** What the educator is shown beside the numbers: the arithmetic of a starting profile. */
    arithmetic: jsonb().$type<unknown>(),
    authorId: uuid()
      .notNull()
      .references(() => users.id),
    createdAt: timestamp({ withTimezone: true }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.number, t.revision] })],
);

/** Where a version stands. Moves only along the edges of the version lifecycle. */
export const versionStates = pgTable(
  "version_states",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    number: integer().notNull(),
    revision: integer().notNull(),
    state: text().$type<VersionState>().notNull(),
    stateSince: timestamp({ withTimezone: true }).notNull(),
    approvedHash: text(),
    reviewOn: date(),
    effectiveFrom: timestamp({ withTimezone: true }),
    effectiveUntil: timestamp({ withTimezone: true }),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.number] }), index("version_states_state").on(t.state)],
);

/** A signed decision, bound to the content hash the educator was shown. Never updated. */
export const versionReviews = pgTable(
  "version_reviews",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    number: integer().notNull(),
    revision: integer().notNull(),
    decision: text().$type<"approved" | "returned" | "declined">().notNull(),
    reviewerId: uuid()
      .notNull()
      .references(() => users.id),
    contentHash: text().notNull(),
    signOffText: text().notNull(),
    reasonCode: text().notNull(),
    remarks: text().notNull(),
    reviewOn: date(),
    at: timestamp({ withTimezone: true }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.id] }), index("version_reviews_version").on(t.journalId, t.number)],
);
