import type { Metadata } from "next";
import Link from "next/link";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { can } from "@/domain/access/policy";
import { counted } from "@/domain/day-text";
import { dayNumberOf } from "@/domain/day-start";
import { isoDayOf } from "@/domain/iso-day";
import { commonlyFound } from "@/domain/journal/plan";
import { localOfInstant } from "@/domain/local-time";
import { findingsOf } from "@/features/comparison/queries/findings";
import { DayTrace } from "@/features/days/components/day-trace";
import { EntryList } from "@/features/days/components/entry-list";
import { LogForms } from "@/features/days/components/log-forms";
import { dayOf } from "@/features/days/queries/days";
import { journalHeader } from "@/features/days/queries/journal-header";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Today" };

const FULL_DAYS_TO_WAIT = 3;

export default async function TodayPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { header, day, now, mayLog, finding } = await forPage(async (ctx) => {
    const header = await journalHeader(ctx, { journalId });
    const date = isoDayOf(ctx.now(), header.timeZone);
    const day = await dayOf(ctx, { journalId, date });
    const findings = can(ctx.actor, "comparison.read", journalId) ? await findingsOf(ctx, { journalId }) : null;
    return { header, day, now: ctx.now(), mayLog: can(ctx.actor, "entry.log", journalId), finding: day.version ? (findings?.get(day.version.number) ?? null) : null };
  });
  const daysInEffect = day.version?.since ? dayNumberOf(day.date) - dayNumberOf(isoDayOf(day.version.since, header.timeZone)) : null;
  const waits = daysInEffect !== null && daysInEffect < FULL_DAYS_TO_WAIT + 1;
  const title = day.version === null ? "Before day 1." : waits ? `Hold steady for ${counted(FULL_DAYS_TO_WAIT + 1 - daysInEffect, "more day")}.` : (finding?.title ?? `Version ${day.version.number} is in effect.`);
  const weekday = new Intl.DateTimeFormat("en-GB", { weekday: "long", timeZone: header.timeZone }).format(now);
  return (
    <Page
      eyebrow={[weekday, day.dayOfJournal !== null && day.dayOfJournal > 0 ? `day ${day.dayOfJournal}` : "", day.version ? `version ${day.version.number} in effect for ${counted(daysInEffect ?? 0, "day")}` : ""].filter(Boolean).join(" · ")}
      title={title}
      lead={
        day.version === null ? <p>The starting profile comes first, then its review, then the start day.</p>
        : waits ? <p>Three full days show more than one. Looking sooner would not say more.</p>
        : finding ? <p>{finding.sentence} <Link className="link" href={`/j/${journalId}/compare/${day.version.number}`}>See the days</Link></p> : null
      }
      margin={
        <>
          <MarginNote title="If you feel a low now">
            <p>Treat it first, as in your plan. Then log it.</p>
            <p className="mt-1"><Link className="link" href={`/j/${journalId}/fallback`}>Fallback card</Link></p>
          </MarginNote>
          {day.flags.map((f) => <MarginNote key={f.label} title={f.label}><p>{f.note || "Flagged for today."}</p></MarginNote>)}
          <Caution />
        </>
      }
    >
      {day.version === null && header.role === "person" ? <Empty title="What comes next"><p><Link className="link" href={`/j/${journalId}/start/about-you`}>Go on with the starting profile</Link></p></Empty> : null}
      <DayTrace view={day} />
      {mayLog ? <LogForms journalId={journalId} now={localOfInstant(now, header.timeZone)} today={day.date} /> : null}
      <Section title="So far today"><EntryList view={day} mayRemove={mayLog} /></Section>
      {day.dayOfJournal !== null && day.dayOfJournal > 0 && commonlyFound(day.dayOfJournal) ? (
        <Section title={`What many people find around day ${day.dayOfJournal}`}><p className="max-w-text">{commonlyFound(day.dayOfJournal)}</p></Section>
      ) : null}
    </Page>
  );
}
