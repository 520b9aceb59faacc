import { render, toPlainText } from "@react-email/render";
import type { ReactElement } from "react";
import { Resend } from "resend";
import { leaseMail, markEnded, markForRetry, markSent, type LeasedMail } from "@/db/repositories/outbox";
import type { Db } from "@/db/client";
import { env } from "@/env";
import { logEvent } from "./log";

const LEASE_MS = 60_000;
/** The provider forgets an idempotency key after 24 h; past 20 h a retry could arrive twice, so it stops. */
const GIVE_UP_AFTER_MS = 20 * 3_600_000;

/** A template as the two parts of a mail, both complete. */
export async function renderMail(template: ReactElement): Promise<{ html: string; text: string }> {
  const html = await render(template);
  return { html, text: toPlainText(html) };
}

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
    return { error: `${status} ${error.name}`, isFinal: status >= 400 && status < 500 && status !== 408 && status !== 409 && status !== 429 };
  };
}

/** Whether a mail may still go out: asked at the moment of sending, not of writing. */
export type MayStillSend = (mail: LeasedMail) => Promise<boolean>;

/**
 * Send every due mail, one after another. A crash between sending and noting
 * it repeats the send under the same key, which the provider folds into one.
 *
 * @returns how many were sent
 */
export async function deliverDueMail(db: Db, now: () => Date, send: Send, mayStillSend: MayStillSend): Promise<number> {
  let sent = 0;
  for (;;) {
    const at = now();
    const mail = await leaseMail(db, at, new Date(at.getTime() + LEASE_MS));
    if (!mail) return sent;
    if (!(await mayStillSend(mail))) {
      await markEnded(db, mail.id, "dropped", "no longer wanted or allowed");
      continue;
    }
    const outcome = await attempt(send, mail);
    if ("providerId" in outcome) {
      await markSent(db, mail.id, outcome.providerId, now());
      sent += 1;
      continue;
    }
    const isDead = outcome.isFinal || now().getTime() - mail.createdAt.getTime() > GIVE_UP_AFTER_MS;
    logEvent(isDead ? "error" : "warn", "mail.refused", { mailId: mail.id, kind: mail.kind, error: outcome.error, isDead, requestId: mail.requestId });
    if (isDead) await markEnded(db, mail.id, "dead", outcome.error);
    else await markForRetry(db, mail.id, new Date(now().getTime() + backoffMs(mail.attempts)), outcome.error);
  }
}

async function attempt(send: Send, mail: LeasedMail): Promise<Awaited<ReturnType<Send>>> {
  try {
    return await send(mail);
  } catch (error) {
    return { error: error instanceof Error ? error.name : "unknown", isFinal: false };
  }
}

/** 5 s, 10 s, 20 s … at most an hour. */
function backoffMs(attempts: number): number {
  return Math.min(3_600_000, 5_000 * 2 ** Math.max(0, attempts - 1));
}
