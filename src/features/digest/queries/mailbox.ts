import "server-only";
import { z } from "zod";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { env } from "@/env";
import type { Context } from "@/lib/context";

const letterSchema = z.object({
  id: z.string(),
  receivedAt: z.string(),
  to: z.array(z.string()),
  subject: z.string(),
  text: z.string(),
  html: z.string(),
  headers: z.record(z.string(), z.string()),
});
export type Letter = z.infer<typeof letterSchema>;

const LETTERS_AT_MOST = 100;
const LOOPBACK = /^http:\/\/(127\.0\.0\.1|localhost)(:\d+)?(\/|$)/;

/**
 * The letters that the local mail service kept, newest first: a demo's stand-in
 * for everybody's mailbox. There is no such page anywhere else.
 *
 * @throws {AppError} NOT_FOUND outside a local demo; UNAVAILABLE when the mail service does not answer
 */
export async function mailbox(ctx: Context): Promise<Letter[]> {
  authorize(ctx.actor, "mailbox.read");
  const { resendBaseUrl, isDemo, isLoopback } = env;
  if (!isDemo || !isLoopback || !resendBaseUrl || !LOOPBACK.test(resendBaseUrl)) throw new AppError("NOT_FOUND", "no local mailbox");
  try {
    const answer = await fetch(`${resendBaseUrl}/mailbox`, { cache: "no-store", signal: AbortSignal.timeout(3000) });
    return z.array(letterSchema).parse(await answer.json()).slice(0, LETTERS_AT_MOST);
  } catch {
    throw new AppError("UNAVAILABLE", "the local mail service did not answer");
  }
}
