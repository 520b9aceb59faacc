import type { Grant } from "@/domain/access/policy";

/** How much of a week a reader wants by e-mail, from nothing to figures. */
export const DIGEST_LEVELS = ["off", "links", "summary", "full"] as const;
export type DigestLevel = (typeof DIGEST_LEVELS)[number];

/** What a digest was written under: how much the reader had chosen, and what had been shared with them. */
export type DigestBasis = Readonly<{ level: DigestLevel; grants: ReadonlyArray<Grant> }>;

/**
 * Whether a digest that was written may still be sent: the reader wants at
 * least as much as it holds, and every journal in it is still shared in the
 * same role and as widely as when it was written.
 *
 * @param basis what it was written under
 * @param now   what the reader has chosen and may see at the moment of sending
 */
export function doesBasisHold(basis: DigestBasis, now: DigestBasis): boolean {
  if (now.level === "off" || DIGEST_LEVELS.indexOf(now.level) < DIGEST_LEVELS.indexOf(basis.level)) return false;
  return basis.grants.every((written) => {
    const live = now.grants.find(({ journalId }) => journalId === written.journalId);
    return live?.role === written.role && written.scopes.every((scope) => live.scopes.includes(scope));
  });
}
