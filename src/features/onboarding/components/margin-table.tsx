import type { WizardView } from "../queries/wizard";

const n = (value: number | null | undefined) => (value === null || value === undefined ? "–" : String(Number(value.toFixed(2))));

/** The chosen start beside the plain arithmetic and the standard one: how much weaker it is, setting by setting. */
export function MarginTable({ view }: Readonly<{ view: WizardView }>) {
  const { arithmetic, profile } = view;
  if (!arithmetic || !profile || view.isGateOpen === false) {
    return <p className="mt-5 max-w-text">The arithmetic shows here once the pages before are filled in, or on your educator’s side where that comes first.</p>;
  }
  const average = (list: ReadonlyArray<{ startMinute: number }>, value: (b: never) => number) =>
    list.reduce((sum, b, i) => sum + value(b as never) * ((list[i + 1]?.startMinute ?? 1440) - b.startMinute), 0) / 1440;
  const rows = [
    { name: "Basal, U/h", exact: arithmetic.basal.exact?.standard, cautious: arithmetic.basal.cautious, chosen: average(profile.basal, (b: { milliUnitsPerHour: number }) => b.milliUnitsPerHour / 1000), isHigherStronger: true },
    { name: "Carb ratio, g/U", exact: arithmetic.carbRatio.exact?.standard, cautious: arithmetic.carbRatio.cautious, chosen: average(profile.carbRatio, (b: { milligramsPerUnit: number }) => b.milligramsPerUnit / 1000), isHigherStronger: false },
    { name: "Sensitivity, mg/dL per U", exact: arithmetic.sensitivity.exact?.standard, cautious: arithmetic.sensitivity.cautious, chosen: average(profile.sensitivity, (b: { microMgDlPerUnit: number }) => b.microMgDlPerUnit / 1e6), isHigherStronger: false },
  ];
  return (
    <table className="table mt-5 max-w-text">
      <thead>
        <tr><th scope="col">Setting</th><th scope="col" className="number">Plain arithmetic</th><th scope="col" className="number">Cautious</th><th scope="col" className="number">Chosen</th><th scope="col" className="number">Difference</th></tr>
      </thead>
      <tbody>
        {rows.map(({ name, exact, cautious, chosen, isHigherStronger }) => {
          const change = exact ? (100 * (chosen - exact)) / exact : null;
          const way = change === null || Math.abs(change) < 0.5 ? "equal" : change > 0 === isHigherStronger ? "stronger" : "weaker";
          return (
            <tr key={name}>
              <th scope="row" className="font-normal">{name}</th>
              <td className="number">{n(exact)}</td>
              <td className="number">{n(cautious)}</td>
              <td className="number">{n(chosen)}</td>
              <td className="number">{change === null ? "–" : way === "equal" ? "equal" : `${Math.abs(change).toFixed(0)}% ${way}`}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
