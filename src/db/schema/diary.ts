import { boolean, index, integer, jsonb, pgTable, primaryKey, smallint, text, timestamp, uuid } from "drizzle-orm/pg-core";
import type { EntryData, EntryKind } from "@/domain/journal/entry";
import type { DayFlagCode } from "@/domain/journal/day-flag";
import { journals } from "./journals";
import { users } from "./people";

/** What the person logged: a meal, a dose, a feeling, a note. Removed entries are kept and hidden. */
export const entries = pgTable(
  "entries",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    kind: text().$type<EntryKind>().notNull(),
    at: timestamp({ withTimezone: true }).notNull(),
    data: jsonb().$type<EntryData>().notNull(),
    createdBy: uuid()
      .notNull()
      .references(() => users.id),
    createdAt: timestamp({ withTimezone: true }).notNull(),
    updatedAt: timestamp({ withTimezone: true }).notNull(),
    removedAt: timestamp({ withTimezone: true }),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.id] }), index("entries_at").on(t.journalId, t.at)],
);

/** Something that makes days unlike others. `isGraphSeen`: set after looking at the glucose of those days. */
export const dayFlags = pgTable(
  "day_flags",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    code: text().$type<DayFlagCode>().notNull(),
    firstDay: integer().notNull(),
    lastDay: integer().notNull(),
    strength: smallint().notNull(),
    note: text().notNull(),
    isGraphSeen: boolean().notNull(),
    setBy: uuid()
      .notNull()
      .references(() => users.id),
    setAt: timestamp({ withTimezone: true }).notNull(),
    removedAt: timestamp({ withTimezone: true }),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.id] }), index("day_flags_days").on(t.journalId, t.firstDay)],
);
