import type { Pool } from "@/db/client";
import { findingSentence } from "@/features/comparison/queries/finding-sentence";
import { dueReaders } from "@/features/digest/queries/due-readers";
import { sendDigest } from "@/features/digest/use-cases/send-digest";
import type { Context } from "@/lib/context";

/** The digests that are due as the demo opens, written as the worker would; it sends them from the outbox. */
export async function seedDigests(db: Pool, now: Date): Promise<void> {
  const ctx: Context = { actor: { type: "job", job: "weekly-digest" }, db, now: () => now, requestId: "demo" };
  for (const userId of await dueReaders(ctx)) {
    await sendDigest(ctx, { userId }, (journalId, number) => findingSentence(ctx, journalId, number));
  }
}
