import "server-only";
import { listTokens } from "@/db/repositories/api-tokens";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";

/** One's own live tokens, newest first; never their secrets. */
export async function ownTokens(ctx: Context) {
  authorize(ctx.actor, "token.manage");
  return listTokens(ctx.db, requireUser(ctx.actor).userId, ctx.now());
}
