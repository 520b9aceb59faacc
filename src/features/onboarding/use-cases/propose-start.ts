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
import { draftStanding } from "@/domain/onboarding/draft-standing";
import { draftedVersion } from "@/domain/onboarding/drafted-version";
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
 *   page; INVALID_INPUT while a page is missing or a check blocks
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
    const standing = draftStanding(await listVersions(tx, journalId));
    if (standing.is === "sent") throw new AppError("CONFLICT", `version ${standing.version.number} is ${standing.version.state}`);
    if (draft.rowVersion !== rowVersion) throw new AppError("STALE", "the draft was saved elsewhere");
    const { profile, arithmetic, checks } = draftedVersion(draft.answers, journal);

    const at = ctx.now();
    const { returned } = standing;
    const number = returned?.number ?? (await nextVersionNumber(tx, journalId));
    const revision = (returned?.revision ?? 0) + 1;
    await insertVersion(
      tx,
      {
        journalId, number, revision, parentNumber: null, kind: "starting", profile, contentHash: hashProfile(profile),
        reasonCode: "other", reasonText: note || "A careful start", expectation: null, evidenceDays: [], lookAgainOn: null, revertRule: "",
        guardrails: checks.map((c) => ({ code: c.code, severity: c.severity, text: c.text, answer: "" })),
        arithmetic, authorId: userId, createdAt: at,
      },
      returned ? assertEdge("returned", "propose-again") : assertEdge("draft", "propose"),
    );
    await updateJournal(tx, journalId, { gateReasons: arithmetic.gate.reasons.map((r) => r.text) });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "version.propose", subject: `version ${number}`, requestId: ctx.requestId });
    for (const helper of await listCircle(tx, journalId, at)) {
      const educator = helper.role === "educator" ? await findAccount(tx, helper.userId) : undefined;
      if (!educator) continue;
      await insertMail(tx, {
        ...mail, kind: "review-asked", journalId, recipientId: educator.id, toAddress: educator.email, subject: "A proposal waits for you",
        dedupeKey: `review-asked/${journalId}/${number}/${revision}/${educator.id}`, requestId: ctx.requestId, createdAt: at,
      });
    }
    return { number };
  });
}
