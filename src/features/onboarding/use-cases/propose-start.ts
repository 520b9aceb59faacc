import "server-only";
import { findJournal, updateJournal } from "@/db/repositories/journals";
import { appendEvent } from "@/db/repositories/journal-events";
import { insertVersion, listVersions, lockJournal, nextVersionNumber } from "@/db/repositories/versions";
import { findDraft } from "@/db/repositories/wizard-drafts";
import { listCircle } from "@/db/repositories/grants";
import { findAccount } from "@/db/repositories/accounts";
import { insertMail } from "@/db/repositories/outbox";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { assertEdge } from "@/domain/journal/version-lifecycle";
import { arithmeticOf } from "@/domain/onboarding/arithmetic";
import { draftedProfile } from "@/domain/onboarding/drafted-profile";
import { checkProfile } from "@/domain/settings/checks";
import { env } from "@/env";
import { hashProfile } from "@/lib/content-hash";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { ReviewAskedMail } from "../emails/review-asked-mail";
import { proposeStartInput, type ProposeStartInput } from "../schema";

/**
 * Ask the educator: the draft becomes one immutable version, proposed. After a
 * return with remarks the mended draft becomes the next wording of the same number.
 *
 * @throws {AppError} CONFLICT when a version waits or lives already (a double
 *   press makes one); STALE when the draft was saved elsewhere since the review
 *   page; INVALID_INPUT while a page is missing
 */
export async function proposeStart(ctx: Context, input: ProposeStartInput): Promise<{ number: number }> {
  const { journalId, rowVersion, note } = proposeStartInput.parse(input);
  authorize(ctx.actor, "version.propose", journalId);
  const { userId } = requireUser(ctx.actor);
  const mail = await renderMail(ReviewAskedMail({ href: `${env.publicOrigin}/review` }));

  return ctx.db.transaction(async (tx) => {
    await lockJournal(tx, journalId);
    const journal = await findJournal(tx, journalId);
    const draft = await findDraft(tx, journalId);
    if (!journal || !draft) throw new AppError("NOT_FOUND", `journal ${journalId}`);
    if (draft.rowVersion !== rowVersion) throw new AppError("STALE", "the draft was saved elsewhere");
    const returned = mendable(await listVersions(tx, journalId));

    const arithmetic = arithmeticOf(draft.answers, journal, true);
    if (!arithmetic) throw new AppError("INVALID_INPUT", "pages are missing", { form: ["A page before this one is not filled in yet."] });
    const profile = draftedProfile(draft.answers, arithmetic.profile?.cautious ?? null, journal);
    if (!profile) throw new AppError("INVALID_INPUT", "settings are missing", { form: ["A setting has no value yet. Go through the pages once more."] });

    const at = ctx.now();
    const number = returned?.number ?? (await nextVersionNumber(tx, journalId));
    const state = returned ? assertEdge("returned", "propose-again") : assertEdge("draft", "propose");
    const checks = checkProfile(profile, {
      totalDailyDoseUnits: arithmetic.totalDailyDose.cautious,
      basalStepMilliUnits: journal.setup.basalStepMilliUnits,
      bolusStepMilliUnits: journal.setup.bolusStepMilliUnits,
      weightKg: null,
      largestRecentBolusMilliUnits: null,
    });
    const blocking = checks.filter((c) => c.severity === "blocks").map((c) => c.text);
    if (blocking.length > 0) throw new AppError("INVALID_INPUT", "a check blocks", { form: blocking });
    await insertVersion(
      tx,
      {
        journalId, number, revision: (returned?.revision ?? 0) + 1, parentNumber: null, kind: "starting", profile, contentHash: hashProfile(profile),
        reasonCode: "other", reasonText: note || "A careful start", expectation: null, evidenceDays: [], lookAgainOn: null, revertRule: "",
        guardrails: checks.map((c) => ({ code: c.code, severity: c.severity, text: c.text, answer: "" })),
        arithmetic, authorId: userId, createdAt: at,
      },
      state,
    );
    await updateJournal(tx, journalId, { gateReasons: arithmetic.gate.reasons.map((r) => r.text) });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "version.propose", subject: `version ${number}`, requestId: ctx.requestId });
    for (const helper of await listCircle(tx, journalId, at)) {
      const educator = helper.role === "educator" ? await findAccount(tx, helper.userId) : undefined;
      if (!educator) continue;
      await insertMail(tx, {
        ...mail, kind: "review-asked", journalId, recipientId: educator.id, toAddress: educator.email, subject: "A proposal waits for you",
        dedupeKey: `review-asked/${journalId}/${number}/${(returned?.revision ?? 0) + 1}/${educator.id}`, requestId: ctx.requestId, createdAt: at,
      });
    }
    return { number };
  });
}

/** The returned starting profile that this one mends; null for a first. @throws {AppError} CONFLICT when another stands already */
function mendable(versions: Awaited<ReturnType<typeof listVersions>>) {
  const returned = versions.find((v) => v.kind === "starting" && v.state === "returned");
  const standing = versions.find((v) => ["proposed", "approved", "in-effect", "superseded"].includes(v.state));
  if (standing) throw new AppError("CONFLICT", `version ${standing.number} is ${standing.state}`);
  return returned ?? null;
}
