import Link from "next/link";
import type { ReactNode } from "react";
import { NotchedItem } from "@/components/notched-item";
import { STATE_WORDS } from "../constants";
import type { VersionSummary } from "../queries/versions";

const NOTCH = { "in-effect": "in-effect", proposed: "waiting", approved: "waiting", returned: "waiting", draft: "waiting" } as const;

/** One version on the spine: what changed, why, what was hoped for, and at the right what followed. */
export function VersionItem({
  journalId, version, since, followed,
}: Readonly<{ journalId: string; version: VersionSummary; since: string; followed: ReactNode }>) {
  const notch = NOTCH[version.state as keyof typeof NOTCH] ?? "past";
  const title = version.kind === "starting" ? "Starting profile, set weaker than the arithmetic on purpose" : version.kind === "undo" ? version.reason : null;
  return (
    <NotchedItem number={String(version.number)} notch={notch}>
      <div className="desk:grid desk:grid-cols-2 desk:gap-8">
        <div className="min-w-0">
          <p className="text-note text-soft">
            <span className="desk:sr-only">Version {version.number} · </span>
            <span className="font-semibold text-ink">{STATE_WORDS[version.state]}</span> · {since}
          </p>
          <h2 className="font-sans text-base font-semibold">
            <Link href={`/j/${journalId}/changes/${version.number}`} className="link">
              {title ?? version.lines[0] ?? `Version ${version.number}`}
            </Link>
          </h2>
          {title === null ? version.lines.slice(1).map((line) => <p key={line} className="font-semibold">{line}</p>) : null}
          {version.reason && version.kind !== "undo" ? <p className="text-note text-soft">Why: {version.reason}</p> : null}
          {version.expectation && version.kind === "change" ? <p className="text-note text-soft">Expected: {version.expectation}.</p> : null}
        </div>
        <div className="mt-3 min-w-0 desk:mt-0">{followed}</div>
      </div>
    </NotchedItem>
  );
}
