import type { Metadata } from "next";
import Link from "next/link";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { Page, Section } from "@/components/page";
import { dateText } from "@/domain/day-text";
import { journalHeader } from "@/features/days/queries/journal-header";
import { DosesForm } from "@/features/onboarding/components/doses-form";
import { FallbackCard } from "@/features/onboarding/components/fallback-card";
import { fallbackCard } from "@/features/onboarding/queries/fallback-card";
import { ProfileTable } from "@/features/settings/components/profile-table";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Fallback card" };

export default async function FallbackPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { header, fallback } = await forPage(async (ctx) => ({ header: await journalHeader(ctx, { journalId }), fallback: await fallbackCard(ctx, { journalId }) }));
  const { card, current } = fallback;
  const units = (milliUnits: number | null | undefined) => (milliUnits ? String(milliUnits / 1000) : "");
  const call = card && card.emergencyNumber !== "" ? `. Call ${card.emergencyNumber}` : "";
  return (
    <Page
      eyebrow={`${header.ownerName}${card ? ` · written ${dateText(card.updatedAt, header.timeZone)}` : ""}${current ? ` · version ${current.number}` : ""}`}
      title="Fallback card."
      lead={<p className="border-l-4 border-emergency pl-4 font-semibold">Vomiting, drowsy, or ketones 3.0 mmol/L or more: this is an emergency{call}. Passed out or can’t swallow: glucagon, and call.</p>}
    >
      {card ? (
        <FallbackCard fallback={fallback} card={card} timeZone={header.timeZone} />
      ) : (
        <Empty title="Nothing is written down yet.">
          {fallback.mayEdit ? <p><Link className="link" href={`/j/${journalId}/fallback/edit`}>Write down the way back</Link> before the start day.</p> : <p>It is written before the start day.</p>}
        </Empty>
      )}
      {current ? <Section title={`Version ${current.number}, in effect now`}><ProfileTable profile={current.profile} unit={header.unit} /></Section> : null}
      <div className="mt-8 max-w-text"><Caution /></div>
      {fallback.mayWriteDoses ? (
        <div className="no-print"><Section title="Back-up doses, written by you as the educator">
          <p className="max-w-text">The published ways disagree. What you write stands on the card under your name until it is changed.</p>
          <DosesForm journalId={journalId} start={{ longActingUnits: units(card?.longActingMilliUnits), rapidUnits: units(card?.rapidMilliUnits) }} />
        </Section></div>
      ) : null}
      {fallback.mayEdit && card ? <p className="no-print mt-4"><Link className="link inline-flex min-h-target items-center" href={`/j/${journalId}/fallback/edit`}>Change this card</Link></p> : null}
    </Page>
  );
}
