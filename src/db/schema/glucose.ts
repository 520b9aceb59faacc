import {
  customType, doublePrecision, index, integer, jsonb, pgTable, primaryKey, real, smallint, text, timestamp, uuid,
} from "drizzle-orm/pg-core";
import type { GlucoseUnit } from "@/domain/units";
import { journals } from "./journals";
import { users } from "./people";

const bytea = customType<{ data: Buffer }>({ dataType: () => "bytea" });

export type ImportStatus = "uploaded" | "running" | "done" | "stopped" | "undone";

/** One file brought in: what it was, how it was read, what came of it. */
export const imports = pgTable(
  "imports",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    id: uuid().notNull().defaultRandom(),
    status: text().$type<ImportStatus>().notNull(),
    fileName: text().notNull(),
    /** SHA-256 of the file's bytes, hex. */
    fileHash: text().notNull(),
    byteCount: integer().notNull(),
    source: text().notNull(),
    mapping: jsonb().$type<Record<string, unknown>>(),
    unit: text().$type<GlucoseUnit>(),
    unitEvidence: text().notNull().default(""),
    timeZone: text(),
    rowCount: integer().notNull().default(0),
    acceptedCount: integer().notNull().default(0),
    duplicateCount: integer().notNull().default(0),
    refusedCount: integer().notNull().default(0),
    firstAt: timestamp({ withTimezone: true }),
    lastAt: timestamp({ withTimezone: true }),
    createdBy: uuid()
      .notNull()
      .references(() => users.id),
    createdAt: timestamp({ withTimezone: true }).notNull(),
    heartbeatAt: timestamp({ withTimezone: true }),
    finishedAt: timestamp({ withTimezone: true }),
    stopReason: text().notNull().default(""),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.id] })],
);

/** The uploaded bytes in pieces, kept only until the import is done or dropped. */
export const importChunks = pgTable(
  "import_chunks",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    importId: uuid().notNull(),
    seq: integer().notNull(),
    bytes: bytea().notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.importId, t.seq] })],
);

/** A row of the file that was not taken, with its line and a reason in plain words. */
export const importRefusals = pgTable(
  "import_refusals",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    importId: uuid().notNull(),
    line: integer().notNull(),
    reason: text().notNull(),
    text: text().notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.importId, t.line] })],
);

/**
 * Sensor readings, hash-partitioned by journal. `band` is 0 very low, 1 low,
 * 2 in range, 3 high, 4 very high, decided in the unit the value came in.
 */
export const glucoseReadings = pgTable(
  "glucose_readings",
  {
    journalId: uuid().notNull(),
    source: text().notNull(),
    at: timestamp({ withTimezone: true }).notNull(),
    glucoseMgDl: doublePrecision().notNull(),
    sourceValue: real().notNull(),
    sourceUnit: text().$type<GlucoseUnit>().notNull(),
    bound: text().$type<"below" | "above">(),
    band: smallint().notNull(),
    importId: uuid().notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.journalId, t.source, t.at] }),
    index("glucose_readings_at").on(t.journalId, t.at),
    index("glucose_readings_import").on(t.journalId, t.importId),
  ],
);

export type DayPart = "day" | "night";

/** Mergeable figures of one civil day (or its 00:00-06:00), so that no page of a year touches raw rows. */
export const dailyRollups = pgTable(
  "daily_rollups",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    /** Days since 1970-01-01 of the civil day in the journal's zone. */
    dayNumber: integer().notNull(),
    part: text().$type<DayPart>().notNull(),
    readings: integer().notNull(),
    sumMgDl: doublePrecision().notNull(),
    sumSquares: doublePrecision().notNull(),
    bandCounts: integer().array().notNull(),
    /** Counts per whole mg/dL. */
    histogram: integer().array().notNull(),
    minutesInPart: integer().notNull(),
    intervalMinutes: integer().notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.part, t.dayNumber] })],
);

/** Insulin as delivered: a bolus at an instant, or one stretch of constant basal. */
export const insulinDeliveries = pgTable(
  "insulin_deliveries",
  {
    journalId: uuid()
      .notNull()
      .references(() => journals.id, { onDelete: "cascade" }),
    source: text().notNull(),
    at: timestamp({ withTimezone: true }).notNull(),
    kind: text().$type<"bolus" | "basal">().notNull(),
    milliUnits: integer().notNull(),
    durationMinutes: integer().notNull(),
  },
  (t) => [primaryKey({ columns: [t.journalId, t.source, t.kind, t.at] })],
);
