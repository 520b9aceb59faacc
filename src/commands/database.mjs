import { join } from "node:path";
import { ensurePostgres } from "../db/postgres.mjs";
import { onEnd, withoutBreak } from "./lifecycle.mjs";
import { DATA, PlainMessage, say } from "./place.mjs";
import { runOrStop } from "./processes.mjs";
import { typescriptArgs } from "./typescript.mjs";

const MIGRATE = "src/db/migrate.ts";
const SEED = "src/testing/seed.ts";

/**
 * The database of this run: the one in DATABASE_URL, else the private server under .data, which stops when we do.
 *
 * @returns {Promise<{ ownerUrl: string, appUrl: string, isPrivate: boolean, bin?: string }>}
 */
export async function openDatabase(settings) {
  if (settings.DATABASE_URL) {
    const ownerUrl = settings.DATABASE_URL;
    return { ownerUrl, appUrl: settings.APP_DATABASE_URL ?? ownerUrl, isPrivate: false };
  }
  if (settings.APP_DATABASE_URL) {
    throw new PlainMessage("APP_DATABASE_URL is set without DATABASE_URL. Set both, or neither for a private local database.");
  }
  const dir = join(DATA, "pg");
  const postgres = await withoutBreak(() => ensurePostgres({ dir }));
  onEnd(postgres.stop);
  if (postgres.home !== dir) say(`The database is kept in ${postgres.home}: PostgreSQL's account may not enter this folder.`);
  return { ...postgres, isPrivate: true };
}

/** Bring the tables up to date. */
export async function migrate(env) {
  await runOrStop("Bringing the database up to date", process.execPath, typescriptArgs(MIGRATE), { env });
}

/** Fill an empty database with the demo. */
export async function seed(env) {
  await runOrStop("Preparing the demo", process.execPath, typescriptArgs(SEED), { env });
}
