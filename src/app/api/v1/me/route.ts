import { authorize, requireUser } from "@/domain/access/policy";
import { ownAccount } from "@/features/account/queries/account";
import { apiRoute, json } from "@/lib/api";

/** Who am I, and where may I come in. */
export const GET = apiRoute(async (ctx) => {
  const { email } = await ownAccount(ctx);
  authorize(ctx.actor, "account.use");
  const actor = requireUser(ctx.actor);
  return json({
    userId: actor.userId,
    email,
    roles: actor.isAdministrator ? ["administrator"] : [],
    journals: actor.grants.map(({ journalId, role }) => ({ id: journalId, role })),
  });
});
