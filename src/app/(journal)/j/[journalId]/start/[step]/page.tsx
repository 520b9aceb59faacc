import type { Metadata } from "next";
import { ButtonLink } from "@/components/button";
import { Caution } from "@/components/caution";
import { Notice } from "@/components/notice";
import { Page } from "@/components/page";
import { dateTimeText } from "@/domain/day-text";
import { startOfStep } from "@/domain/onboarding/step-start";
import { STEP_TITLES, WIZARD_STEPS } from "@/domain/onboarding/wizard-step";
import { ArithmeticNotes } from "@/features/onboarding/components/arithmetic-notes";
import { AsideChoice } from "@/features/onboarding/components/aside-choice";
import { ReviewPage, SentPage } from "@/features/onboarding/components/review-page";
import { StepForm } from "@/features/onboarding/components/step-form";
import { StepLead } from "@/features/onboarding/components/step-lead";
import { StepPage } from "@/features/onboarding/components/step-page";
import { WizardRule } from "@/features/onboarding/components/wizard-rule";
import { wizardPage, type WizardView } from "@/features/onboarding/queries/wizard";
import { forPage } from "@/lib/action";

type Props = Readonly<{ params: Promise<{ journalId: string; step: string }>; searchParams: Promise<{ return?: string }> }>;

export const metadata: Metadata = { title: "Starting profile" };

export default async function WizardPage({ params, searchParams }: Props) {
  const { journalId, step } = await params;
  const view = await forPage((ctx) => wizardPage(ctx, { journalId, step }));
  const returnTo = (await searchParams).return === "review" ? "review" : "";
  const at = WIZARD_STEPS.indexOf(view.step);
  return (
    <Page
      eyebrow={`Starting profile · page ${at + 1} of ${WIZARD_STEPS.length} · saved ${dateTimeText(view.savedAt, view.journal.timeZone)}`}
      title={STEP_TITLES[view.step]}
      lead={<StepLead view={view} />}
      margin={<><ArithmeticNotes view={view} /><Caution fallbackHref={`/j/${journalId}/fallback`} /></>}
    >
      <div className="mt-6"><WizardRule journalId={journalId} current={view.step} done={view.done} /></div>
      {view.returned ? (
        <Notice>
          <p>{view.returned.reviewerName ?? "Your educator"} sent this back{view.returned.remarks ? `: “${view.returned.remarks}”` : "."} Mend what is asked; the next wording keeps number {view.returned.number}.</p>
        </Notice>
      ) : null}
      <Body view={view} journalId={journalId} returnTo={returnTo} />
    </Page>
  );
}

function Body({ view, journalId, returnTo }: Readonly<{ view: WizardView; journalId: string; returnTo: string }>) {
  if (view.sentAs) return <SentPage view={view} journalId={journalId} sentAs={view.sentAs} />;
  if (view.aside.length > 0) return <AsideChoice view={view} journalId={journalId} />;
  if (view.step === "review") return <ReviewPage view={view} journalId={journalId} />;
  const before = WIZARD_STEPS[WIZARD_STEPS.indexOf(view.step) - 1];
  const back = before ? <ButtonLink href={`/j/${journalId}/start/${returnTo || before}`}>Back</ButtonLink> : null;
  const { insulin, basalStepMilliUnits, bolusStepMilliUnits } = view.journal.setup;
  const preset = view.arithmetic?.profile?.cautious ?? null;
  const start = startOfStep(view.step, view.typed, { preset, unit: view.journal.glucoseUnit, insulin, basalStepUnits: basalStepMilliUnits / 1000, bolusStepUnits: bolusStepMilliUnits / 1000 });
  return (
    <StepForm journalId={journalId} step={view.step} unit={view.journal.glucoseUnit} rowVersion={view.rowVersion} start={start} returnTo={returnTo} back={back}>
      <StepPage view={view} start={start} />
    </StepForm>
  );
}
