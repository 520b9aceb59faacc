import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { Page } from "@/components/page";
import { findingsOf } from "@/features/comparison/queries/findings";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Compare" };

/** The latest version that can be compared; before there is one, what comes first. */
export default async function ComparePage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const findings = await forPage((ctx) => findingsOf(ctx, { journalId }));
  const latest = Math.max(0, ...findings.keys());
  if (latest > 0) redirect(`/j/${journalId}/compare/${latest}`);
  return (
    <Page title="Nothing to compare yet." margin={<Caution fallbackHref={`/j/${journalId}/fallback`} />}>
      <Empty title="A comparison needs a version in effect before it, and glucose of the days on both sides.">
        <p>Three clean days on each side are needed to look, five after to say more. Until then the first days are for watching.</p>
      </Empty>
    </Page>
  );
}
