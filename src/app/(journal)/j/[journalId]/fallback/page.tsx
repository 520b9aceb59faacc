import type { Metadata } from "next";
import { Empty } from "@/components/notice";
import { Page, Section } from "@/components/page";
import { dateText } from "@/domain/day-text";
import { sourceLine } from "@/domain/settings/provenance";
import { journalHeader } from "@/features/days/queries/journal-header";
import { fallbackCard } from "@/features/onboarding/queries/fallback-card";
import { ProfileTable } from "@/features/settings/components/profile-table";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Fallback card" };

export default async function FallbackPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { header, fallback } = await forPage(async (ctx) => ({ header: await journalHeader(ctx, { journalId }), fallback: await fallbackCard(ctx, { journalId }) }));
  const { card, current, backUp } = fallback;
  return (
    <Page
      eyebrow={`${header.ownerName}${card ? ` · written ${dateText(card.updatedAt, header.timeZone)}` : ""}`}
      title="Fallback card."
      lead={<p className="border-l-4 border-emergency pl-4 font-semibold">Vomiting, drowsy, or ketones 3.0 mmol/L or more: this is an emergency{card ? `. Call ${card.emergencyNumber}` : ""}. Passed out or can’t swallow: glucagon, and call.</p>}
    >
      {card ? (
        <div className="desk:grid desk:grid-cols-2 desk:gap-x-10 print:grid print:grid-cols-2 print:gap-x-8">
          <Section title="What to go back to"><p className="whitespace-pre-line">{card.previousSetup}</p></Section>
          <Section title="People to call">
            <ul>{card.contacts.map((c) => <li key={c.phone}>{c.name}: <a className="link" href={`tel:${c.phone.replace(/[^+\d]/g, "")}`}>{c.phone}</a></li>)}</ul>
            <p className="mt-1">Emergency: <a className="link font-semibold" href={`tel:${card.emergencyNumber}`}>{card.emergencyNumber}</a></p>
          </Section>
          <Section title="Ketones, by your written plan">
            <ul>
              <li>0.6 mmol/L or more: follow the sick-day plan, look at the infusion site.</li>
              <li>1.5 or more: call your team.</li>
              <li>3.0 or more: emergency.</li>
            </ul>
            <p className="text-note text-soft">Levels as in hospital leaflets; your clinic’s own come first.</p>
          </Section>
          <Section title="Back-up long-acting insulin">
            {card.longActingMilliUnits !== null ? <p className="font-semibold">Written down by your educator: {card.longActingMilliUnits / 1000} U a day.</p> : <p>None written down yet. Ask your educator to mark one.</p>}
            <ul className="text-note text-soft">
              {backUp.map((row) => <li key={row.id}>{row.label}: {Number(row.units.toFixed(1))} U. Source: {sourceLine(row.source, row.provenance)}</li>)}
            </ul>
          </Section>
        </div>
      ) : (
        <Empty title="Nothing is written down yet.">
          {header.role === "person" ? <p><a className="link" href={`/j/${journalId}/start/fallback`}>Write down the way back</a> before the start day.</p> : <p>It is written before the start day.</p>}
        </Empty>
      )}
      {current && (current.approvedHash !== null || header.isGateOpen) ? <Section title={`Version ${current.number}, in effect now`}><ProfileTable profile={current.profile} unit={header.unit} /></Section> : null}
      {header.role === "person" && card ? <p className="no-print mt-6"><a className="link" href={`/j/${journalId}/start/fallback`}>Change this card</a></p> : null}
    </Page>
  );
}
