import Link from "next/link";
import { MiniStrip } from "@/components/charts/mini-strip";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { ShortFinding } from "../queries/findings";

/** What followed a version, at the right of its place on the spine. */
export function FollowedNote({
  journalId, number, state, kind, finding,
}: Readonly<{ journalId: string; number: number; state: VersionState; kind: string; finding: ShortFinding | null }>) {
  if (state !== "in-effect" && state !== "superseded") return <p>Nothing to see yet. It is not in effect.</p>;
  if (!finding) return <p>{kind === "starting" ? "First days: watched, nothing changed." : "Its glucose is not shared with you."}</p>;
  const isLows = finding.verdict === "more-lows";
  return (
    <>
      <p>
        <Link href={`/j/${journalId}/compare/${number}`} className={`link font-semibold ${isLows ? "text-low" : ""}`}>
          {isLows ? "▼ " : ""}{finding.short}.
        </Link>{" "}
        {finding.leaning ? `${finding.leaning} ` : ""}
      </p>
      <p className="text-note text-soft">{finding.sentence}</p>
      <MiniStrip dots={finding.strip} />
    </>
  );
}
