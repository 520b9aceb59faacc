import "server-only";
import { findCredential } from "@/db/repositories/credentials";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";

/** One's own licence as an educator, or null when none was handed in. */
export async function ownLicence(ctx: Context) {
  authorize(ctx.actor, "credential.submit");
  const licence = await findCredential(ctx.db, requireUser(ctx.actor).userId);
  if (!licence) return null;
  const { profession, licenceNumber, jurisdiction, expiresOn, verifiedAt } = licence;
  const isOver = expiresOn < ctx.now().toISOString().slice(0, 10);
  const state = isOver ? ("over" as const) : verifiedAt ? ("verified" as const) : ("waiting" as const);
  return { profession, licenceNumber, jurisdiction, expiresOn, state };
}
