import type { Digest } from "@/domain/digest/week";
import { env } from "@/env";
import { renderMail } from "@/lib/mailer";
import { unsubscribeToken } from "@/lib/secrets";
import { DigestMail } from "./digest-mail";

export type DigestLetter = Readonly<{ subject: string; html: string; text: string; headers: Record<string, string> }>;

/**
 * A digest as a mail. People end them by the page behind the link at its foot,
 * mail programs by the address in the headers (RFC 2369, RFC 8058).
 */
export async function digestLetter(digest: Digest, reader: Readonly<{ userId: string; displayName: string }>): Promise<DigestLetter> {
  const origin = env.publicOrigin;
  const token = unsubscribeToken(reader.userId);
  const unsubscribeHref = `${origin}/unsubscribe?token=${token}`;
  const body = await renderMail(DigestMail({ digest, name: reader.displayName, origin, unsubscribeHref }));
  const headers = { "List-Unsubscribe": `<${origin}/api/digest/unsubscribe/${token}>`, "List-Unsubscribe-Post": "List-Unsubscribe=One-Click" };
  return { ...body, subject: digest.subject, headers };
}
