import { isoDayText } from "@/domain/day-text";
import { isoDayOfNumber } from "@/domain/iso-day";

export type StripDay = Readonly<{ day: number; value: number; isUsable: boolean; leftOutReason?: string }>;

const WIDTH = 720;
const LEFT = 64;
const TOP = 18;
const BOTTOM = 172;

/** Day by day: hollow before, filled after, left-out days hatched and still there. A table carries the same figures. */
export function DayStrip({
  days, changeDay, label, unitLabel, format,
}: Readonly<{ days: ReadonlyArray<StripDay>; changeDay: number; label: string; unitLabel: string; format: (value: number) => string }>) {
  if (days.length === 0) return null;
  const first = Math.min(changeDay, ...days.map((d) => d.day));
  const last = Math.max(changeDay, ...days.map((d) => d.day));
  const values = days.map((d) => d.value);
  const ticks = ticksOf(Math.min(...values), Math.max(...values));
  const [low, high] = [ticks[0] ?? 0, ticks.at(-1) ?? 1];
  const step = (WIDTH - LEFT - 16) / Math.max(1, last - first + 1);
  const x = (day: number) => LEFT + step * (day - first + 0.5);
  const y = (value: number) => BOTTOM - ((BOTTOM - TOP) * (value - low)) / Math.max(1e-9, high - low);
  const patternId = `left-out-${changeDay}`;
  return (
    <>
      <svg viewBox={`0 0 ${WIDTH} 204`} className="hidden w-full desk:block print:block" role="img" aria-label={label}>
        <defs>
          <pattern id={patternId} width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
            <line x1="0" y1="0" x2="0" y2="6" className="stroke-before" strokeWidth="1.6" />
          </pattern>
        </defs>
        <text x={LEFT - 10} y="12" textAnchor="end" className="fill-soft text-[13px]">{unitLabel}</text>
        {ticks.map((tick) => (
          <g key={tick}>
            <line x1={LEFT} x2={WIDTH - 8} y1={y(tick)} y2={y(tick)} className="stroke-hairline" />
            <text x={LEFT - 10} y={y(tick) + 5} textAnchor="end" className="fill-soft text-[14px]">{format(tick)}</text>
          </g>
        ))}
        {days.filter((d) => !d.isUsable).map((d) => (
          <rect key={d.day} x={x(d.day) - step / 2} width={step} y={TOP} height={BOTTOM - TOP} fill={`url(#${patternId})`} />
        ))}
        <line x1={x(changeDay)} x2={x(changeDay)} y1={TOP - 8} y2={BOTTOM + 6} className="stroke-ink" strokeWidth="2.5" />
        {days.map((d) => (
          <circle key={d.day} cx={x(d.day)} cy={y(d.value)} r="5.2" strokeWidth="2" className={d.day < changeDay ? "fill-paper stroke-before" : "fill-ink stroke-ink"} />
        ))}
        <text x={LEFT} y="198" className="fill-soft text-[14px]">{isoDayText(isoDayOfNumber(first))}</text>
        <text x={x(changeDay)} y="198" textAnchor="middle" className="fill-ink text-[14px]">change</text>
        <text x={WIDTH - 8} y="198" textAnchor="end" className="fill-soft text-[14px]">{isoDayText(isoDayOfNumber(last))}</text>
      </svg>
      <PhoneStrip days={days} changeDay={changeDay} format={format} label={label} />
      <details className="mt-2 text-note">
        <summary className="min-h-6">The same as a table</summary>
        <table className="table mt-2 max-w-sm">
          <thead><tr><th scope="col">Day</th><th scope="col">Side</th><th scope="col" className="number">{unitLabel}</th></tr></thead>
          <tbody>
            {days.map((d) => (
              <tr key={d.day}>
                <th scope="row" className="font-normal">{isoDayText(isoDayOfNumber(d.day))}</th>
                <td>{d.isUsable ? (d.day < changeDay ? "before" : "after") : `left out: ${d.leftOutReason ?? ""}`}</td>
                <td className="number">{format(d.value)}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </details>
    </>
  );
}

/** The same drawn anew for a phone: fewer labels, text that stays readable. */
function PhoneStrip({ days, changeDay, format, label }: Readonly<{ days: ReadonlyArray<StripDay>; changeDay: number; format: (value: number) => string; label: string }>) {
  const values = days.map((d) => d.value);
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const first = Math.min(changeDay, ...days.map((d) => d.day));
  const last = Math.max(changeDay, ...days.map((d) => d.day));
  const step = 280 / Math.max(1, last - first + 1);
  const x = (day: number) => 52 + step * (day - first + 0.5);
  const y = (value: number) => 124 - (104 * (value - low)) / Math.max(1e-9, high - low);
  return (
    <svg viewBox="0 0 340 150" className="w-full desk:hidden print:hidden" role="img" aria-label={label}>
      {[low, high].map((tick) => (
        <g key={tick}>
          <line x1="52" x2="336" y1={y(tick)} y2={y(tick)} className="stroke-hairline" />
          <text x="46" y={y(tick) + 5} textAnchor="end" className="fill-soft text-[13px]">{format(tick)}</text>
        </g>
      ))}
      {days.filter((d) => !d.isUsable).map((d) => (
        <line key={d.day} x1={x(d.day)} x2={x(d.day)} y1="16" y2="128" className="stroke-before" strokeDasharray="2 3" strokeWidth="2" />
      ))}
      <line x1={x(changeDay)} x2={x(changeDay)} y1="10" y2="132" className="stroke-ink" strokeWidth="2" />
      {days.map((d) => (
        <circle key={d.day} cx={x(d.day)} cy={y(d.value)} r="3.8" strokeWidth="1.6" className={d.day < changeDay ? "fill-paper stroke-before" : "fill-ink stroke-ink"} />
      ))}
      <text x="52" y="147" className="fill-soft text-[13px]">{isoDayText(isoDayOfNumber(first))}</text>
      <text x="336" y="147" textAnchor="end" className="fill-soft text-[13px]">{isoDayText(isoDayOfNumber(last))}</text>
    </svg>
  );
}

/** Two to four round ticks that hold all values. */
function ticksOf(low: number, high: number): number[] {
  const rough = Math.max(1, (high - low) / 3);
  const size = [1, 2, 5, 10, 20, 25, 50, 100].find((s) => s >= rough) ?? 100;
  const start = Math.floor(low / size) * size;
  const count = Math.ceil((high - start) / size);
  return Array.from({ length: Math.max(2, count + 1) }, (_, i) => start + i * size);
}
