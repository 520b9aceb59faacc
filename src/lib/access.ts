import { insertAccess } from "@/db/repositories/access-log";
import { findGrant } from "@/domain/access/policy";
import type { Context } from "./context";

/**
 * Note that somebody else looked, for the person's own page "who looked at
 * what, when". The person's own reads and the jobs' are not noted.
 *
 * @param what the page or file in words, such as "comparison of version 3"
 */
export async function recordRead(ctx: Context, journalId: string, what: string): Promise<void> {
  const grant = findGrant(ctx.actor, journalId);
  if (!grant || grant.role === "person" || ctx.actor.type !== "user") return;
  await insertAccess(ctx.db, { journalId, userId: ctx.actor.userId, role: grant.role, what, at: ctx.now() });
}
