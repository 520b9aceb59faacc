import type { Digest } from "@/domain/digest/week";
import { env } from "@/env";
import { renderMail } from "@/lib/mailer";
import { unsubscribeToken } from "@/lib/secrets";
import { DigestMail } from "./digest-mail";

export type DigestLetter = Readonly<{ subject: string; html: string; text: string; headers: Record<string, string> }>;

/** A digest as a mail, with the link and the headers by which one press ends them (RFC 2369, RFC 8058). */
export async function digestLetter(digest: Digest, reader: Readonly<{ userId: string; displayName: string }>): Promise<DigestLetter> {
  const unsubscribeHref = `${env.publicOrigin}/api/digest/unsubscribe/${unsubscribeToken(reader.userId)}`;
  const body = await renderMail(DigestMail({ digest, name: reader.displayName, origin: env.publicOrigin, unsubscribeHref }));
  const headers = { "List-Unsubscribe": `<${unsubscribeHref}>`, "List-Unsubscribe-Post": "List-Unsubscribe=One-Click" };
  return { ...body, subject: digest.subject, headers };
}
