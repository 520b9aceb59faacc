import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { MarginNote, Page, Section } from "@/components/page";
import { addDays } from "@/domain/day-start";
import { isoDayText } from "@/domain/day-text";
import { FOLLOW_UPS, PLAN } from "@/domain/journal/plan";
import { journalHeader } from "@/features/days/queries/journal-header";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Plan" };

export default async function PlanPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const header = await forPage((ctx) => journalHeader(ctx, { journalId }));
  const dayOne = header.startedOn ?? header.plannedStartOn;
  const dateOf = (day: number) => (dayOne ? isoDayText(addDays(dayOne, day - 1)) : `day ${day}`);
  return (
    <Page
      title={header.startedOn ? `Day 1 was ${isoDayText(header.startedOn)}.` : header.plannedStartOn ? `Day 1 is planned for ${isoDayText(header.plannedStartOn)}.` : "No start day yet."}
      lead={<p>The day the starting profile comes into effect on the device is day 1. Everything else counts from it.</p>}
      margin={
        <>
          <MarginNote title="Follow-ups"><ul>{FOLLOW_UPS.map((f) => <li key={f.dayOfJournal}>{dateOf(f.dayOfJournal)}: {f.what.toLowerCase()}</li>)}</ul></MarginNote>
          <Caution fallbackHref={`/j/${journalId}/fallback`} />
        </>
      }
    >
      {PLAN.map((phase) => (
        <Section key={phase.name} title={phase.name}>
          <p className="text-note text-soft">{phase.firstDay === phase.lastDay ? dateOf(phase.firstDay) : `${dateOf(phase.firstDay)} to ${dateOf(phase.lastDay)}`}</p>
          <ul className="max-w-text">
            {phase.tasks.map((task) => (
              <li key={task.what} className="border-b border-hairline py-2">{task.what} <span className="text-note text-soft">({task.who}; {task.source})</span></li>
            ))}
          </ul>
        </Section>
      ))}
    </Page>
  );
}
