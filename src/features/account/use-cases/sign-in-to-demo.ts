import "server-only";
import { findAccountByEmail } from "@/db/repositories/accounts";
import { listJournalsOf } from "@/db/repositories/grants";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { env } from "@/env";
import type { Context } from "@/lib/context";
import { DEMO_ADDRESSES } from "../constants";
import { demoRoleInput } from "../schema";

/** One press into the invented demo, where the server runs one. @throws {AppError} NOT_FOUND elsewhere */
export async function signInToDemo(ctx: Context, input: { role: string }): Promise<{ userId: string; next: string }> {
  const { role } = demoRoleInput.parse(input);
  authorize(ctx.actor, "account.enter");
  const account = env.isDemo ? await findAccountByEmail(ctx.db, DEMO_ADDRESSES[role]) : undefined;
  if (!account) throw new AppError("NOT_FOUND", "no demo here");
  if (role === "educator") return { userId: account.id, next: "/review" };
  if (role === "administrator") return { userId: account.id, next: "/administration" };
  const [journal] = await listJournalsOf(ctx.db, account.id, ctx.now());
  return { userId: account.id, next: role === "person" && journal ? `/j/${journal.journalId}/today` : "/journals" };
}
