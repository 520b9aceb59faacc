import type { Metadata } from "next";
import Link from "next/link";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { Page } from "@/components/page";
import { counted, isoDayText } from "@/domain/day-text";
import { glucoseNumber } from "@/domain/glucose-text";
import { daysOf } from "@/features/days/queries/days";
import { journalHeader } from "@/features/days/queries/journal-header";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Days" };

export default async function DaysPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { header, days } = await forPage(async (ctx) => ({ header: await journalHeader(ctx, { journalId }), days: await daysOf(ctx, { journalId }) }));
  return (
    <Page title={days.length === 0 ? "No day has glucose yet." : `${counted(days.length, "day")} with glucose.`} margin={<Caution fallbackHref={`/j/${journalId}/fallback`} />}>
      {days.length === 0 ? (
        <Empty title="Days appear with the first file.">{header.role === "person" ? <p><Link className="link" href={`/j/${journalId}/data`}>Bring in glucose</Link></p> : <p>The person brings it in.</p>}</Empty>
      ) : (
        <div className="mt-6 overflow-x-auto" tabIndex={0} role="region" aria-label="Table of days">
          <table className="table">
            <thead><tr><th scope="col">Day</th><th scope="col" className="number">In range</th><th scope="col" className="number">Low</th><th scope="col" className="number">Mean, {header.unit}</th><th scope="col" className="number">Readings got</th><th scope="col">Flags</th></tr></thead>
            <tbody>
              {days.map((day) => (
                <tr key={day.isoDay}>
                  <th scope="row" className="font-normal">
                    <Link className="link inline-block min-h-6" href={`/j/${journalId}/days/${day.isoDay}`}>{isoDayText(day.isoDay)}</Link>
                    {day.dayOfJournal !== null && day.dayOfJournal > 0 ? <span className="text-note text-soft"> day {day.dayOfJournal}</span> : null}
                  </th>
                  <td className="number">{Math.round(day.inRangePercent)}%</td>
                  <td className={`number ${day.below70Percent >= 4 ? "font-semibold text-low" : ""}`}>{day.below70Percent >= 4 ? "▼ " : ""}{day.below70Percent.toFixed(1)}%</td>
                  <td className="number">{glucoseNumber(day.meanMgDl, header.unit)}</td>
                  <td className="number">{Math.round(Math.min(1, day.activeFraction) * 100)}%</td>
                  <td className="text-note text-soft">{day.flags.join(", ")}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </Page>
  );
}
