import "server-only";
import { authorize } from "@/domain/access/policy";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { Context } from "@/lib/context";
import { returnVersionInput, type ReturnVersionInput } from "../schema";
import { decideVersion } from "./decide-version";

/** An educator sends a proposal back with remarks; the person mends it as a new revision. @throws {AppError} as `decideVersion` */
export async function returnVersion(ctx: Context, input: ReturnVersionInput): Promise<{ number: number; state: VersionState }> {
  const { journalId, number, contentHash, reason, remarks } = returnVersionInput.parse(input);
  authorize(ctx.actor, "version.review", journalId);
  return decideVersion(ctx, { journalId, number, contentHash, event: "return", reasonCode: reason, remarks, reviewOn: null, signOff: () => "" });
}
