import { spawn } from "node:child_process";
import { existsSync, mkdirSync, renameSync, rmSync, statSync } from "node:fs";
import { dirname, join, resolve } from "node:path";
import { DATA, PlainMessage, say } from "./place.mjs";
import { findPostgres } from "./postgres-binaries.mjs";
import { connectionEnv, sql } from "./postgres-client.mjs";
import { run } from "./processes.mjs";

/** Everything that is ours in a database: all schemas but PostgreSQL's own. */
const EMPTY_IT = `
  do $$ declare name text; begin
    for name in select nspname from pg_namespace where nspname !~ '^pg_' and nspname <> 'information_schema' loop
      execute format('drop schema %I cascade', name);
    end loop;
  end $$;
  create schema public;
  alter schema public owner to pg_database_owner;
  grant usage on schema public to public;
`;
const COUNT_TABLES = `select count(*) from pg_class c join pg_namespace n on n.oid = c.relnamespace
  where c.relkind in ('r', 'p') and n.nspname !~ '^pg_' and n.nspname <> 'information_schema'`;

const megabytes = (file) => `${(statSync(file).size / 1e6).toFixed(1)} MB`;

/** Save the whole database to one file that only this account can read. */
export async function backup({ ownerUrl, bin }, wanted) {
  const stamp = new Date().toISOString().slice(0, 19).replaceAll(":", "").replace("T", "-");
  const file = wanted ? resolve(process.env.INIT_CWD ?? ".", wanted) : join(DATA, "backups", `notchbook-${stamp}.dump`);
  if (existsSync(file)) throw new PlainMessage(`${file} is already there. Choose another name.`);
  process.umask(0o077);
  mkdirSync(dirname(file), { recursive: true });
  const draft = `${file}.partial`;
  const programs = bin ?? (await findPostgres());
  const { code } = await run(join(programs, "pg_dump"), ["-Fc", "-f", draft], { env: connectionEnv(ownerUrl) });
  if (code !== 0) {
    rmSync(draft, { force: true });
    throw new PlainMessage(`pg_dump ended with code ${code}; nothing was saved.`);
  }
  renameSync(draft, file);
  say(`Saved ${megabytes(file)} to ${file}\nIt holds every journal: keep it as private as they are.`);
}

/**
 * Bring back a saved file, whole or not at all: one transaction removes what is there and puts the copy in its place.
 *
 * @throws {PlainMessage} for a missing or damaged file, and for a database that is not empty unless told to replace it
 */
export async function restore({ ownerUrl, bin }, wanted, { isReplacing }) {
  const file = resolve(process.env.INIT_CWD ?? ".", wanted);
  if (!existsSync(file)) throw new PlainMessage(`There is no file ${file}.`);
  const programs = bin ?? (await findPostgres());
  const tables = Number(await sql(programs, ownerUrl, COUNT_TABLES));
  if (tables > 0 && !isReplacing) {
    throw new PlainMessage(`The database already holds ${tables} tables. To remove all they hold and restore the copy, add --replace.`);
  }
  await pourInto(programs, ownerUrl, file);
  say(`Restored ${megabytes(file)} from ${file}`);
}

/** pg_restore writes SQL, psql carries it out; COMMIT is sent only once pg_restore has read the file to its end. */
function pourInto(programs, url, file) {
  return new Promise((done, refuse) => {
    const psql = spawn(join(programs, "psql"), ["-X", "-q", "-v", "ON_ERROR_STOP=1", "-f", "-"], {
      env: connectionEnv(url),
      stdio: ["pipe", "ignore", "inherit"],
    });
    const reader = spawn(join(programs, "pg_restore"), ["-f", "-", "--no-owner", "--no-acl", file], { stdio: ["ignore", "pipe", "inherit"] });
    psql.stdin.on("error", () => reader.kill());
    psql.stdin.write(`set client_min_messages = warning; set lock_timeout = '10s'; begin; ${EMPTY_IT}`);
    reader.stdout.pipe(psql.stdin, { end: false });
    reader.on("close", (code) => psql.stdin.end(code === 0 ? "\ncommit;\n" : ""));
    psql.on("close", (code) => {
      if (code === 0 && reader.exitCode === 0) done();
      else refuse(new PlainMessage(`${file} was not restored; the database is as it was. The lines above say why.`));
    });
  });
}
