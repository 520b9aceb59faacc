import "server-only";
import { upsertCredential } from "@/db/repositories/credentials";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";
import { submitCredentialInput } from "../schema";

/** Hand in or renew one's licence as an educator; it counts once an administrator has verified it. */
export async function submitCredential(ctx: Context, input: unknown): Promise<void> {
  const licence = submitCredentialInput.parse(input);
  authorize(ctx.actor, "credential.submit");
  await upsertCredential(ctx.db, { ...licence, userId: requireUser(ctx.actor).userId, submittedAt: ctx.now() });
}
