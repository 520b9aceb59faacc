import "server-only";
import { countMigrations } from "@/db/repositories/migrations";
import migrationJournal from "../../drizzle/meta/_journal.json";
import { pool } from "./pool";

const PATIENCE_MS = 500;

/** Null when ready, otherwise why not in a few words. */
export async function readinessOf(): Promise<string | null> {
  const late = new Promise<"late">((resolve) => setTimeout(() => resolve("late"), PATIENCE_MS).unref());
  try {
    const applied = await Promise.race([countMigrations(pool()), late]);
    if (applied === "late") return "the database does not answer in time";
    return applied === migrationJournal.entries.length ? null : "the schema is not the one this build expects";
  } catch {
    return "the database does not answer";
  }
}
