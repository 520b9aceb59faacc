import "server-only";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal, updateJournal } from "@/db/repositories/journals";
import { findVersionForUpdate, listVersions, moveVersion } from "@/db/repositories/versions";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { isoDayOf } from "@/domain/iso-day";
import { assertEdge } from "@/domain/journal/version-lifecycle";
import { assertMayTakeEffect, assertSameContent } from "@/domain/journal/version-lifecycle-rules";
import { instantOfLocal } from "@/domain/local-time";
import type { Context } from "@/lib/context";
import { effectInput, type EffectInput } from "../schema";

/**
 * The person says since when the approved settings are on the device. Nothing
 * is sent to a device; this only writes down what was done there. The first
 * version in effect makes its day day 1 of the journal.
 *
 * @throws {AppError} CONFLICT without a live approval, STALE when the version is
 *   not the one shown, INVALID_INPUT on `effectiveFrom` for a time that can't be
 */
export async function putIntoEffect(ctx: Context, input: EffectInput): Promise<{ number: number; effectiveFrom: Date }> {
  const { journalId, number, contentHash, effectiveFrom: typed } = effectInput.parse(input);
  authorize(ctx.actor, "version.effect", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const version = await findVersionForUpdate(tx, journalId, number);
    const journal = await findJournal(tx, journalId);
    if (!version || !journal) throw new AppError("NOT_FOUND", `version ${number}`);
    assertSameContent(version, contentHash);
    const state = assertEdge(version.state, "effect");
    const at = ctx.now();
    const approvedAtMs = version.state === "approved" ? version.stateSince.getTime() : null;
    assertMayTakeEffect({ ...version, approvedAtMs }, at.getTime());
    const before = (await listVersions(tx, journalId)).find((v) => v.state === "in-effect");
    const effectiveFrom = typed === "" ? at : instantOfLocal(typed, journal.timeZone, "effectiveFrom");
    assertPlausible(effectiveFrom, at, before?.effectiveFrom ?? null);
    if (before) {
      await moveVersion(tx, { journalId, number: before.number, from: "in-effect", to: assertEdge("in-effect", "supersede"), at }, { effectiveUntil: effectiveFrom });
    }
    const isMoved = await moveVersion(tx, { journalId, number, from: version.state, to: state, at }, { effectiveFrom });
    if (!isMoved) throw new AppError("CONFLICT", `version ${number} is no longer ${version.state}`);
    if (journal.startedOn === null) await updateJournal(tx, journalId, { startedOn: isoDayOf(effectiveFrom, journal.timeZone) });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "version.effect", subject: `version ${number}`, requestId: ctx.requestId });
    return { number, effectiveFrom };
  });
}

function assertPlausible(effectiveFrom: Date, now: Date, after: Date | null): void {
  const refuse = (sentence: string) => new AppError("INVALID_INPUT", "effectiveFrom", { effectiveFrom: [sentence] });
  if (effectiveFrom.getTime() > now.getTime() + 60_000) throw refuse("This lies ahead. Type when the settings were entered on the device.");
  if (after && effectiveFrom <= after) throw refuse("This is before the version now in effect began.");
}
