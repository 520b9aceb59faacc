import { MarginNote } from "@/components/page";
import { TooWeakCaution } from "@/components/caution";
import { sourceLine } from "@/domain/settings/provenance";
import { GATE_CLOSED_TEXT } from "@/domain/settings/gate-questions";
import type { WizardView } from "../queries/wizard";

type Row = { id: string; label: string; value: string; source: string };

/** What the published rules say for one setting, side by side, each with its source. */
function rowsOf({ arithmetic, step }: WizardView): Row[] {
  if (!arithmetic) return [];
  const row = (m: { id: string; label: string; source: string; provenance: Parameters<typeof sourceLine>[1] }, value: string): Row => ({
    id: m.id, label: m.label, value, source: sourceLine(m.source, m.provenance),
  });
  const n = (value: number, places = 1) => String(Number(value.toFixed(places)));
  switch (step) {
    case "about-you":
    case "device":
      return arithmetic.totalDailyDose.methods.map((m) => row(m, `${n(m.units)} U a day`));
    case "basal":
      return arithmetic.basal.methods.map((m) => row(m, `${n(m.unitsPerDay.cautious)} U a day`));
    case "carb-ratio":
      return arithmetic.carbRatio.methods.map((m) => row(m, `${n(m.gramsPerUnit.cautious)} g/U`));
    case "sensitivity":
      return arithmetic.sensitivity.methods.map((m) => row(m, `${n(m.mgDlPerUnit.cautious)} mg/dL (${n(m.mmolPerUnit.cautious)} mmol/L)`));
    case "targets":
      return arithmetic.target.methods.map((m) => row(m, `${m.lowMgDl} to ${m.highMgDl} mg/dL`));
    default:
      return [];
  }
}

export function ArithmeticNotes({ view }: Readonly<{ view: WizardView }>) {
  const rows = rowsOf(view);
  const isClosed = view.isGateOpen === false;
  return (
    <>
      {isClosed ? <MarginNote title="Your educator first"><p>{GATE_CLOSED_TEXT}</p></MarginNote> : null}
      {!isClosed && rows.length > 0 ? (
        <MarginNote title="What the rules say">
          <ul>
            {rows.map(({ id, label, value, source }) => (
              <li key={id} className="border-b border-hairline py-1.5">
                <details>
                  <summary className="flex justify-between gap-3"><span>{label}</span><span className="shrink-0 text-ink">{value}</span></summary>
                  <p className="mt-1">Source: {source}</p>
                </details>
              </li>
            ))}
          </ul>
          <p className="mt-1">They disagree by design. Not one of them knows you.</p>
        </MarginNote>
      ) : null}
      {["basal", "carb-ratio", "sensitivity", "targets", "review", "margin"].includes(view.step) ? <TooWeakCaution /> : null}
      <MarginNote title="Your educator sees"><p>These numbers, the rules beside them, your present doses, your answers and your notes.</p></MarginNote>
    </>
  );
}
