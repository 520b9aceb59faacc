import { PressButton } from "@/components/form/press-button";
import { answerLines } from "@/domain/onboarding/answer-lines";
import type { TypedPage } from "@/domain/onboarding/draft";
import { chooseTextAction } from "../actions";
import type { WizardView } from "../queries/wizard";
import { AnswerList } from "./answer-list";

/** Two devices typed for one page: both texts side by side, and a press for the one that stays. */
export function AsideChoice({ view, journalId }: Readonly<{ view: WizardView; journalId: string }>) {
  const hidden = { journalId, step: view.step, rowVersion: String(view.rowVersion) };
  return (
    <section className="mt-6" aria-labelledby="aside">
      <h2 id="aside" className="text-section">This page was saved on another device meanwhile.</h2>
      <p className="max-w-text">Nothing is lost: both texts are here. Choose the one that stays; the page can be changed after that.</p>
      <div className="mt-2 desk:grid desk:grid-cols-2 desk:gap-x-10">
        <Text title="As it was saved" typed={view.typed} view={view} press={<PressButton action={chooseTextAction} label="Keep this one" hidden={{ ...hidden, keep: "saved" }} />} />
        {view.aside.map((typed, i) => (
          <Text key={i} title={view.aside.length === 1 ? "As it was typed here after that" : `As it was typed after that, ${i + 1}`} typed={typed} view={view} press={<PressButton action={chooseTextAction} label="Keep this one" hidden={{ ...hidden, keep: String(i) }} />} />
        ))}
      </div>
    </section>
  );
}

function Text({ title, typed, view, press }: Readonly<{ title: string; typed: TypedPage; view: WizardView; press: React.ReactNode }>) {
  const lines = answerLines(view.step, typed, view.journal.glucoseUnit);
  return (
    <section className="mt-4 border-t border-hairline pt-3">
      <h3 className="font-sans font-semibold">{title}</h3>
      {lines.length === 0 ? <p className="text-soft">As the cautious start has it.</p> : <AnswerList lines={lines} />}
      <div className="mt-3">{press}</div>
    </section>
  );
}
