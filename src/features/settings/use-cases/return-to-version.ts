import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { listVersions } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { Context } from "@/lib/context";
import { returnToInput } from "../schema";
import { saveVersion } from "./save-version";

/**
 * One press back to an earlier version: a new version with the same content.
 * Recorded at once where the gate is open, sent to the educator where it is not.
 *
 * @throws {AppError} CONFLICT when that version was never in effect or is the one in effect
 */
export async function returnToVersion(
  ctx: Context,
  input: { journalId: string; number: number | string; reasonText?: string },
): Promise<{ number: number; state: VersionState }> {
  const { journalId, number, reasonText } = returnToInput.parse(input);
  authorize(ctx.actor, "version.record", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const versions = await listVersions(ctx.db, journalId);
  const earlier = versions.find((v) => v.number === number);
  const inEffect = versions.find((v) => v.state === "in-effect");
  if (!journal || !earlier) throw new AppError("NOT_FOUND", `version ${number}`);
  if (!inEffect || earlier.state !== "superseded") throw new AppError("CONFLICT", `version ${number} is ${earlier.state}`);
  const isGateOpen = journal.gateReasons !== null && journal.gateReasons.length === 0;
  return saveVersion(ctx, {
    journalId,
    baseVersion: inEffect.number,
    profile: earlier.profile,
    reason: { code: "undo", text: reasonText || `Back to version ${number}` },
    expectation: { outcome: "lows", window: "whole-day", direction: "fall" },
    evidenceDays: [],
    answers: Object.fromEntries(["too-soon", "too-big", "one-family", "stronger-after-lows"].map((code) => [code, `Back to version ${number}`])),
    kind: "undo",
    action: isGateOpen ? "record" : "propose",
  });
}
