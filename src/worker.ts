import { randomUUID } from "node:crypto";
import { setTimeout as wait } from "node:timers/promises";
import { openPool } from "@/db/client";
import { assertServable, env } from "@/env";
import { findingSentence } from "@/features/comparison/queries/finding-sentence";
import { dueReaders } from "@/features/digest/queries/due-readers";
import { sendDigest } from "@/features/digest/use-cases/send-digest";
import type { Context } from "@/lib/context";
import { startJobs } from "@/lib/jobs";
import { errorFields, logEvent } from "@/lib/log";
import { mailConsent } from "@/lib/mail-consent";
import { deliverDueMail, resendSender } from "@/lib/mailer";

/**
 * The worker: a process of its own beside the web server. It writes the weekly
 * digests that are due and sends what stands in the outbox. Any number may run.
 */

const BETWEEN_LOOKS_MS = 1_000;
const AFTER_A_FAULT_MS = 5_000;

assertServable();

const db = openPool(env.databaseUrl, 5);
const now = () => new Date();
const stopping = new AbortController();

/** A job acts for itself, through the same policy as everybody. */
const jobContext = (): Context => ({ actor: { type: "job", job: "weekly-digest" }, db, now, requestId: randomUUID() });

async function deliverUntilStopped(): Promise<void> {
  const send = resendSender();
  const mayStillSend = mailConsent(db, now);
  while (!stopping.signal.aborted) {
    const pause = await deliverDueMail(db, now, send, mayStillSend, stopping.signal).then(() => BETWEEN_LOOKS_MS, noteFault);
    await wait(pause, undefined, { signal: stopping.signal }).catch(() => undefined);
  }
}

function noteFault(error: unknown): number {
  logEvent("error", "mail.stalled", errorFields(error));
  return AFTER_A_FAULT_MS;
}

for (const signal of ["SIGTERM", "SIGINT"] as const) process.once(signal, () => stopping.abort());

const stopJobs = await startJobs(env.databaseUrl, {
  dueReaders: () => dueReaders(jobContext()),
  sendDigest: async (userId) => {
    const context = jobContext();
    const mailId = await sendDigest(context, { userId }, (journalId, number) => findingSentence(context, journalId, number));
    if (mailId) logEvent("info", "digest.written", { userId, mailId, requestId: context.requestId });
  },
});
logEvent("info", "worker.ready");

await deliverUntilStopped();
await stopJobs();
await db.$client.end({ timeout: 5 });
logEvent("info", "worker.stopped");
