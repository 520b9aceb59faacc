import "server-only";
import { saveDigestPreference as save } from "@/db/repositories/digest-preferences";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";
import { digestPreferenceInput, type DigestPreferenceInput } from "../schema";

/** Choose how much of a week comes by mail, and when. What was written at a higher level and not sent yet is dropped. */
export async function saveDigestPreference(ctx: Context, input: DigestPreferenceInput): Promise<void> {
  const preference = digestPreferenceInput.parse(input);
  authorize(ctx.actor, "digest.choose");
  await save(ctx.db, requireUser(ctx.actor).userId, preference, ctx.now());
}
