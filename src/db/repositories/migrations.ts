import { sql } from "drizzle-orm";
import type { Db } from "@/db/client";

/** How many migrations have been applied. */
export async function countMigrations(db: Db): Promise<number> {
  const rows = await db.execute<{ count: number }>(sql`select count(*)::int as count from drizzle.__drizzle_migrations`);
  return rows[0]?.count ?? 0;
}
