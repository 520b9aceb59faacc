import type { Metadata } from "next";
import Link from "next/link";
import { Caution } from "@/components/caution";
import { MarginNote, Page, Section } from "@/components/page";
import { can } from "@/domain/access/policy";
import { addDays } from "@/domain/day-start";
import { isoDayText } from "@/domain/day-text";
import { CommentThread } from "@/features/circle/components/comment-thread";
import { DayTrace } from "@/features/days/components/day-trace";
import { EntryList } from "@/features/days/components/entry-list";
import { dayOf } from "@/features/days/queries/days";
import { forPage } from "@/lib/action";

type Props = Readonly<{ params: Promise<{ journalId: string; date: string }> }>;

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  return { title: `Day ${(await params).date}` };
}

export default async function DayPage({ params }: Props) {
  const { journalId, date } = await params;
  const { day, mayLog } = await forPage(async (ctx) => ({ day: await dayOf(ctx, { journalId, date }), mayLog: can(ctx.actor, "entry.log", journalId) }));
  return (
    <Page
      eyebrow={[day.dayOfJournal !== null && day.dayOfJournal > 0 ? `Day ${day.dayOfJournal}` : "Before day 1", day.version ? `version ${day.version.number}` : ""].filter(Boolean).join(" · ")}
      title={`${isoDayText(date)}.`}
      margin={<>{day.flags.map((f) => <MarginNote key={f.label} title={f.label}><p>{f.note || "Flagged."}</p></MarginNote>)}<Caution fallbackHref={`/j/${journalId}/fallback`} /></>}
    >
      <DayTrace view={day} />
      <Section title="What was logged"><EntryList view={day} mayRemove={mayLog} /></Section>
      <nav aria-label="Neighbouring days" className="no-print mt-6 flex gap-6">
        <Link className="link min-h-6" href={`/j/${journalId}/days/${addDays(date, -1)}`}>The day before</Link>
        <Link className="link min-h-6" href={`/j/${journalId}/days/${addDays(date, 1)}`}>The day after</Link>
      </nav>
      <CommentThread journalId={journalId} subject="day" subjectKey={date} />
    </Page>
  );
}
