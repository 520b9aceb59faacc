import Link from "next/link";
import { STEP_NAMES, WIZARD_STEPS, type WizardStep } from "@/domain/onboarding/wizard-step";

/** The pages as notches: done long, open short, the one you are on thick. */
export function WizardRule({ journalId, current, done }: Readonly<{ journalId: string; current: WizardStep; done: ReadonlyArray<WizardStep> }>) {
  return (
    <nav aria-label="Pages of the starting profile" className="no-print mb-6 overflow-x-auto">
      <ol className="flex min-w-max border-t-2 border-ink">
        {WIZARD_STEPS.map((step) => (
          <li key={step} className="pr-3 desk:pr-5">
            <span aria-hidden="true" className={`block w-0.5 bg-ink ${step === current ? "h-4 w-1" : done.includes(step) ? "h-4" : "h-1.5"}`} />
            <Link
              href={`/j/${journalId}/start/${step}`}
              aria-current={step === current ? "step" : undefined}
              className={`inline-flex min-h-8 min-w-6 items-center text-note ${step === current ? "font-semibold text-ink" : "text-soft"}`}
            >
              <span className={step === current ? "" : "sr-only desk:not-sr-only"}>{STEP_NAMES[step]}</span>
              {done.includes(step) ? <span className="sr-only"> (done)</span> : null}
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}
