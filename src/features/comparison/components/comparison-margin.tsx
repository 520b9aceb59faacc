import { Caution } from "@/components/caution";
import { MarginNote } from "@/components/page";
import { dateTimeText, isoDayText } from "@/domain/day-text";
import { isoDayOfNumber } from "@/domain/iso-day";
import { OUTCOMES } from "@/domain/comparison/outcomes";
import type { ComparisonView } from "../queries/comparison";

const dayText = (day: number) => isoDayText(isoDayOfNumber(day));

/** What changed, what was used, how it was worked out, caution. */
export function ComparisonMargin({ view, journalId }: Readonly<{ view: ComparisonView; journalId: string }>) {
  const { comparison, version, lines, journal } = view;
  const { days } = OUTCOMES[view.shownOutcome];
  const used = view.shownOutcome === "day-lows" && comparison.lows.effect ? comparison.lows.effect : { nBefore: comparison.before.length, nAfter: comparison.after.length };
  return (
    <>
      <MarginNote title="The change">
        {lines.map((line) => <p key={line}>{line}</p>)}
        {version.effectiveFrom ? <p>In effect since {dateTimeText(version.effectiveFrom, journal.timeZone)}</p> : null}
        <p>{version.approvedHash ? "Approved by your educator" : "Recorded without review"}</p>
      </MarginNote>
      <MarginNote title={`${days === "nights" ? "Nights" : "Days"} used`}>
        <p>
          {used.nBefore} before, {used.nAfter} after. Left out always: the day of the change and the day before it.
          {comparison.leftOut.length > 0 ? ` Also left out: ${comparison.leftOut.map((d) => `${dayText(d.day)} (${d.leftOutReason ?? ""})`).join(", ")}.` : ""}
        </p>
      </MarginNote>
      <MarginNote title="Worked out as">
        <p>
          Difference of daily averages with an error bar that counts neighbouring days as partly the same day. Called only if the
          whole 95% range is on one side, even when you look every day.
          {comparison.adjusted ? " Here days were compared at equal insulin, since some days simply need more; the plain difference is what is shown." : ""}
          {comparison.plainBecause === "insulin-not-logged" ? " Without a whole insulin log the plain comparison decides; with one, days at equal insulin would show more." : ""}
        </p>
      </MarginNote>
      <Caution fallbackHref={`/j/${journalId}/fallback`} />
    </>
  );
}
