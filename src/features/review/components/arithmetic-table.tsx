import { sourceLine } from "@/domain/settings/provenance";
import type { StartingProfileAnswer } from "@/domain/settings/starting-answer";

const n = (value: number | null | undefined) => (value === null || value === undefined ? "–" : String(Number(value.toFixed(2))));

/** The published arithmetic as the educator sees it: presets, exact figures, and every method with its source. */
export function ArithmeticTable({ arithmetic }: Readonly<{ arithmetic: StartingProfileAnswer }>) {
  const rows = [
    { name: "Total daily dose, U", cautious: arithmetic.totalDailyDose.cautious, standard: arithmetic.totalDailyDose.standard, exact: null },
    { name: "Basal, U/h", cautious: arithmetic.basal.cautious, standard: arithmetic.basal.standard, exact: arithmetic.basal.exact?.cautious },
    { name: "Carb ratio, g/U", cautious: arithmetic.carbRatio.cautious, standard: arithmetic.carbRatio.standard, exact: arithmetic.carbRatio.exact?.cautious },
    { name: "Sensitivity, mg/dL per U", cautious: arithmetic.sensitivity.cautious, standard: arithmetic.sensitivity.standard, exact: arithmetic.sensitivity.exact?.cautious },
  ];
  const sources = [
    ...arithmetic.totalDailyDose.methods, ...arithmetic.basal.methods, ...arithmetic.carbRatio.methods, ...arithmetic.sensitivity.methods,
  ];
  return (
    <>
      <table className="table max-w-text">
        <thead><tr><th scope="col">Setting</th><th scope="col" className="number">Cautious</th><th scope="col" className="number">exact</th><th scope="col" className="number">Standard</th></tr></thead>
        <tbody>
          {rows.map((r) => <tr key={r.name}><th scope="row" className="font-normal">{r.name}</th><td className="number">{n(r.cautious)}</td><td className="number">{n(r.exact)}</td><td className="number">{n(r.standard)}</td></tr>)}
        </tbody>
      </table>
      <details className="mt-2 text-note">
        <summary className="min-h-6">Every published method, with its source</summary>
        <ul className="mt-2">{sources.map((m) => <li key={m.id} className="border-b border-hairline py-1">{m.label}. {sourceLine(m.source, m.provenance)}</li>)}</ul>
      </details>
    </>
  );
}
