import { clockText } from "@/domain/settings/clock-text";
import type { Band } from "./band";

/** The time-of-day bands as a table, every three hours. */
export function BandsTable({ before, after, format }: Readonly<{ before: ReadonlyArray<Band>; after: ReadonlyArray<Band>; format: (value: number) => string }>) {
  const cells = (band: Band | undefined) => (band ? `${format(band.p50)} (${format(band.p25)} to ${format(band.p75)})` : "no readings");
  return (
    <details className="mt-2 text-note">
      <summary className="min-h-6">The same as a table</summary>
      <table className="table mt-2">
        <thead><tr><th scope="col">At</th><th scope="col" className="number">Before: middle (half of readings)</th><th scope="col" className="number">After</th></tr></thead>
        <tbody>
          {Array.from({ length: 8 }, (_, i) => i * 180).map((minute) => (
            <tr key={minute}>
              <th scope="row" className="font-normal">{clockText(minute)}</th>
              <td className="number">{cells(before.find((b) => b.minute === minute))}</td>
              <td className="number">{cells(after.find((b) => b.minute === minute))}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
