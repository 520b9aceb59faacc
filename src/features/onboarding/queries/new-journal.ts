import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";

/** What the form of a new journal opens with: the account's own zone and unit. */
export async function newJournalStart(ctx: Context): Promise<{ timeZone: string; glucoseUnit: string }> {
  authorize(ctx.actor, "journal.create");
  const { userId } = requireUser(ctx.actor);
  const account = await findAccount(ctx.db, userId);
  return { timeZone: account?.timeZone ?? "UTC", glucoseUnit: account?.glucoseUnit ?? "mg/dL" };
}
