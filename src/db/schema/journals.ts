import { date, integer, index, jsonb, pgTable, primaryKey, text, timestamp, uuid } from "drizzle-orm/pg-core";
import type { JournalRole, Scope } from "@/domain/access/policy";
import type { DraftAnswers } from "@/domain/onboarding/draft";
import type { GlucoseUnit } from "@/domain/units";
import { users } from "./people";

export type Therapy = "injections" | "pump" | "closed-loop";

/** The setup in the person's own words, with the steps their device can be set in. */
export type Setup = {
  pump: string;
  sensor: string;
  controller: string;
  insulin: string;
  basalStepMilliUnits: number;
  bolusStepMilliUnits: number;
};

/** One person's record. `startedOn` is day 1 in the journal's zone. */
export const journals = pgTable("journals", {
  id: uuid().primaryKey().defaultRandom(),
  ownerId: uuid()
    .notNull()
    .references(() => users.id),
  name: text().notNull(),
  timeZone: text().notNull(),
  glucoseUnit: text().$type<GlucoseUnit>().notNull(),
  plannedStartOn: date(),
  startedOn: date(),
  therapy: text().$type<Therapy>().notNull(),
  setup: jsonb().$type<Setup>().notNull(),
  /** Reason codes of a closed gate; an empty list is an open gate; null is not yet asked. */
  gateReasons: jsonb().$type<string[]>(),
  createdAt: timestamp({ withTimezone: true }).notNull(),
});

/** Who may come in. The owner holds a grant of role `person`. */
export const journalGrants = pgTable(
  "journal_grants",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    role: text().$type<JournalRole>().notNull(),
    scopes: jsonb().$type<Scope[]>().notNull(),
    grantedAt: timestamp({ withTimezone: true }).notNull(),
    grantedBy: uuid()
      .notNull()
      .references(() => users.id),
    expiresAt: timestamp({ withTimezone: true }),
    revokedAt: timestamp({ withTimezone: true }),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.userId] }), index("journal_grants_user").on(t.userId)],
);

/** An invitation sent by e-mail: single use, expiring, withdrawable. */
export const invitations = pgTable(
  "invitations",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    email: text().notNull(),
    role: text().$type<JournalRole>().notNull(),
    scopes: jsonb().$type<Scope[]>().notNull(),
    tokenHash: text().notNull().unique(),
    invitedBy: uuid()
      .notNull()
      .references(() => users.id),
    createdAt: timestamp({ withTimezone: true }).notNull(),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
    /** When the grant it leads to ends; null for one without an end. */
    grantExpiresAt: timestamp({ withTimezone: true }),
    acceptedAt: timestamp({ withTimezone: true }),
    acceptedBy: uuid().references(() => users.id),
    revokedAt: timestamp({ withTimezone: true }),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.id] })],
);

/** The unfinished starting profile: one per journal, saved at every step, guarded by `rowVersion`. */
export const wizardDrafts = pgTable("wizard_drafts", {
  journalId: uuid()
    .primaryKey()
    .references(() => journals.id, { onDelete: "cascade" }),
  answers: jsonb().$type<DraftAnswers>().notNull(),
  rowVersion: integer().notNull().default(1),
  updatedAt: timestamp({ withTimezone: true }).notNull(),
  updatedBy: uuid()
    .notNull()
    .references(() => users.id),
});

/** What to go back to, and whom to call: the content of the fallback card. */
export const fallbackCards = pgTable("fallback_cards", {
  journalId: uuid()
    .primaryKey()
    .references(() => journals.id, { onDelete: "cascade" }),
  previousSetup: text().notNull(),
  longActingMilliUnits: integer(),
  rapidMilliUnits: integer(),
  emergencyNumber: text().notNull(),
  contacts: jsonb().$type<{ name: string; phone: string }[]>().notNull(),
  updatedAt: timestamp({ withTimezone: true }).notNull(),
});

/** What happened in a journal, appended in the same transaction as the change itself. Never updated. */
export const journalEvents = pgTable(
  "journal_events",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    at: timestamp({ withTimezone: true }).notNull(),
    actorId: uuid(),
    actorKind: text().notNull(),
    action: text().notNull(),
    subject: text().notNull(),
    details: jsonb().$type<Record<string, unknown>>().notNull(),
    requestId: text().notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.id] }), index("journal_events_at").on(t.journalId, t.at)],
);

/** Every read by somebody else, open to the person. Never updated. */
export const accessLog = pgTable(
  "access_log",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    at: timestamp({ withTimezone: true }).notNull(),
    userId: uuid().notNull(),
    role: text().$type<JournalRole>().notNull(),
    what: text().notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.id] }), index("access_log_at").on(t.journalId, t.at)],
);
