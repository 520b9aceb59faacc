import { MarginNote } from "@/components/page";
import { TooWeakCaution } from "@/components/caution";
import { sourceLine } from "@/domain/settings/provenance";
import { GATE_CLOSED_TEXT } from "@/domain/settings/gate-questions";
import { pageChecks } from "@/domain/onboarding/page-checks";
import { profileFromApi } from "@/domain/settings/profile-api";
import type { WizardView } from "../queries/wizard";

type Row = { id: string; label: string; value: string; source: string };
type Sourced = { id: string; label: string; source: string; provenance: Parameters<typeof sourceLine>[1] };

const n = (value: number, places = 1) => String(Number(value.toFixed(places)));

/** What the published rules say for one setting, side by side, each with its source. */
function rowsOf({ arithmetic, step, journal }: WizardView): Row[] {
  if (!arithmetic) return [];
  const row = (m: Sourced, value: string): Row => ({ id: m.id, label: m.label, value, source: sourceLine(m.source, m.provenance) });
  const isMgDl = journal.glucoseUnit === "mg/dL";
  switch (step) {
    case "about-you":
      return arithmetic.totalDailyDose.methods.map((m) => row(m, `${n(m.units)} U`));
    case "device":
      return arithmetic.durationOfAction.methods.map((m) => row(m, `${n(m.minutes.cautious / 60)} h`));
    case "basal":
      return arithmetic.basal.methods.map((m) => row(m, `${n(m.unitsPerDay.cautious)} U`));
    case "carb-ratio":
      return arithmetic.carbRatio.methods.map((m) => row(m, `${n(m.gramsPerUnit.cautious)} g/U`));
    case "sensitivity":
      return arithmetic.sensitivity.methods.map((m) => row(m, isMgDl ? `${n(m.mgDlPerUnit.cautious)} mg/dL` : `${n(m.mmolPerUnit.cautious, 2)} mmol/L`));
    case "targets":
      return arithmetic.target.methods.map((m) => row(m, isMgDl ? `${m.lowMgDl} to ${m.highMgDl}` : `${n(m.lowMgDl / 18)} to ${n(m.highMgDl / 18)}`));
    default:
      return [];
  }
}

const TOO_WEAK_PAGES = ["basal", "carb-ratio", "sensitivity", "targets", "limits", "margin", "review"];
const SILENT_PAGES = ["about-you", "gate", "review"];

/** The margin of a wizard page: the rules, the checks, what the educator sees, and the cautions. */
export function ArithmeticNotes({ view }: Readonly<{ view: WizardView }>) {
  const isOpen = view.isGateOpen === true;
  const rows = isOpen ? rowsOf(view) : [];
  const cautious = isOpen && view.arithmetic?.profile ? profileFromApi(view.arithmetic.profile.cautious) : null;
  const checks = isOpen && view.profile ? pageChecks(view.step, view.profile, view.checkFacts, cautious) : [];
  return (
    <>
      {view.isGateOpen === false ? <MarginNote title="Your educator first"><p>{GATE_CLOSED_TEXT}</p></MarginNote> : null}
      {rows.length > 0 ? (
        <MarginNote title={view.step === "basal" || view.step === "about-you" ? "What the rules say, a day" : "What the rules say"}>
          <ul>
            {rows.map(({ id, label, value, source }) => (
              <li key={id} className="border-b border-hairline py-1.5">
                <details>
                  <summary className="flex justify-between gap-3"><span className="underline decoration-hairline underline-offset-4">{label}</span><span className="shrink-0 text-ink">{value}</span></summary>
                  <p className="mt-1">Source: {source}</p>
                </details>
              </li>
            ))}
          </ul>
          <p className="mt-1">Press a rule for its source. They disagree by design, and not one of them knows you. The choice among them is our own combination of cited rules, not a guideline.</p>
        </MarginNote>
      ) : null}
      {checks.length > 0 ? <MarginNote title="Checks, as last saved"><ul>{checks.map((text) => <li key={text} className="py-0.5">{text}</li>)}</ul></MarginNote> : null}
      {SILENT_PAGES.includes(view.step) ? null : <MarginNote title="Your educator sees"><p>{view.working ? "These numbers, the rules beside them, your previous profile, and your notes." : "These numbers, the rules beside them, your present doses, and your notes."}</p></MarginNote>}
      {TOO_WEAK_PAGES.includes(view.step) ? <TooWeakCaution /> : null}
    </>
  );
}
