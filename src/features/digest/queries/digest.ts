import "server-only";
import { z } from "zod";
import { findAccount } from "@/db/repositories/accounts";
import { findDigestPreference } from "@/db/repositories/digest-preferences";
import { authorize } from "@/domain/access/policy";
import { addDays } from "@/domain/day-start";
import type { DigestBasis } from "@/domain/digest/basis";
import { buildDigest } from "@/domain/digest/build-digest";
import type { Digest, FindingOf, JournalWeek } from "@/domain/digest/week";
import { AppError } from "@/domain/errors";
import { findActor } from "@/lib/actor";
import type { Context } from "@/lib/context";
import { journalWeek } from "./journal-week";

const digestInput = z.object({ userId: z.uuid(), today: z.iso.date() });

export type ComposedDigest = Readonly<{ digest: Digest; basis: DigestBasis; toAddress: string; displayName: string }>;

/**
 * The week before `today` as one reader would get it: for the weekly job, or
 * for the reader who wants to see their own.
 *
 * @param input.today the civil day, in the reader's zone, on which it is written; it tells of the seven before
 * @returns `null` when the reader has switched it off, left, or has no notebook to be told of
 * @throws {AppError} FORBIDDEN for somebody else's digest
 */
export async function composeDigest(
  ctx: Context,
  input: z.input<typeof digestInput>,
  findingOf: FindingOf,
): Promise<ComposedDigest | null> {
  const { userId, today } = digestInput.parse(input);
  authorize(ctx.actor, ctx.actor.type === "user" ? "digest.choose" : "digest.send");
  if (ctx.actor.type === "user" && ctx.actor.userId !== userId) throw new AppError("FORBIDDEN", "somebody else's digest");

  const reader = await findActor(ctx.db, userId, ctx.now());
  const account = await findAccount(ctx.db, userId);
  const { level } = await findDigestPreference(ctx.db, userId);
  if (!account || reader.type !== "user" || !reader.isEmailVerified || level === "off") return null;

  const span = { from: addDays(today, -7), to: addDays(today, -1), today };
  const weeks: JournalWeek[] = [];
  for (const grant of reader.grants) {
    const week = await journalWeek(ctx, { reader, readerZone: account.timeZone, grant, ...span, areFindingsWanted: level !== "links" }, findingOf);
    if (week) weeks.push(week);
  }
  const journals = weeks.toSorted((a, b) => a.ownerName.localeCompare(b.ownerName) || a.name.localeCompare(b.name));
  const digest = buildDigest({ level, unit: account.glucoseUnit, ...span, journals });
  return digest && { digest, basis: { level, grants: reader.grants }, toAddress: account.email, displayName: account.displayName };
}
