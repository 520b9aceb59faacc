import "server-only";
import { authorize } from "@/domain/access/policy";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { Context } from "@/lib/context";
import { declineVersionInput, type DeclineVersionInput } from "../schema";
import { decideVersion } from "./decide-version";

/** An educator says no to a proposal, with a reason; a new proposal takes a new number. @throws {AppError} as `decideVersion` */
export async function declineVersion(ctx: Context, input: DeclineVersionInput): Promise<{ number: number; state: VersionState }> {
  const { journalId, number, contentHash, reason, remarks } = declineVersionInput.parse(input);
  authorize(ctx.actor, "version.review", journalId);
  return decideVersion(ctx, { journalId, number, contentHash, event: "decline", reasonCode: reason, remarks, reviewOn: null, signOff: () => "" });
}
