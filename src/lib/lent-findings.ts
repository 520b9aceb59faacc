import type { FindingOf } from "@/domain/digest/week";

const holder = globalThis as typeof globalThis & { notchbookFindingOf?: FindingOf };

/**
 * Lend this process the comparison's sentences, once at its start: one feature
 * does not import another, so whoever starts the process brings the two together.
 */
export function lendFindings(findingOf: FindingOf): void {
  holder.notchbookFindingOf = findingOf;
}

/** What was lent; without it no version has a finding. */
export const lentFinding: FindingOf = (journalId, versionNumber) =>
  holder.notchbookFindingOf?.(journalId, versionNumber) ?? Promise.resolve(null);
