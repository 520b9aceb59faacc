import { drizzle, type PostgresJsDatabase, type PostgresJsTransaction } from "drizzle-orm/postgres-js";
import type { ExtractTablesWithRelations } from "drizzle-orm";
import postgres from "postgres";

type NoSchema = Record<string, never>;

/** The pool, or one transaction of it: every repository takes it first. */
export type Db =
  | PostgresJsDatabase<NoSchema>
  | PostgresJsTransaction<NoSchema, ExtractTablesWithRelations<NoSchema>>;

/** The pool itself, which alone can be closed and hands out its raw driver for bulk statements. */
export type Pool = PostgresJsDatabase<NoSchema> & { $client: postgres.Sql };

/**
 * Open a pool of connections.
 *
 * @param url PostgreSQL connection string
 * @param max connections at most; a web process keeps ten
 */
export function openPool(url: string, max = 10): Pool {
  const sql = postgres(url, { max, idle_timeout: 30, connect_timeout: 10, onnotice: () => undefined });
  return drizzle(sql, { casing: "snake_case" });
}
