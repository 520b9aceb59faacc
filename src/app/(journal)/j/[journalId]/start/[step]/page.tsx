import type { Metadata } from "next";
import { ButtonLink } from "@/components/button";
import { Caution } from "@/components/caution";
import { Notice } from "@/components/notice";
import { Page } from "@/components/page";
import { dateTimeText } from "@/domain/day-text";
import { rowCount, startOfStep } from "@/domain/onboarding/step-start";
import { STEP_TITLES, WIZARD_STEPS } from "@/domain/onboarding/wizard-step";
import { ArithmeticNotes } from "@/features/onboarding/components/arithmetic-notes";
import { BlocksFields, TargetFields } from "@/features/onboarding/components/blocks-fields";
import { MarginTable } from "@/features/onboarding/components/margin-table";
import { ReviewList } from "@/features/onboarding/components/review-list";
import { AboutYouFields, DeviceFields, FallbackFields, GateFields, LimitFields } from "@/features/onboarding/components/step-fields";
import { StepForm } from "@/features/onboarding/components/step-form";
import { WizardRule } from "@/features/onboarding/components/wizard-rule";
import { wizardPage, type WizardView } from "@/features/onboarding/queries/wizard";
import { readBlocks } from "@/domain/settings/blocks-text";
import { forPage } from "@/lib/action";

type Props = Readonly<{ params: Promise<{ journalId: string; step: string }>; searchParams: Promise<{ return?: string }> }>;

export const metadata: Metadata = { title: "Starting profile" };

export default async function WizardPage({ params, searchParams }: Props) {
  const { journalId, step } = await params;
  const view = await forPage((ctx) => wizardPage(ctx, { journalId, step }));
  const returnTo = (await searchParams).return === "review" ? "review" : "";
  const at = WIZARD_STEPS.indexOf(view.step);
  const before = WIZARD_STEPS[at - 1];
  const back = before ? <ButtonLink href={`/j/${journalId}/start/${returnTo || before}`}>Back</ButtonLink> : null;
  const start = startOfStep(view.step, view.typed, view.arithmetic?.profile?.cautious ?? null, view.journal.glucoseUnit, {
    basalUnits: view.journal.setup.basalStepMilliUnits / 1000, bolusUnits: view.journal.setup.bolusStepMilliUnits / 1000,
  });
  return (
    <Page
      eyebrow={`Starting profile · page ${at + 1} of ${WIZARD_STEPS.length} · saved ${dateTimeText(view.savedAt, view.journal.timeZone)}`}
      title={STEP_TITLES[view.step]}
      lead={<Lead view={view} />}
      margin={<><ArithmeticNotes view={view} /><Caution fallbackHref={`/j/${journalId}/fallback`} /></>}
    >
      <div className="mt-6"><WizardRule journalId={journalId} current={view.step} done={view.done} /></div>
      {view.sentAs !== null ? (
        <Notice><p>This became version {view.sentAs}. <a className="link" href={`/j/${journalId}/changes/${view.sentAs}`}>See how it stands</a></p></Notice>
      ) : view.step === "review" ? (
        <ReviewList view={view} journalId={journalId} />
      ) : (
        <StepForm journalId={journalId} step={view.step} rowVersion={view.rowVersion} start={start} returnTo={returnTo} back={back}>
          <Fields view={view} rows={rowCount(start)} />
        </StepForm>
      )}
    </Page>
  );
}

function Fields({ view, rows }: Readonly<{ view: WizardView; rows: number }>) {
  const unit = view.journal.glucoseUnit;
  const working = (name: string) => {
    const typed = view.answers["about-you"]?.[name];
    const blocks = readBlocks(typeof typed === "string" ? typed : "");
    return typeof blocks === "string" ? null : blocks;
  };
  switch (view.step) {
    case "about-you":
      return <AboutYouFields therapy={view.journal.therapy} unit={unit} />;
    case "gate":
      return <GateFields />;
    case "device":
      return <DeviceFields />;
    case "basal":
      return <BlocksFields rows={rows} suffix="U/h" previous={working("workingBasal")} title="Basal rate" isTotalShown />;
    case "carb-ratio":
      return <BlocksFields rows={rows} suffix="g/U" previous={working("workingCarbRatio")} title="Carb ratio" isTotalShown={false} />;
    case "sensitivity":
      return <BlocksFields rows={rows} suffix={`${unit} per U`} previous={working("workingSensitivity")} title="Sensitivity factor" isTotalShown={false} />;
    case "targets":
      return <TargetFields rows={rows} unit={unit} />;
    case "limits":
      return <LimitFields />;
    case "margin":
      return <MarginTable view={view} />;
    case "fallback":
      return <FallbackFields />;
    default:
      return null;
  }
}

