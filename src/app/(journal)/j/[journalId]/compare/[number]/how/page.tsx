import type { Metadata } from "next";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Caution } from "@/components/caution";
import { Page, Section } from "@/components/page";
import { explainComparison } from "@/domain/comparison/explain";
import { comparisonOf } from "@/features/comparison/queries/comparison";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "How this is worked out" };

export default async function HowPage({ params }: Readonly<{ params: Promise<{ journalId: string; number: string }> }>) {
  const { journalId, number } = await params;
  const view = await forPage((ctx) => comparisonOf(ctx, { journalId, number }));
  return (
    <Page
      eyebrow={view.finding.title}
      title="How this is worked out."
      lead={<p>We compare your average day after the change with your average day before it, and only call it when the gap is bigger than your own day-to-day ups and downs could easily produce, even if you look every day.</p>}
      margin={<Caution fallbackHref={`/j/${journalId}/fallback`} />}
    >
      {explainComparison(view.comparison).map(({ title, text, rows }) => (
        <Section key={title} title={title}>
          <p className="max-w-text">{text}</p>
          {rows.length > 0 ? (
            <table className="table mt-2 max-w-text">
              <thead className="sr-only"><tr><th scope="col">Figure</th><th scope="col">Value</th></tr></thead>
              <tbody>
                {rows.map((row) => (
                  <tr key={row.name}><th scope="row" className="font-normal">{row.name}</th><td className="number">{row.value}</td></tr>
                ))}
              </tbody>
            </table>
          ) : null}
        </Section>
      ))}
      <ButtonRow><ButtonLink href={`/j/${journalId}/compare/${view.comparison.version}`}>Back to the comparison</ButtonLink></ButtonRow>
    </Page>
  );
}
