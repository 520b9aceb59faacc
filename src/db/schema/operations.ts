import { bigint, index, integer, jsonb, pgTable, primaryKey, text, timestamp, uuid } from "drizzle-orm/pg-core";
import { users } from "./people";

/** Counters of rate-limiter-flexible, in the layout that package expects. */
export const rateLimits = pgTable("rate_limits", {
  key: text().primaryKey(),
  points: integer().notNull().default(0),
  expire: bigint({ mode: "number" }),
});

/** A personal token for the API; only the hash of its secret is kept. */
export const apiTokens = pgTable(
  "api_tokens",
  {
    id: uuid().primaryKey().defaultRandom(),
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    tokenHash: text().notNull().unique(),
    label: text().notNull(),
    scope: text().$type<"read" | "write">().notNull(),
    createdAt: timestamp({ withTimezone: true }).notNull(),
    expiresAt: timestamp({ withTimezone: true }).notNull(),
    lastUsedAt: timestamp({ withTimezone: true }),
    revokedAt: timestamp({ withTimezone: true }),
  },
  (t) => [index("api_tokens_user").on(t.userId)],
);

/** The stored answer to a POST that carried an Idempotency-Key. */
export const idempotencyKeys = pgTable(
  "idempotency_keys",
  {
    userId: uuid()
      .notNull()
      .references(() => users.id, { onDelete: "cascade" }),
    key: text().notNull(),
    route: text().notNull(),
    fingerprint: text().notNull(),
    status: integer(),
    body: jsonb().$type<unknown>(),
    createdAt: timestamp({ withTimezone: true }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.userId, t.route, t.key] })],
);