/** Working settings of a pump go over as they are; the arithmetic only stands beside them. */
function CarriedOver({ view }: Readonly<{ view: WizardView }>) {
  const section = view.step === "basal" ? view.arithmetic?.basal : view.step === "carb-ratio" ? view.arithmetic?.carbRatio : view.arithmetic?.sensitivity;
  const unit = view.step === "basal" ? "U/h" : view.step === "carb-ratio" ? "g/U" : "mg/dL per U";
  return (
    <p>
      Your working settings are carried over unchanged.
      {section?.spread ? ` Published rules would range from ${n(section.spread.standard.low)} to ${n(section.spread.standard.high)} ${unit} for your daily dose.` : ""}
    </p>
  );
}

const n = (value: number) => String(Number(value.toFixed(2)));

/** The page's first sentence: the arithmetic in words, with the spread, never one bare number. */
function Lead({ view }: Readonly<{ view: WizardView }>) {
  const { arithmetic: a, step } = view;
  if (view.isGateOpen === false && ["basal", "carb-ratio", "sensitivity", "targets", "margin"].includes(step)) {
    return <p>Your educator sees the arithmetic here. You can write down numbers you know already, or leave this page as it is.</p>;
  }
  if (a?.route === "pump" && ["basal", "carb-ratio", "sensitivity"].includes(step)) return <CarriedOver view={view} />;
  if (step === "basal" && a?.basal.spread && a.basal.exact) {
    return <p>Published rules give between {n(a.basal.spread.cautious.low)} and {n(a.basal.spread.cautious.high)} U/h around the clock. The cautious start takes 40% of {n(a.totalDailyDose.cautious ?? 0)} U: {n(a.basal.exact.cautious)} U/h, rounded to the weaker side: {n(a.basal.cautious ?? 0)}.</p>;
  }
  if (step === "carb-ratio" && a?.carbRatio.spread && a.carbRatio.exact) {
    return <p>Published rules range from {n(a.carbRatio.spread.cautious.low)} to {n(a.carbRatio.spread.cautious.high)} g per unit. The 500 rule gives {n(a.carbRatio.exact.cautious)} for {n(a.totalDailyDose.cautious ?? 0)} U a day, rounded to the weaker side: {n(a.carbRatio.cautious ?? 0)}.</p>;
  }
  if (step === "sensitivity" && a?.sensitivity.spread && a.sensitivity.exact) {
    return <p>Published rules range from {n(a.sensitivity.spread.cautious.low)} to {n(a.sensitivity.spread.cautious.high)} mg/dL per unit. The cautious rule gives {n(a.sensitivity.exact.cautious)}, rounded to the weaker side: {n(a.sensitivity.cautious ?? 0)}{a.sensitivity.mmol ? ` (${n(a.sensitivity.mmol.cautious)} mmol/L)` : ""}.</p>;
  }
  if (step === "targets") return <p>The first week commonly aims higher than later on; 110 mg/dL is an ordinary target for later (common practice, no source).</p>;
  if (step === "gate") return <p>Plain yes, no or not sure. Not sure counts as yes. Nothing is judged, and all of it can be changed later.</p>;
  if (step === "margin") return <p>A start is set weaker than the arithmetic on purpose, so that the first surprises are high rather than low. Here is by how much.</p>;
  if (step === "fallback") return <p>Written down before day 1, one press away on every page, and on paper in the kit.</p>;
  if (step === "about-you") return <p>The arithmetic starts from your weight and the insulin of a usual day.</p>;
  if (step === "review") return <p>Nothing comes into effect by asking. Your educator looks at it and signs, sends it back with remarks, or declines.</p>;
  return null;
}
