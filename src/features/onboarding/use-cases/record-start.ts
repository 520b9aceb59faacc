import "server-only";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { findJournal, updateJournal } from "@/db/repositories/journals";
import { appendEvent } from "@/db/repositories/journal-events";
import { insertVersion, listVersions, lockJournal, moveVersion, nextVersionNumber } from "@/db/repositories/versions";
import { findDraft } from "@/db/repositories/wizard-drafts";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { isoDayOf } from "@/domain/iso-day";
import { assertEdge } from "@/domain/journal/version-lifecycle";
import { assertMayRecord } from "@/domain/journal/version-lifecycle-rules";
import { instantOfLocal } from "@/domain/local-time";
import { draftStanding } from "@/domain/onboarding/draft-standing";
import { draftedVersion } from "@/domain/onboarding/drafted-version";
import { hashProfile } from "@/lib/content-hash";
import type { Context } from "@/lib/context";
import { RECORDED_TEXT } from "../constants";
import { recordStartInput, type RecordStartInput } from "../schema";

/**
 * Without a review: the person says knowingly that the draft is on the device.
 * It is in effect at once, marked as recorded, and its day is day 1. Only with
 * an open gate, a way back written down and somebody to call; never in place of
 * a proposal that an educator sent back.
 *
 * @throws {AppError} GATE_CLOSED; CONFLICT when a version stands or was returned;
 *   STALE when the draft was saved elsewhere; INVALID_INPUT by field
 */
export async function recordStart(ctx: Context, input: RecordStartInput): Promise<{ number: number }> {
  const { journalId, rowVersion, note, effectiveFrom: typed } = recordStartInput.parse(input);
  authorize(ctx.actor, "version.record", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    await lockJournal(tx, journalId);
    const journal = await findJournal(tx, journalId);
    const draft = await findDraft(tx, journalId);
    if (!journal || !draft) throw new AppError("NOT_FOUND", `journal ${journalId}`);
    const standing = draftStanding(await listVersions(tx, journalId));
    if (standing.is === "sent") throw new AppError("CONFLICT", `version ${standing.version.number} is ${standing.version.state}`);
    const state = assertEdge(standing.returned ? "returned" : "draft", "record");
    if (draft.rowVersion !== rowVersion) throw new AppError("STALE", "the draft was saved elsewhere");
    const { profile, arithmetic, checks } = draftedVersion(draft.answers, journal);
    assertMayRecord(arithmetic.gate.open);
    const card = await findFallbackCard(tx, journalId);
    if (!card || card.previousSetup === "" || card.contacts.length === 0) {
      throw new AppError("INVALID_INPUT", "the way back is missing", { form: ["The way back and somebody to call come first. Fill in the page “Way back”."] });
    }

    const at = ctx.now();
    const effectiveFrom = typed === "" ? at : instantOfLocal(typed, journal.timeZone, "effectiveFrom");
    if (effectiveFrom.getTime() > at.getTime() + 60_000) {
      throw new AppError("INVALID_INPUT", "effectiveFrom", { effectiveFrom: ["This lies ahead. Type when the settings were entered on the device."] });
    }
    const number = await nextVersionNumber(tx, journalId);
    await insertVersion(
      tx,
      {
        journalId, number, revision: 1, parentNumber: null, kind: "starting", profile, contentHash: hashProfile(profile),
        reasonCode: "other", reasonText: note || "A careful start", expectation: null, evidenceDays: [], lookAgainOn: null, revertRule: "",
        guardrails: [
          { code: "recorded-without-review", severity: "informs", text: RECORDED_TEXT, answer: "" },
          ...checks.map((c) => ({ code: c.code, severity: c.severity, text: c.text, answer: "" })),
        ],
        arithmetic, authorId: userId, createdAt: at,
      },
      state,
    );
    await moveVersion(tx, { journalId, number, from: state, to: state, at }, { effectiveFrom });
    await updateJournal(tx, journalId, { gateReasons: [], ...(journal.startedOn === null ? { startedOn: isoDayOf(effectiveFrom, journal.timeZone) } : {}) });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "version.record", subject: `version ${number}`, requestId: ctx.requestId });
    return { number };
  });
}
