import { createHash, createHmac, randomBytes, timingSafeEqual } from "node:crypto";
import { env } from "@/env";

/** A new secret of 256 bits for a link or a token. */
export function newSecret(): string {
  return randomBytes(32).toString("base64url");
}

/** What the database keeps of a secret. */
export function hashSecret(secret: string): string {
  return createHash("sha256").update(secret).digest("hex");
}

/** A link's proof that it unsubscribes this reader: no sign-in needed, nothing to store. */
export function unsubscribeToken(userId: string): string {
  const mac = createHmac("sha256", env.unsubscribeSecret).update(`digest:${userId}`).digest("base64url");
  return `${userId}.${mac}`;
}

/** The reader a token belongs to, or null when it was not made by us. */
export function readUnsubscribeToken(token: string): string | null {
  const userId = token.split(".")[0] ?? "";
  const expected = Buffer.from(unsubscribeToken(userId));
  const given = Buffer.from(token);
  return expected.length === given.length && timingSafeEqual(expected, given) ? userId : null;
}
