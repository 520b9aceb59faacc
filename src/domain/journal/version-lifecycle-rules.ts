import { AppError } from "@/domain/errors";

/** An approval that was not used for this long lapses (content.md 10). */
export const APPROVAL_LAPSES_AFTER_DAYS = 14;

const DAY_MS = 24 * 60 * 60 * 1000;

/**
 * Author and approver are two people (settings.md 6.1).
 *
 * @throws {AppError} FORBIDDEN when the reviewer wrote the proposal
 */
export function assertNotOwnProposal(proposal: { authorId: string }, reviewerId: string): void {
  if (proposal.authorId === reviewerId) throw new AppError("FORBIDDEN", "a proposer decides on their own proposal");
}

/**
 * A decision binds exactly the content that was shown when it was made; any edit voids it.
 *
 * @param shownHash content hash the reviewer, or the person who puts it into effect, was shown
 * @throws {AppError} STALE when the version holds something else by now
 */
export function assertSameContent(version: { contentHash: string }, shownHash: string): void {
  if (version.contentHash !== shownHash) throw new AppError("STALE", "the version is not the one that was shown");
}

/**
 * Recording a version without review needs an open gate.
 *
 * @param isGateOpen `null` when the gate questions were never answered; that is not open
 * @throws {AppError} GATE_CLOSED
 */
export function assertMayRecord(isGateOpen: boolean | null): void {
  if (isGateOpen !== true) throw new AppError("GATE_CLOSED", "this version needs an educator's approval first");
}

/** Whether an approval has run out. On the very instant of 14 days it has not yet. */
export function hasApprovalLapsed(approvedAtMs: number, nowMs: number): boolean {
  return nowMs - approvedAtMs > APPROVAL_LAPSES_AFTER_DAYS * DAY_MS;
}

/**
 * What an approved version must satisfy on the way into effect: the approval is
 * for this content, and it has not lapsed.
 *
 * @throws {AppError} STALE for other content; CONFLICT for an approval that is missing or has lapsed
 */
export function assertMayTakeEffect(
  version: { contentHash: string; approvedHash: string | null; approvedAtMs: number | null },
  nowMs: number,
): void {
  if (version.approvedHash === null || version.approvedAtMs === null) {
    throw new AppError("CONFLICT", "the version has not been approved");
  }
  assertSameContent(version, version.approvedHash);
  if (hasApprovalLapsed(version.approvedAtMs, nowMs)) throw new AppError("CONFLICT", "the approval has lapsed");
}
