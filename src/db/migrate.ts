import { drizzle } from "drizzle-orm/postgres-js";
import { migrate } from "drizzle-orm/postgres-js/migrator";
import PgBoss from "pg-boss";
import postgres from "postgres";
import { env } from "@/env";
import { QUEUES } from "./queues";

/** Tables in which the application's role may add and read, never change or remove. */
const APPEND_ONLY = ["settings_versions", "version_reviews", "journal_events", "access_log"];

/**
 * Bring a database to the present schema and give the application's role its
 * rights. Safe to run again at every start.
 *
 * @param ownerUrl the database as its owner
 * @param appRole  the role the application signs in as; it ends up owning nothing
 */
export async function migrateDatabase(ownerUrl: string, appRole: string): Promise<void> {
  const sql = postgres(ownerUrl, { max: 1, onnotice: () => undefined });
  try {
    await sql`set lock_timeout = '5s'`;
    await migrate(drizzle(sql), { migrationsFolder: "drizzle" });
    await createQueues(ownerUrl);
    const role = sql(appRole);
    await sql`grant usage on schema public, pgboss to ${role}`;
    await sql`grant select, insert, update, delete on all tables in schema public, pgboss to ${role}`;
    await sql`grant usage, select on all sequences in schema public, pgboss to ${role}`;
    await sql`grant execute on all functions in schema pgboss to ${role}`;
    await sql`grant usage on schema drizzle to ${role}`;
    await sql`grant select on all tables in schema drizzle to ${role}`;
    for (const table of APPEND_ONLY) {
      await sql`revoke update, delete, truncate on ${sql(table)} from ${role}`;
    }
  } finally {
    await sql.end();
  }
}

async function createQueues(ownerUrl: string): Promise<void> {
  const boss = new PgBoss({ connectionString: ownerUrl, supervise: false, schedule: false });
  boss.on("error", () => undefined);
  await boss.start();
  for (const { name, options } of QUEUES) {
    await boss.createQueue(name, { name, ...options });
    await boss.updateQueue(name, { name, ...options });
  }
  await boss.stop({ graceful: false });
}

function roleOf(url: string): string {
  return decodeURIComponent(new URL(url).username);
}

async function main(): Promise<void> {
  if (!env.ownerDatabaseUrl) throw new Error("DATABASE_URL is not set");
  await migrateDatabase(env.ownerDatabaseUrl, roleOf(env.databaseUrl));
}

if (process.argv[1]?.endsWith("migrate.ts")) await main();
