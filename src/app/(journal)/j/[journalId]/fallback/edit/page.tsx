import type { Metadata } from "next";
import { forbidden } from "next/navigation";
import { Caution } from "@/components/caution";
import { Page } from "@/components/page";
import { flattened } from "@/domain/onboarding/step-start";
import { CardForm } from "@/features/onboarding/components/card-form";
import { fallbackCard } from "@/features/onboarding/queries/fallback-card";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Write the fallback card" };

export default async function FallbackEditPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { card, mayEdit } = await forPage((ctx) => fallbackCard(ctx, { journalId }));
  if (!mayEdit) forbidden();
  const units = (milliUnits: number | null) => (milliUnits === null ? "" : String(milliUnits / 1000));
  const start = card
    ? flattened({ previousSetup: card.previousSetup, emergencyNumber: card.emergencyNumber, contacts: card.contacts, longActingUnits: units(card.longActingMilliUnits), rapidUnits: units(card.rapidMilliUnits) })
    : {};
  return (
    <Page title="Write the fallback card." lead={<p>One press away on every page, and on paper in the kit. It can be written anew at any time.</p>} margin={<Caution fallbackHref={`/j/${journalId}/fallback`} />}>
      <CardForm journalId={journalId} start={start} />
    </Page>
  );
}
