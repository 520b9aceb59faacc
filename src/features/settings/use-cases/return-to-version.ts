import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { listVersions } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { GuardrailCode } from "@/domain/settings/guardrail-table";
import type { Context } from "@/lib/context";
import { returnToInput } from "../schema";
import { saveVersion } from "./save-version";

/** What going back answers by itself: how soon and how far is what an undo is. Lows and ketones are asked about. */
const ANSWERED_BY_UNDO = ["too-soon", "too-big"] as const satisfies ReadonlyArray<GuardrailCode>;

/**
 * One press back to an earlier version: a new version with the same content.
 * Recorded at once where the gate is open, sent to the educator where it is not.
 *
 * @throws {AppError} INVALID_INPUT naming a guardrail that waits for an answer;
 *   CONFLICT when that version was never in effect or is the one in effect
 */
export async function returnToVersion(
  ctx: Context,
  input: { journalId: string; number: number | string; reasonText?: string; answers?: Record<string, string> },
): Promise<{ number: number; state: VersionState }> {
  const { journalId, number, reasonText, answers } = returnToInput.parse(input);
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
    answers: { ...Object.fromEntries(ANSWERED_BY_UNDO.map((code) => [code, `Back to version ${number}`])), ...answers },
    kind: "undo",
    action: isGateOpen ? "record" : "propose",
  });
}
