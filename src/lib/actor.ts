import { findAccount } from "@/db/repositories/accounts";
import { listLiveGrants } from "@/db/repositories/grants";
import type { Db } from "@/db/client";
import type { Actor } from "@/domain/access/policy";

/**
 * The actor behind an account, read fresh: a withdrawn grant, a lapsed licence
 * or a closed account counts from the next request on.
 */
export async function findActor(db: Db, userId: string, now: Date): Promise<Actor> {
  const account = await findAccount(db, userId);
  if (!account || account.closedAt) return { type: "anonymous" };
  const grants = await listLiveGrants(db, userId, now);
  return {
    type: "user",
    userId,
    isEmailVerified: account.emailVerifiedAt !== null,
    isAdministrator: account.isAdministrator,
    isLicensed: account.licenceVerifiedAt !== null && account.licenceExpiresOn !== null
      && account.licenceExpiresOn >= now.toISOString().slice(0, 10),
    grants,
  };
}
