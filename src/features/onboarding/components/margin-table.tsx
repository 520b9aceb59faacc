import { basalDayText, sideBySide } from "@/domain/onboarding/side-by-side";
import { MARGINS_PERCENT, withMargin } from "@/domain/onboarding/margin";
import type { WizardView } from "../queries/wizard";
import { SideBySideTable } from "./side-by-side-table";

const n = (value: number) => String(Number(value.toFixed(3)));

/** The start beside the plain arithmetic, and what other margins would come to. */
export function MarginTable({ view }: Readonly<{ view: WizardView }>) {
  const { arithmetic, profile, journal } = view;
  const [basal, ratio, factor] = [arithmetic?.basal.exact, arithmetic?.carbRatio.exact, arithmetic?.sensitivity.exact];
  if (!arithmetic || !profile || !basal || !ratio || !factor || view.isGateOpen !== true) {
    return <p className="mt-5 max-w-text">The arithmetic shows here once the pages before are filled in, or on your educator’s side where that comes first.</p>;
  }
  const plain = { unitsPerHour: basal.standard, gramsPerUnit: ratio.standard, mgDlPerUnit: factor.standard };
  const steps = { basalUnits: journal.setup.basalStepMilliUnits / 1000 };
  const unit = journal.glucoseUnit;
  return (
    <>
      <p className="mt-5 max-w-text">
        Plain arithmetic works from {n(arithmetic.totalDailyDose.standard ?? 0)} U a day. Your start has {basalDayText(profile.basal)} of basal a day.
        Weaker means: less basal, more grams for a unit, and a unit that is expected to lower glucose further.
      </p>
      <SideBySideTable rows={sideBySide(profile, null, arithmetic, unit)} hasNow={false} />
      <section className="mt-8">
        <h2 className="text-section">What if the margin were another one</h2>
        <p className="max-w-text">Each row makes the plain arithmetic weaker by one share, rounded to the weaker side. Computed for this page; no source calls one of them right.</p>
        <table className="table mt-2 max-w-text">
          <thead><tr><th scope="col">Weaker by</th><th scope="col" className="number">Basal, U/h</th><th scope="col" className="number">Ratio, g/U</th><th scope="col" className="number">Factor, {unit}</th></tr></thead>
          <tbody>
            {MARGINS_PERCENT.map((percent) => {
              const row = withMargin(plain, percent, steps, unit);
              return (
                <tr key={percent}>
                  <th scope="row" className="font-normal">{percent === 0 ? "nothing, rounded" : `${percent}%`}</th>
                  <td className="number">{n(row.unitsPerHour)}</td>
                  <td className="number">{n(row.gramsPerUnit)}</td>
                  <td className="number">{n(row.sensitivity)}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
        <p className="mt-3 max-w-text">Too strong shows as lows. Too weak shows as glucose that stays high and, with too little insulin, as ketones. A margin moves one towards the other; neither goes away with it.</p>
      </section>
    </>
  );
}
