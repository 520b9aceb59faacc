import "server-only";
import { markCredentialVerified } from "@/db/repositories/credentials";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { logEvent } from "@/lib/log";
import { verifyCredentialInput } from "../schema";

/** An administrator has checked an educator's licence; approvals count from now on. @throws {AppError} NOT_FOUND */
export async function verifyCredential(ctx: Context, input: { userId: string }): Promise<void> {
  const { userId } = verifyCredentialInput.parse(input);
  authorize(ctx.actor, "credential.verify");
  const { userId: administratorId } = requireUser(ctx.actor);
  if (userId === administratorId) throw new AppError("FORBIDDEN", "an administrator verifies the own licence");
  if (!(await markCredentialVerified(ctx.db, userId, administratorId, ctx.now()))) throw new AppError("NOT_FOUND", "no licence handed in");
  logEvent("info", "credential.verified", { requestId: ctx.requestId, userId, administratorId });
}
