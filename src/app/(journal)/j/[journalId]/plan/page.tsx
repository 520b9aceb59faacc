import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { MarginNote, Page } from "@/components/page";
import { isoDayText } from "@/domain/day-text";
import { dateOfDay, FOLLOW_UPS, PLAN_VARIANTS, REVIEWED_EACH_TIME } from "@/domain/journal/plan";
import { journalHeader } from "@/features/days/queries/journal-header";
import { CommonlyFound, PlanPhases } from "@/features/onboarding/components/plan-phases";
import { StartDay } from "@/features/onboarding/components/start-day";
import { planOf } from "@/features/onboarding/queries/plan";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Plan" };

export default async function PlanPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { header, plan } = await forPage(async (ctx) => ({ header: await journalHeader(ctx, { journalId }), plan: await planOf(ctx, { journalId }) }));
  const dayOne = plan.startedOn ?? plan.plannedStartOn;
  const title = plan.startedOn ? `Day 1 was ${isoDayText(plan.startedOn)}.` : plan.plannedStartOn ? `Day 1 is planned for ${isoDayText(plan.plannedStartOn)}.` : "No start day yet.";
  return (
    <Page
      title={title}
      lead={<p>The day the starting profile comes into effect on the device is day 1. Everything else counts from it.</p>}
      margin={
        <>
          <MarginNote title="Follow-ups">
            <ul>{FOLLOW_UPS.map((f) => <li key={f.dayOfJournal}>{dayOne ? isoDayText(dateOfDay(dayOne, f.dayOfJournal)) : `Day ${f.dayOfJournal}`}: {f.what.toLowerCase()}</li>)}</ul>
            <p className="mt-1.5">Looked through each time: {REVIEWED_EACH_TIME.join(", ")}. A composite of published schedules and an endocrine pump checklist.</p>
          </MarginNote>
          <MarginNote title="Where you come from"><p>{PLAN_VARIANTS[plan.therapy]}</p></MarginNote>
          <Caution fallbackHref={`/j/${journalId}/fallback`} />
        </>
      }
    >
      <StartDay plan={plan} journalId={journalId} />
      <PlanPhases dayOne={dayOne} today={plan.today} journalId={journalId} isOwner={header.role === "person"} />
      <CommonlyFound dayOne={dayOne} />
    </Page>
  );
}
