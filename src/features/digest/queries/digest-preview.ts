import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { findDigestPreference } from "@/db/repositories/digest-preferences";
import { authorize, requireUser } from "@/domain/access/policy";
import { isoDayOf } from "@/domain/iso-day";
import type { DigestPreference } from "@/domain/digest/preference";
import type { Digest, FindingOf } from "@/domain/digest/week";
import type { Context } from "@/lib/context";
import { composeDigest } from "./digest";

/** What the signed-in reader chose, and the week up to today as the mail would tell it; no digest when switched off. */
export async function digestPreview(
  ctx: Context,
  findingOf: FindingOf,
): Promise<{ preference: DigestPreference; digest: Digest | null; timeZone: string }> {
  authorize(ctx.actor, "digest.choose");
  const { userId } = requireUser(ctx.actor);
  const timeZone = (await findAccount(ctx.db, userId))?.timeZone ?? "UTC";
  const preference = await findDigestPreference(ctx.db, userId);
  const composed = await composeDigest(ctx, { userId, today: isoDayOf(ctx.now(), timeZone) }, findingOf);
  return { preference, digest: composed?.digest ?? null, timeZone };
}
