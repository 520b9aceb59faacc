import { spawn, type ChildProcess } from "node:child_process";
import { once } from "node:events";
import { setTimeout as wait } from "node:timers/promises";
import { eq } from "drizzle-orm";
import { afterAll, describe, expect, it } from "vitest";
import { saveDigestPreference } from "@/db/repositories/digest-preferences";
import { revokeGrant } from "@/db/repositories/grants";
import { findAccount } from "@/db/repositories/accounts";
import { outbox } from "@/db/schema/mail";
import { DEFAULT_DIGEST_PREFERENCE } from "@/domain/digest/preference";
import { sendDigest } from "@/features/digest/use-cases/send-digest";
import { contextAs, createJournal, createPerson, grantRole } from "@/testing/factories";
import { createTestDatabase } from "@/testing/test-database";
import { MAIL_FAULTS } from "./mail-faults";
import { startMailServer } from "./mail-server";

const DIGESTS = 50;
const KILLS = 5;
const FAULTY = { share: 0.5, seed: 20_260_316, faults: MAIL_FAULTS.filter((fault) => fault !== "none") };

let worker: ChildProcess | undefined;
afterAll(() => worker?.kill("SIGKILL"));

function startWorker(appUrl: string, mailUrl: string): ChildProcess {
  const env = { ...process.env, NODE_ENV: "test" as const, DATABASE_URL: "", APP_DATABASE_URL: appUrl, RESEND_BASE_URL: mailUrl, RESEND_API_KEY: "local-fake", LOG_LEVEL: "error" };
  return spawn(process.execPath, ["--import", "tsx", "--import", "./src/commands/server-only.mjs", "src/worker.ts"], { env, stdio: "ignore" });
}

describe("the worker against a mail provider that goes amiss", () => {
  it(`delivers ${DIGESTS} digests exactly once through ${KILLS} kills, and none to a helper who was removed`, async () => {
    const { app: db, appUrl } = await createTestDatabase();
    const mail = await startMailServer({ port: 0, file: null, holdMs: 300 });
    await fetch(`${mail.url}/faults`, { method: "PUT", body: JSON.stringify(FAULTY) });

    const minuteAgo = new Date(Date.now() - 60_000);
    const choice = { weekday: minuteAgo.getUTCDay() || 7, minuteOfDay: minuteAgo.getUTCHours() * 60 + minuteAgo.getUTCMinutes() };
    const before = new Date(Date.now() - 86_400_000);
    const job = contextAs(db, { type: "job", job: "weekly-digest" }, new Date());
    const write = async (userId: string) => {
      await saveDigestPreference(db, userId, { ...DEFAULT_DIGEST_PREFERENCE, ...choice }, before);
      return sendDigest(job, { userId }, () => Promise.resolve(null));
    };
    const readers: string[] = [];
    for (let i = 0; i < DIGESTS; i += 1) {
      const { ownerId } = await createJournal(db, { ownerId: await createPerson(db, { at: before, timeZone: "UTC" }), at: before });
      expect(await write(ownerId)).not.toBeNull();
      readers.push(ownerId);
    }
    const journal = await createJournal(db, { at: before });
    await saveDigestPreference(db, journal.ownerId, { ...DEFAULT_DIGEST_PREFERENCE, level: "off" }, before);
    const removed = await createPerson(db, { at: before, timeZone: "UTC" });
    await grantRole(db, { journalId: journal.journalId, userId: removed, role: "mentor", grantedBy: journal.ownerId, at: before });
    expect(await write(removed)).not.toBeNull();
    await revokeGrant(db, journal.journalId, removed, new Date());

    const waiting = async () => (await db.select().from(outbox).where(eq(outbox.state, "waiting"))).length;
    /** What an hour of waiting would do: retries fall due, and a dead worker's hold on a mail runs out. */
    const passTime = () => db.update(outbox).set({ nextAttemptAt: new Date(0), leaseUntil: null }).where(eq(outbox.state, "waiting"));
    for (let kills = 0; kills < KILLS; kills += 1) {
      worker = startWorker(appUrl, mail.url);
      const aim = DIGESTS - Math.round((DIGESTS * (kills + 1)) / (KILLS + 1));
      while ((await waiting()) > aim) {
        await wait(40);
        await passTime();
      }
      const ended = once(worker, "exit");
      worker.kill("SIGKILL");
      await ended;
      await passTime();
    }
    worker = startWorker(appUrl, mail.url);
    while ((await waiting()) > 0) {
      await wait(100);
      await passTime();
    }
    const ended = once(worker, "exit");
    worker.kill("SIGTERM");
    expect(await ended).toEqual([0, null]);

    const letters = mail.ledger.list();
    expect(letters).toHaveLength(DIGESTS);
    expect(new Set(letters.map(({ key }) => key)).size).toBe(DIGESTS);
    const addresses = await Promise.all(readers.map(async (userId) => (await findAccount(db, userId))?.email ?? ""));
    expect(letters.map(({ to }) => to[0]).sort()).toEqual(addresses.sort());
    const rows = await db.select().from(outbox).where(eq(outbox.state, "sent"));
    const ids = new Map(letters.map(({ id, key }) => [key, id]));
    for (const row of rows) expect(row.providerId).toBe(ids.get(`${row.kind}/${row.id}`));
    expect(rows).toHaveLength(DIGESTS);
    expect(await db.select().from(outbox).where(eq(outbox.recipientId, removed))).toMatchObject([{ state: "dropped" }]);
    await mail.close();
  }, 180_000);
});
