import "server-only";
import { insertToken, listTokens } from "@/db/repositories/api-tokens";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { hashSecret, newSecret } from "@/lib/secrets";
import { TOKEN_DAYS, TOKENS_AT_MOST } from "../constants";
import { createTokenInput } from "../schema";

/**
 * A personal token for the HTTP interface. The secret is in the answer and
 * nowhere else: the database keeps its hash.
 *
 * @throws {AppError} INVALID_INPUT on `label` when the account has as many as it may
 */
export async function createToken(ctx: Context, input: unknown): Promise<{ secret: string }> {
  const { label, scope } = createTokenInput.parse(input);
  authorize(ctx.actor, "token.manage");
  const { userId } = requireUser(ctx.actor);
  const createdAt = ctx.now();
  const present = await listTokens(ctx.db, userId, createdAt);
  if (present.length >= TOKENS_AT_MOST) {
    throw new AppError("INVALID_INPUT", "too many tokens", { label: [`There are ${TOKENS_AT_MOST} tokens already. End one of them first.`] });
  }
  const secret = newSecret();
  const expiresAt = new Date(createdAt.getTime() + TOKEN_DAYS * 86_400_000);
  await insertToken(ctx.db, { userId, tokenHash: hashSecret(secret), label, scope, createdAt, expiresAt });
  return { secret };
}
