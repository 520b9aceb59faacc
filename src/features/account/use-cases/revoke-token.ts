import "server-only";
import { revokeToken as endToken } from "@/db/repositories/api-tokens";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { revokeTokenInput } from "../schema";

/** End one of one's own tokens at once. @throws {AppError} NOT_FOUND for anybody else's and for one that has ended */
export async function revokeToken(ctx: Context, input: unknown): Promise<void> {
  const { tokenId } = revokeTokenInput.parse(input);
  authorize(ctx.actor, "token.manage");
  if (!(await endToken(ctx.db, requireUser(ctx.actor).userId, tokenId, ctx.now()))) throw new AppError("NOT_FOUND", "no such token");
}
