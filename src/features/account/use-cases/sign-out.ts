import "server-only";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";

/** Whose session is to end; the edge ends the one it came with. @throws {AppError} UNAUTHENTICATED */
export function signOut(ctx: Context): { userId: string } {
  authorize(ctx.actor, "account.use");
  return { userId: requireUser(ctx.actor).userId };
}
