import { randomUUID } from "node:crypto";
import { findingSentence } from "@/features/comparison/queries/finding-sentence";
import { lendFindings } from "@/lib/lent-findings";
import { pool } from "@/lib/pool";

/** Bring the comparison's sentences to whoever writes a digest in this process. */
export function lendFindingsToDigest(): void {
  lendFindings((journalId, number) =>
    findingSentence({ actor: { type: "job", job: "weekly-digest" }, db: pool(), now: () => new Date(), requestId: randomUUID() }, journalId, number),
  );
}
