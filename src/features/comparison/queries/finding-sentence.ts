import "server-only";
import { authorize } from "@/domain/access/policy";
import type { Context } from "@/lib/context";
import { findingsOf } from "./findings";

/** The first sentence of what followed one version, for a digest; null where there is none. */
export async function findingSentence(ctx: Context, journalId: string, number: number): Promise<string | null> {
  authorize(ctx.actor, "comparison.read", journalId);
  const finding = (await findingsOf(ctx, { journalId })).get(number);
  return finding ? `${finding.title} ${finding.sentence}`.trim() : null;
}
