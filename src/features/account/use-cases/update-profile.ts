import "server-only";
import { updateAccount } from "@/db/repositories/accounts";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";
import { updateAccountInput } from "../schema";

/** Change the name that others see, the zone and the unit of one's own account. */
export async function updateProfile(ctx: Context, input: unknown): Promise<void> {
  const changes = updateAccountInput.parse(input);
  authorize(ctx.actor, "account.use");
  await updateAccount(ctx.db, requireUser(ctx.actor).userId, changes);
}
