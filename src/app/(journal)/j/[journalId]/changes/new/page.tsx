import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { addDays } from "@/domain/day-start";
import { isoDayText } from "@/domain/day-text";
import { isoDayOf } from "@/domain/iso-day";
import { journalHeader } from "@/features/days/queries/journal-header";
import { ChangeForm } from "@/features/settings/components/change-form";
import { ProfileTable } from "@/features/settings/components/profile-table";
import { newChange } from "@/features/settings/queries/new-change";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Propose a change" };

const DAYS_TO_NAME = 10;

export default async function NewChangePage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { header, base, today } = await forPage(async (ctx) => {
    const journal = await journalHeader(ctx, { journalId });
    return { header: journal, base: await newChange(ctx, { journalId }), today: isoDayOf(ctx.now(), journal.timeZone) };
  });
  const recentDays = Array.from({ length: DAYS_TO_NAME }, (_, i) => addDays(today, -i)).map((day) => ({ value: day, label: isoDayText(day) }));
  return (
    <Page
      eyebrow={base ? `From version ${base.number}` : undefined}
      title="Change one thing."
      lead={<p>One setting, one part of the day, one small step. Say now what you hope to see; later the days will answer.</p>}
      margin={
        <>
          <MarginNote title="How much, how often">
            <p>Published advice moves in steps of 10 to 20% and waits three full days after a change (children’s hospital dose-adjustment guides). Less insulin after a low never waits.</p>
          </MarginNote>
          <Caution fallbackHref={`/j/${journalId}/fallback`} />
        </>
      }
    >
      {base ? (
        <>
          <ChangeForm journalId={journalId} baseVersion={base.number} unit={header.unit} recentDays={recentDays} mayRecord={header.isGateOpen === true} />
          <Section title={`Version ${base.number}, in effect now`}>
            <ProfileTable profile={base.profile} unit={header.unit} />
          </Section>
        </>
      ) : (
        <Empty title="There is no version in effect yet, or one is waiting.">
          <p><a className="link" href={`/j/${journalId}/changes`}>See how the versions stand</a></p>
        </Empty>
      )}
    </Page>
  );
}
