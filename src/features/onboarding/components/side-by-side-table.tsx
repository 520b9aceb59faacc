import { clockText } from "@/domain/settings/clock-text";
import type { SideBySideRow } from "@/domain/onboarding/side-by-side";

/** What is now, what the plain arithmetic says, and the start: on a phone each row folds under its name. */
export function SideBySideTable({ rows, hasNow }: Readonly<{ rows: ReadonlyArray<SideBySideRow>; hasNow: boolean }>) {
  return (
    <table className="table mt-4">
      <thead className="hidden desk:table-header-group">
        <tr>
          <th scope="col">Setting</th>
          {hasNow ? <th scope="col" className="number">Now</th> : null}
          <th scope="col" className="number">Plain arithmetic</th>
          <th scope="col" className="number">Your start</th>
          <th scope="col" className="number">Start against arithmetic</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={`${row.name} ${row.fromMinute}`} className="block border-b border-hairline py-2 desk:table-row">
            <th scope="row" className="block border-0! py-0! font-normal desk:table-cell desk:border-b! desk:py-[0.45rem]!">
              <span className="font-semibold first-letter:uppercase inline-block desk:font-normal">{row.name}</span>
              {row.fromMinute === 0 && row.toMinute === 1440 ? null : <span className="text-soft"> {clockText(row.fromMinute)}–{clockText(row.toMinute)}</span>}
            </th>
            {hasNow ? <Figure label="Now">{row.now}</Figure> : null}
            <Figure label="Plain arithmetic">{row.arithmetic}</Figure>
            <Figure label="Your start" isStrong>{row.start}</Figure>
            <Figure label="Start against arithmetic">{row.against}</Figure>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Figure({ label, isStrong = false, children }: Readonly<{ label: string; isStrong?: boolean; children: string | null }>) {
  return (
    <td className={`flex justify-between gap-4 border-0! py-0.5! text-right desk:table-cell desk:border-b! desk:py-[0.45rem]! ${isStrong ? "font-semibold" : ""}`}>
      <span className="font-normal text-soft desk:hidden">{label}</span>
      <span>{children ?? "–"}</span>
    </td>
  );
}
