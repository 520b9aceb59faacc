import "server-only";
import { countAccounts } from "@/db/repositories/accounts";
import { listUnverifiedCredentials } from "@/db/repositories/credentials";
import { countMailByState } from "@/db/repositories/outbox";
import { authorize } from "@/domain/access/policy";
import type { Context } from "@/lib/context";

/** What keeps the service running; never health data. */
export async function serviceHealth(ctx: Context) {
  authorize(ctx.actor, "administration.read");
  const [accounts, mail, credentials] = await Promise.all([countAccounts(ctx.db), countMailByState(ctx.db), listUnverifiedCredentials(ctx.db)]);
  return { accounts, mail, credentials };
}
