import "server-only";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { findVersion, insertVersion, listVersions, lockJournal, moveVersion, nextVersionNumber } from "@/db/repositories/versions";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { assertEdge, type VersionState } from "@/domain/journal/version-lifecycle";
import { assertMayRecord } from "@/domain/journal/version-lifecycle-rules";
import { profileDifference } from "@/domain/settings/difference";
import { evaluateGuardrails } from "@/domain/settings/guardrails";
import type { Context } from "@/lib/context";
import { hashProfile } from "@/lib/content-hash";
import { answeredGuardrails } from "@/domain/settings/guardrail-answers";
import { guardrailFacts } from "../queries/guardrail-facts";
import { saveVersionInput, type SaveVersionInput } from "../schema";

/**
 * Propose a changed profile to the educator, or record it where the gate allows.
 *
 * The snapshot, its state and the journal's event are one transaction under the
 * journal's lock, so numbers are gapless and a double send meets a conflict. A
 * recorded version comes into effect at once and supersedes the one before.
 *
 * @throws {AppError} INVALID_INPUT naming each guardrail that waits for an
 *   answer; GATE_CLOSED for a record that needs an educator; CONFLICT when a
 *   version is waiting already or the base is no longer in effect
 */
export async function saveVersion(ctx: Context, input: SaveVersionInput): Promise<{ number: number; state: VersionState }> {
  const { journalId, action, ...change } = saveVersionInput.parse(input);
  authorize(ctx.actor, action === "propose" ? "version.propose" : "version.record", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    await lockJournal(tx, journalId);
    const journal = await findJournal(tx, journalId);
    const base = await findVersion(tx, journalId, change.baseVersion);
    if (!journal || !base) throw new AppError("NOT_FOUND", `version ${change.baseVersion}`);
    const versions = await listVersions(tx, journalId);
    const inEffect = versions.find((v) => v.state === "in-effect");
    const waiting = versions.find((v) => v.state === "proposed" || v.state === "approved" || v.state === "returned");
    if (!inEffect || inEffect.number !== change.baseVersion) throw new AppError("CONFLICT", "the version it starts from is not in effect");
    if (waiting) throw new AppError("CONFLICT", `version ${waiting.number} is ${waiting.state}`);
    if (action === "record") assertMayRecord(journal.gateReasons === null ? null : journal.gateReasons.length === 0);

    const at = ctx.now();
    const difference = profileDifference(inEffect.profile, change.profile);
    if (difference.changes.length === 0) throw new AppError("CONFLICT", "nothing would differ");
    const facts = await guardrailFacts({ ...ctx, db: tx }, { journal, versions, difference, change, at, isReviewed: action === "propose" });
    const guardrails = answeredGuardrails(evaluateGuardrails(facts), change.answers);

    const number = await nextVersionNumber(tx, journalId);
    const state = assertEdge("draft", action);
    await insertVersion(
      tx,
      {
        journalId, number, revision: 1, parentNumber: inEffect.number, kind: change.kind, profile: change.profile,
        contentHash: hashProfile(change.profile), reasonCode: change.reason.code, reasonText: change.reason.text,
        expectation: change.expectation, evidenceDays: change.evidenceDays, lookAgainOn: change.lookAgainOn,
        revertRule: change.revertRule, guardrails, arithmetic: null, authorId: userId, createdAt: at,
      },
      state,
    );
    if (action === "record") {
      await moveVersion(tx, { journalId, number: inEffect.number, from: "in-effect", to: assertEdge("in-effect", "supersede"), at }, { effectiveUntil: at });
      await moveVersion(tx, { journalId, number, from: "in-effect", to: "in-effect", at }, { effectiveFrom: at });
    }
    await appendEvent(tx, {
      journalId, at, actorId: userId, actorKind: "user", action: action === "propose" ? "version.propose" : "version.record",
      subject: `version ${number}`, requestId: ctx.requestId,
    });
    return { number, state };
  });
}
