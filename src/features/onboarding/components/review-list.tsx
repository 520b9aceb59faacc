import Link from "next/link";
import { flattened } from "@/domain/onboarding/step-start";
import { STEP_NAMES, WIZARD_STEPS } from "@/domain/onboarding/wizard-step";
import { checkProfile } from "@/domain/settings/checks";
import type { WizardView } from "../queries/wizard";
import { ProposeForm } from "./propose-form";

const HIDDEN = new Set(["returnTo", "journalId", "step", "rowVersion"]);

/** Every page's answers with a way to change each, the checks, and the one next step. */
export function ReviewList({ view, journalId }: Readonly<{ view: WizardView; journalId: string }>) {
  const steps = WIZARD_STEPS.filter((step) => step !== "review" && step !== "margin");
  const missing = steps.filter((step) => !view.done.includes(step) && !(["basal", "carb-ratio", "sensitivity", "targets", "limits"] as string[]).includes(step));
  const isClosed = view.isGateOpen === false;
  const checks = view.profile && !isClosed
    ? checkProfile(view.profile, {
        totalDailyDoseUnits: view.arithmetic?.totalDailyDose.cautious ?? null, weightKg: null,
        basalStepMilliUnits: view.journal.setup.basalStepMilliUnits, bolusStepMilliUnits: view.journal.setup.bolusStepMilliUnits, largestRecentBolusMilliUnits: null,
      })
    : [];
  return (
    <>
      <dl className="mt-6 max-w-text">
        {steps.map((step) => {
          const typed = Object.entries(flattened(view.answers[step] ?? {})).filter(([name, value]) => value !== "" && !HIDDEN.has(name));
          return (
            <div key={step} className="flex flex-wrap justify-between gap-x-6 border-b border-hairline py-2.5">
              <dt className="font-semibold">{STEP_NAMES[step]}</dt>
              <dd className="text-soft">
                {typed.length === 0 ? (missing.includes(step) ? "Not filled in yet" : isClosed ? "With your educator" : "The cautious start") : `${typed.length} answers`}{" "}
                <Link className="link ml-3 text-ink" href={`/j/${journalId}/start/${step}?return=review`}>Change<span className="sr-only"> {STEP_NAMES[step]}</span></Link>
              </dd>
            </div>
          );
        })}
      </dl>
      {checks.length > 0 ? (
        <section className="mt-8 max-w-text">
          <h2 className="text-section">Checks</h2>
          <ul className="mt-1">{checks.map((c) => <li key={c.code} className="border-b border-hairline py-2">{c.severity === "blocks" ? <strong>Mend before asking: </strong> : null}{c.text}</li>)}</ul>
        </section>
      ) : null}
      {missing.length === 0 ? (
        <ProposeForm journalId={journalId} rowVersion={view.rowVersion} />
      ) : (
        <p className="mt-6 max-w-text font-semibold">
          Before asking:{" "}
          {missing.map((step) => <Link key={step} className="link mr-3" href={`/j/${journalId}/start/${step}?return=review`}>{STEP_NAMES[step]}</Link>)}
        </p>
      )}
    </>
  );
}
