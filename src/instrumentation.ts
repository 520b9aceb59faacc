/** Runs once as a web process starts: refuses unsafe settings, and brings together what two features need of each other. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { assertServable } = await import("@/env");
  assertServable();
  const { randomUUID } = await import("node:crypto");
  const { findingSentence } = await import("@/features/comparison/queries/finding-sentence");
  const { lendFindings } = await import("@/lib/lent-findings");
  const { pool } = await import("@/lib/pool");
  lendFindings((journalId, number) =>
    findingSentence({ actor: { type: "job", job: "weekly-digest" }, db: pool(), now: () => new Date(), requestId: randomUUID() }, journalId, number),
  );
}
