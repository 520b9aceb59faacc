import { fork } from "node:child_process";
import { eq, sql } from "drizzle-orm";
import { openPool, type Pool } from "@/db/client";
import { dailyRollups, glucoseReadings, imports } from "@/db/schema/glucose";
import { journals } from "@/db/schema/journals";
import { env } from "@/env";
import { seededRandom } from "@/domain/simulator/random";
import { uploadFile } from "@/features/glucose/use-cases/upload-file";
import { contextFor, createJournal } from "@/testing/factories";

/**
 * `npm run faults -- [KILLS] [SEED]`: kill an import at random moments and count
 * what is there: all of it or nothing, roll-ups equal to what is stored.
 */
const [kills = 20, seed = 7] = process.argv.slice(2).map(Number);
const DAYS = 60;
const ROWS = DAYS * 288;
const LONGEST_WAIT_MS = 4000;

const text = ["time,glucose mg/dL", ...Array.from({ length: ROWS }, (_, i) => `${new Date(Date.UTC(2026, 0, 1) + i * 300_000).toISOString()},${90 + (i % 90)}`)].join("\n");

async function killOnce(db: Pool, delayMs: number): Promise<"all" | "nothing" | "torn"> {
  const { journalId, ownerId } = await createJournal(db, { timeZone: "UTC" });
  const { importId } = await uploadFile(await contextFor(db, ownerId, new Date()), { journalId, fileName: "fault.csv", bytes: new TextEncoder().encode(text) });
  const child = fork("src/testing/import-child.ts", [ownerId, journalId, importId], {
    execArgv: ["--import", "tsx", "--import", "./src/commands/server-only.mjs"], stdio: ["ignore", "ignore", "ignore", "ipc"],
  });
  const ended = new Promise((resolve) => child.once("exit", resolve));
  await Promise.race([new Promise((resolve) => child.once("message", resolve)), ended]);
  await new Promise((resolve) => setTimeout(resolve, delayMs));
  child.kill("SIGKILL");
  await ended;
  const [raw] = await db.select({ n: sql<number>`count(*)::int` }).from(glucoseReadings).where(eq(glucoseReadings.journalId, journalId));
  const [rolled] = await db.select({ n: sql<number>`coalesce(sum(${dailyRollups.readings}) filter (where ${dailyRollups.part} = 'day'), 0)::int` }).from(dailyRollups).where(eq(dailyRollups.journalId, journalId));
  await db.delete(glucoseReadings).where(eq(glucoseReadings.journalId, journalId));
  await db.delete(imports).where(eq(imports.journalId, journalId));
  await db.delete(journals).where(eq(journals.id, journalId));
  if (raw?.n === ROWS && rolled?.n === ROWS) return "all";
  return raw?.n === 0 && rolled?.n === 0 ? "nothing" : "torn";
}

const db = openPool(env.ownerDatabaseUrl, 3);
const random = seededRandom(seed);
const counts = { all: 0, nothing: 0, torn: 0 };
for (let i = 0; i < kills; i += 1) counts[await killOnce(db, random() * LONGEST_WAIT_MS)] += 1;
await db.$client.end();
process.stdout.write(`imports killed ${kills} times, seed ${seed}: ${counts.all} complete, ${counts.nothing} absent, ${counts.torn} torn\n`);
process.stdout.write(`${counts.all + counts.nothing} passed, ${counts.torn} failed\n`);
process.exitCode = counts.torn > 0 ? 1 : 0;
