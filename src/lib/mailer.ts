import { render, toPlainText } from "@react-email/render";
import type { ReactElement } from "react";
import { Resend } from "resend";
import { leaseMail, markEnded, markForRetry, markSent, type LeasedMail } from "@/db/repositories/outbox";
import type { Db } from "@/db/client";
import { env } from "@/env";
import { logEvent } from "./log";

const LEASE_MS = 60_000;
/** Shorter than the lease, so that a provider that never answers is given up while the mail is still ours. */
const ANSWER_WITHIN_MS = 20_000;
/** The provider forgets an idempotency key after 24 h; past 20 h a retry could arrive twice, so it stops. */
const GIVE_UP_AFTER_MS = 20 * 3_600_000;

/** A template as the two parts of a mail, both complete. */
export async function renderMail(template: ReactElement): Promise<{ html: string; text: string }> {
  const html = await render(template);
  return { html, text: toPlainText(html, { selectors: TEXT_HEADINGS }) };
}

/** Headings of the text part: set off by one empty line, the lesser ones as they are written. */
const TEXT_HEADINGS = [
  { selector: "h2", options: { leadingLineBreaks: 3, trailingLineBreaks: 1, uppercase: true } },
  { selector: "h3", options: { leadingLineBreaks: 2, trailingLineBreaks: 1, uppercase: false } },
  { selector: "ul", options: { itemPrefix: "- ", leadingLineBreaks: 1, trailingLineBreaks: 2 } },
];

/** Hand one mail to the provider. @returns its id there, or why not */
export type Send = (mail: LeasedMail) => Promise<{ providerId: string } | { error: string; isFinal: boolean }>;

/** Send through the provider's SDK; its base address decides whether that is the provider or the local fake. */
export function resendSender(): Send {
  const resend = new Resend(env.resendApiKey, env.resendBaseUrl ? { baseUrl: env.resendBaseUrl } : undefined);
  return async (mail) => {
    const { data, error } = await resend.emails.send(
      { from: env.mailFrom, to: mail.toAddress, subject: mail.subject, html: mail.html, text: mail.text, headers: mail.headers },
      { idempotencyKey: `${mail.kind}/${mail.id}` },
    );
    if (data) return { providerId: data.id };
    const status = error.statusCode ?? 0;
    return { error: `${status} ${error.name}`, isFinal: isFinal(status, error.name) };
  };
}

/** Whether asking again can change the answer. A key that was used for another body stays refused. */
function isFinal(status: number, name: string): boolean {
  if (name === "invalid_idempotent_request") return true;
  return status >= 400 && status < 500 && ![408, 409, 429].includes(status);
}

/** Whether a mail may still go out: asked at the moment of sending, not of writing. */
export type MayStillSend = (mail: LeasedMail) => Promise<boolean>;

/**
 * Send every due mail, one after another. A crash between sending and noting
 * it repeats the send under the same key, which the provider folds into one.
 *
 * @param signal once aborted, the mail in hand is finished and no other begun
 * @returns how many were sent
 */
export async function deliverDueMail(
  db: Db, now: () => Date, send: Send, mayStillSend: MayStillSend, signal?: AbortSignal,
): Promise<number> {
  let sent = 0;
  while (!signal?.aborted) {
    const at = now();
    const mail = await leaseMail(db, at, new Date(at.getTime() + LEASE_MS));
    if (!mail) break;
    if (await deliver(db, now, mail, send, mayStillSend)) sent += 1;
  }
  return sent;
}

async function deliver(db: Db, now: () => Date, mail: LeasedMail, send: Send, mayStillSend: MayStillSend): Promise<boolean> {
  const isOld = () => now().getTime() - mail.createdAt.getTime() > GIVE_UP_AFTER_MS;
  const about = { mailId: mail.id, kind: mail.kind, requestId: mail.requestId, attempts: mail.attempts };
  if (!(await mayStillSend(mail))) {
    await markEnded(db, mail.id, "dropped", "no longer wanted or allowed");
    logEvent("info", "mail.dropped", about);
    return false;
  }
  const isTooLate = mail.attempts > 1 && isOld();
  const outcome = isTooLate ? { error: "tried for 20 hours", isFinal: true } : await attempt(send, mail);
  if ("providerId" in outcome) {
    await markSent(db, mail.id, outcome.providerId, now());
    logEvent("info", "mail.sent", about);
    return true;
  }
  const isDead = outcome.isFinal || isOld();
  logEvent(isDead ? "error" : "warn", "mail.refused", { ...about, error: outcome.error, isDead });
  if (isDead) await markEnded(db, mail.id, "dead", outcome.error);
  else await markForRetry(db, mail.id, new Date(now().getTime() + backoffMs(mail.attempts)), outcome.error);
  return false;
}

async function attempt(send: Send, mail: LeasedMail): Promise<Awaited<ReturnType<Send>>> {
  let timer: NodeJS.Timeout | undefined;
  const silence = new Promise<{ error: string; isFinal: boolean }>((resolve) => {
    timer = setTimeout(() => resolve({ error: "no answer", isFinal: false }), ANSWER_WITHIN_MS);
  });
  try {
    return await Promise.race([send(mail), silence]);
  } catch (error) {
    return { error: error instanceof Error ? error.name : "unknown", isFinal: false };
  } finally {
    clearTimeout(timer);
  }
}

/** 5 s, 10 s, 20 s … at most an hour. */
function backoffMs(attempts: number): number {
  return Math.min(3_600_000, 5_000 * 2 ** Math.max(0, attempts - 1));
}
