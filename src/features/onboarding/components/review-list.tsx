import Link from "next/link";
import { answerLines } from "@/domain/onboarding/answer-lines";
import { STEP_NAMES, WIZARD_STEPS, type WizardStep } from "@/domain/onboarding/wizard-step";
import type { WizardView } from "../queries/wizard";
import { AnswerList } from "./answer-list";

const LEFT_AS_PRESET: ReadonlyArray<WizardStep> = ["basal", "carb-ratio", "sensitivity", "targets", "limits"];

/** The pages that asking waits for. */
export function missingPages(view: WizardView): WizardStep[] {
  const unanswered = WIZARD_STEPS.filter((step) => step !== "review" && step !== "margin" && !LEFT_AS_PRESET.includes(step) && !view.done.includes(step));
  return [...new Set([...unanswered, ...view.unreadable, ...view.asideSteps])];
}

/** Every page's answers, with a way to change each that comes back here. */
export function ReviewList({ view, journalId, isReadOnly = false }: Readonly<{ view: WizardView; journalId: string; isReadOnly?: boolean }>) {
  const missing = missingPages(view);
  return (
    <section className="mt-9">
      <h2 className="text-section">Your answers, page by page</h2>
      <ul className="mt-2 max-w-text">
        {WIZARD_STEPS.filter((step) => step !== "review" && step !== "margin").map((step) => {
          const lines = answerLines(step, view.answers[step] ?? {}, view.journal.glucoseUnit);
          return (
            <li key={step} className="border-t border-hairline py-2.5">
              <div className="flex flex-wrap items-baseline justify-between gap-x-6">
                <h3 className="font-sans font-semibold">{STEP_NAMES[step]}</h3>
                {isReadOnly ? null : <Link className="link inline-flex min-h-8 items-center" href={`/j/${journalId}/start/${step}?return=review`}>Change<span className="sr-only"> {STEP_NAMES[step]}</span></Link>}
              </div>
              {lines.length > 0 ? <AnswerList lines={lines} /> : <p className="text-soft">{missing.includes(step) ? "Not filled in yet." : view.isGateOpen === false ? "With your educator." : "The cautious start."}</p>}
            </li>
          );
        })}
      </ul>
    </section>
  );
}
