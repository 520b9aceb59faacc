import PgBoss from "pg-boss";
import { errorFields, logEvent } from "./log";

/** The clock's queue: every quarter of an hour, who is due for a digest. */
export const DIGEST_CLOCK = "weekly-digest";
/** One job for each reader who is due. */
export const DIGEST_OF_READER = "digest-of-reader";
const EVERY_QUARTER_HOUR = "*/15 * * * *";
/** Readers taken up together; the pool's few connections set the pace. */
const AT_ONCE = 100;

export type DigestJob = Readonly<{ userId: string }>;

/** What the worker does about digests; both are use-cases under the job's own actor. */
export type DigestWork = Readonly<{
  dueReaders: () => Promise<string[]>;
  sendDigest: (userId: string) => Promise<void>;
}>;

/**
 * Start the job queue under the application's role: its tables and queues were
 * made by the migration. A reader never waits in it twice; should two jobs meet
 * all the same, the digest's own row lets one through. A job that fails is not
 * repeated: its reader is still due at the next quarter of an hour.
 *
 * @returns stops it, after the jobs in hand are done
 */
export async function startJobs(databaseUrl: string, work: DigestWork): Promise<() => Promise<void>> {
  const boss = new PgBoss({ connectionString: databaseUrl, migrate: false, application_name: "notchbook jobs", max: 4 });
  boss.on("error", (error) => logEvent("error", "jobs.failed", errorFields(error)));
  await boss.start();
  await boss.schedule(DIGEST_CLOCK, EVERY_QUARTER_HOUR);
  await boss.work(DIGEST_CLOCK, { pollingIntervalSeconds: 2 }, async () => {
    const userIds = await work.dueReaders();
    if (userIds.length > 0) {
      await boss.insert(userIds.map((userId) => ({ name: DIGEST_OF_READER, data: { userId }, singletonKey: userId })));
    }
    logEvent("info", "digest.due", { readers: userIds.length });
  });
  await boss.work<DigestJob>(DIGEST_OF_READER, { pollingIntervalSeconds: 1, batchSize: AT_ONCE }, async (jobs) => {
    await Promise.all(jobs.map(({ data }) => sendOne(work, data.userId)));
  });
  await boss.send(DIGEST_CLOCK, {});
  return () => boss.stop({ graceful: true, timeout: 10_000 });
}

async function sendOne(work: DigestWork, userId: string): Promise<void> {
  try {
    await work.sendDigest(userId);
  } catch (error) {
    logEvent("error", "digest.failed", { userId, ...errorFields(error) });
  }
}
