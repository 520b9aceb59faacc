import "server-only";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";
import { endSessionInput } from "../schema";

/** Which of one's own sessions is to end. @throws {AppError} UNAUTHENTICATED */
export function endSession(ctx: Context, input: { sessionId: string }): { userId: string; sessionId: string } {
  const { sessionId } = endSessionInput.parse(input);
  authorize(ctx.actor, "account.use");
  return { userId: requireUser(ctx.actor).userId, sessionId };
}
