import { backUpDoses, type BackUpDose } from "@/domain/settings/fallback";
import { sourceLine } from "@/domain/settings/provenance";
import type { WizardView } from "../queries/wizard";

/** The published back-up arithmetic for the draft, for the educator to choose from; no number while the gate is closed. */
export function BackUpTable({ view }: Readonly<{ view: WizardView }>) {
  return (
    <section className="mt-8">
      <h2 className="text-section">Back-up doses: what is published</h2>
      {view.isGateOpen === true && view.profile ? (
        <>
          <p className="max-w-text">They disagree. Your educator chooses one and writes it down; none of them is yours to pick alone.</p>
          <BackUpRows doses={backUpDoses(view.profile.basal, view.checkFacts.totalDailyDoseUnits)} />
        </>
      ) : (
        <p className="max-w-text">{view.isGateOpen === false ? "Your educator sees the arithmetic and writes the doses down." : "The arithmetic shows here once the pages before are filled in."}</p>
      )}
    </section>
  );
}

/** Every published variant with its source, the same on the wizard's page and the card. */
export function BackUpRows({ doses }: Readonly<{ doses: ReadonlyArray<BackUpDose> }>) {
  return (
    <ul className="mt-2 max-w-text text-note text-soft">
      {doses.map(({ id, label, units, source, provenance }) => (
        <li key={id} className="flex justify-between gap-4 border-t border-hairline py-1.5">
          <span>{label.charAt(0).toUpperCase() + label.slice(1)}. Source: {sourceLine(source, provenance)}</span>
          <span className="shrink-0 text-ink">{units.toFixed(1)} U</span>
        </li>
      ))}
    </ul>
  );
}
