import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { listVersions } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import type { Verdict } from "@/domain/comparison/verdict";
import { describeFinding } from "@/domain/comparison/finding";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { journalInput } from "../schema";
import { compareVersion, livedVersions } from "./compare-version";

export type ShortFinding = Readonly<{
  verdict: Verdict;
  title: string;
  short: string;
  sentence: string;
  leaning: string | null;
  strip: ReadonlyArray<{ day: number; value: number; side: "before" | "after" }>;
}>;

/** What followed each version that was in effect, in a sentence each, by version number. */
export async function findingsOf(ctx: Context, input: { journalId: string }): Promise<ReadonlyMap<number, ShortFinding>> {
  const { journalId } = journalInput.parse(input);
  authorize(ctx.actor, "comparison.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const versions = await listVersions(ctx.db, journalId);
  const findings = new Map<number, ShortFinding>();
  for (const { version } of livedVersions(versions, journal.timeZone).slice(1)) {
    const compared = await compareVersion(ctx, journal, versions, version.number);
    if (!compared) continue;
    const { comparison } = compared;
    const { title, short, sentences, leaning } = describeFinding(comparison, journal.glucoseUnit);
    const dots = (side: "before" | "after") => comparison[side].map(({ day, value }) => ({ day, value, side }));
    findings.set(version.number, { verdict: comparison.verdict, title, short, sentence: sentences[0] ?? "", leaning, strip: [...dots("before"), ...dots("after")] });
  }
  return findings;
}
