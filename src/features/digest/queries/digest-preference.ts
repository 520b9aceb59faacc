import "server-only";
import { findDigestPreference } from "@/db/repositories/digest-preferences";
import { authorize, requireUser } from "@/domain/access/policy";
import type { DigestPreference } from "@/domain/digest/preference";
import type { Context } from "@/lib/context";

/** What the signed-in reader chose about mail. */
export async function digestPreference(ctx: Context): Promise<DigestPreference> {
  authorize(ctx.actor, "digest.choose");
  return findDigestPreference(ctx.db, requireUser(ctx.actor).userId);
}
