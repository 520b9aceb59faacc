import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { Notice } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { dateTimeText } from "@/domain/day-text";
import { glucoseText } from "@/domain/glucose-text";
import { ArithmeticTable } from "@/features/review/components/arithmetic-table";
import { ApproveForm, DeclineForm, ReturnForm } from "@/features/review/components/decision-forms";
import { reviewPage } from "@/features/review/queries/reviews";
import { ProfileTable } from "@/features/settings/components/profile-table";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "A proposal" };

const percent = (fraction: number | null) => (fraction === null ? "–" : `${(100 * fraction).toFixed(1)}%`);

export default async function ReviewPage({ params }: Readonly<{ params: Promise<{ journalId: string; number: string }> }>) {
  const { journalId, number } = await params;
  const view = await forPage((ctx) => reviewPage(ctx, { journalId, number }));
  const { version, journal, figures, arithmetic, parent } = view;
  const unit = journal.glucoseUnit;
  const target = { journalId, number: version.number, contentHash: version.contentHash };
  return (
    <Page
      eyebrow={`${view.personName} · version ${version.number}${version.revision > 1 ? `, wording ${version.revision}` : ""} · asked ${dateTimeText(version.stateSince, journal.timeZone)}`}
      title={version.kind === "starting" ? `${view.personName} asks for a start.` : (view.lines[0] ?? "A proposal.")}
      lead={<>{view.lines.slice(1).map((line) => <p key={line}>{line}</p>)}{version.reasonText ? <p>“{version.reasonText}”</p> : null}</>}
      margin={
        <>
          <MarginNote title="Gate answers">
            {journal.gateReasons === null ? <p>Not answered.</p> : journal.gateReasons.length === 0 ? <p>No to every question: the gate is open.</p> : <ul>{journal.gateReasons.map((r) => <li key={r}>{r}</li>)}</ul>}
          </MarginNote>
          <MarginNote title="Setup"><p>{[journal.setup.pump, journal.setup.sensor, journal.setup.controller, journal.setup.insulin].filter(Boolean).join(", ") || "Not described"}</p></MarginNote>
          {version.guardrails.map((g) => <MarginNote key={g.code} title={g.severity === "asks" ? "A guardrail asked" : "A check says"}><p>{g.text}{g.answer ? ` Answer: “${g.answer}”` : ""}</p></MarginNote>)}
          <MarginNote title="Fingerprint of the content"><p className="break-all">{version.contentHash}</p></MarginNote>
          <Caution />
        </>
      }
    >
      {version.state === "proposed" ? null : <Notice><p>This version is {version.state}. It waits for no decision.</p></Notice>}
      <Section title="Lows first: the last 14 days">
        <table className="table max-w-text">
          <tbody>
            <tr><th scope="row">Days with enough readings</th><td className="number">{figures.days} of 14</td></tr>
            <tr><th scope="row">Below 54 mg/dL (3.0 mmol/L)</th><td className="number">{percent(figures.below54Fraction)}</td></tr>
            <tr><th scope="row">Below 70 mg/dL (3.9 mmol/L)</th><td className="number">{percent(figures.below70Fraction)}</td></tr>
            <tr><th scope="row">In range</th><td className="number">{percent(figures.inRangeFraction)}</td></tr>
            <tr><th scope="row">Mean</th><td className="number">{figures.meanMgDl === null ? "–" : glucoseText(figures.meanMgDl, unit)}</td></tr>
          </tbody>
        </table>
      </Section>
      <Section title="What is proposed"><ProfileTable profile={version.profile} unit={unit} /></Section>
      {parent ? <Section title={`Version ${parent.number}, in effect now`}><ProfileTable profile={parent.profile} unit={unit} /></Section> : null}
      {arithmetic ? <Section title="The arithmetic"><ArithmeticTable arithmetic={arithmetic} /></Section> : null}
      {view.reviews.length > 0 ? (
        <Section title="Before this"><ul>{view.reviews.map((r) => <li key={`${r.revision}-${r.decision}`}>Wording {r.revision}: {r.decision} by {r.reviewerName}. {r.remarks}</li>)}</ul></Section>
      ) : null}
      {version.state === "proposed" ? (
        <>
          <Section title="Approve"><ApproveForm {...target} /></Section>
          <Section title="Send it back"><ReturnForm {...target} /></Section>
          <Section title="Decline"><DeclineForm {...target} /></Section>
        </>
      ) : null}
    </Page>
  );
}
