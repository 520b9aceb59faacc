import type { VersionState } from "@/domain/journal/version-lifecycle";

type Version = Readonly<{ number: number; revision: number; kind: string; state: VersionState }>;

/** Where a draft stands towards the versions of its journal. */
export type DraftStanding<V extends Version> =
  /** `returned`: an educator sent it back, and the next wording keeps its number. */
  | Readonly<{ is: "open"; returned: V | null }>
  | Readonly<{ is: "sent"; version: V }>;

const STANDING: ReadonlyArray<VersionState> = ["proposed", "approved", "in-effect", "superseded"];

/**
 * A draft is read-only once a version waits or lives, whichever it is. Declined
 * and withdrawn versions are ends: the draft is open again and makes a new number.
 */
export function draftStanding<V extends Version>(versions: ReadonlyArray<V>): DraftStanding<V> {
  const standing = versions.filter(({ state }) => STANDING.includes(state));
  const version = standing.find(({ kind }) => kind === "starting") ?? standing[0];
  if (version) return { is: "sent", version };
  return { is: "open", returned: versions.find(({ kind, state }) => kind === "starting" && state === "returned") ?? null };
}
