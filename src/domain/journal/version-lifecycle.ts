import { AppError } from "@/domain/errors";

/** Where a version of the settings stands in its life. */
export type VersionState =
  | "draft"
  | "proposed"
  | "returned"
  | "declined"
  | "approved"
  | "in-effect"
  | "superseded"
  | "withdrawn";

/**
 * What can happen to a version.
 *
 * - propose: the person or an educator sends it for review
 * - propose-again: a returned version comes back mended, as a new revision
 * - return, decline, approve: an educator's signed decision
 * - withdraw: the proposer takes it back, at any time before it is in effect
 * - record: put into effect without review; only with an open gate
 * - effect: an approved version goes into effect
 * - lapse: an approval was not used for 14 days
 * - supersede: a later version went into effect
 */
export type VersionEvent =
  | "propose"
  | "propose-again"
  | "return"
  | "decline"
  | "withdraw"
  | "approve"
  | "record"
  | "effect"
  | "lapse"
  | "supersede";

/**
 * Every edge there is; what is absent is refused. A lapsed approval goes back to
 * "returned", not to "proposed": the situation it judged is two weeks old, so the
 * person looks at it again and proposes it anew rather than it re-entering the
 * queue by itself. Declined, superseded and withdrawn are ends.
 */
export const VERSION_EDGES = {
  draft: { propose: "proposed", record: "in-effect", withdraw: "withdrawn" },
  proposed: { return: "returned", decline: "declined", approve: "approved", withdraw: "withdrawn" },
  returned: { "propose-again": "proposed", withdraw: "withdrawn" },
  declined: {},
  approved: { effect: "in-effect", lapse: "returned", withdraw: "withdrawn" },
  "in-effect": { supersede: "superseded" },
  superseded: {},
  withdrawn: {},
} as const satisfies Record<VersionState, Partial<Record<VersionEvent, VersionState>>>;

export const VERSION_STATES = Object.keys(VERSION_EDGES) as VersionState[];

/** The state after an event, or `null` when the event cannot happen in this state. */
export function nextState(state: VersionState, event: VersionEvent): VersionState | null {
  const edges: Partial<Record<VersionEvent, VersionState>> = VERSION_EDGES[state];
  return (Object.hasOwn(edges, event) ? edges[event] : null) ?? null;
}

/**
 * The state after an event, insisting on it.
 *
 * @throws {AppError} CONFLICT when the event cannot happen in this state
 */
export function assertEdge(state: VersionState, event: VersionEvent): VersionState {
  const next = nextState(state, event);
  if (next === null) throw new AppError("CONFLICT", `${event} is not possible for a version that is ${state}`);
  return next;
}
