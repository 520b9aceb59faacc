import "server-only";
import { authorize } from "@/domain/access/policy";
import { dayNumberOf } from "@/domain/day-start";
import { AppError } from "@/domain/errors";
import { isoDayOfNumber } from "@/domain/iso-day";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { Context } from "@/lib/context";
import { signOffText } from "../constants";
import { approveVersionInput, type ApproveVersionInput } from "../schema";
import { decideVersion } from "./decide-version";

const DATA_DAYS = 14;

/** An educator approves exactly the content shown, and signs. @throws {AppError} as `decideVersion` */
export async function approveVersion(ctx: Context, input: ApproveVersionInput): Promise<{ number: number; state: VersionState }> {
  const { journalId, number, contentHash, reviewOn, remarks } = approveVersionInput.parse(input);
  authorize(ctx.actor, "version.review", journalId);
  const today = ctx.now().toISOString().slice(0, 10);
  if (reviewOn <= today) throw new AppError("INVALID_INPUT", "reviewOn", { reviewOn: ["The next review lies ahead."] });
  const firstDay = isoDayOfNumber(dayNumberOf(today) - DATA_DAYS);
  return decideVersion(ctx, {
    journalId, number, contentHash, event: "approve", reasonCode: "", remarks, reviewOn,
    signOff: (version) => signOffText({ number, contentHash: version.contentHash, firstDay, lastDay: today, reviewOn }),
  });
}
