import { clockText } from "@/domain/settings/clock-text";

type Value = Readonly<{ startMinute: number; value: number }>;

const [LEFT, TOP, BOTTOM] = [48, 26, 184];

type Line = Readonly<{ title: string; unit: string; current: ReadonlyArray<Value>; previous: ReadonlyArray<Value> | null }>;

/** A setting around the clock: the profile as a filled step line, the previous one dashed behind it. */
export function StepLine(line: Line) {
  return (
    <>
      <Drawn {...line} width={680} show="hidden desk:block print:block" />
      <Drawn {...line} width={340} show="desk:hidden print:hidden" />
    </>
  );
}

/** Drawn anew for each width, so that its words keep their size. */
function Drawn({ title, unit, current, previous, width, show }: Line & Readonly<{ width: number; show: string }>) {
  const x = (minute: number) => LEFT + ((width - LEFT - 12) * minute) / 1440;
  const all = [...current, ...(previous ?? [])].map((b) => b.value);
  if (all.length === 0) return null;
  const top = niceTop(Math.max(...all));
  const y = (value: number) => BOTTOM - ((BOTTOM - TOP) * value) / top;
  const path = (blocks: ReadonlyArray<Value>) => {
    const sorted = blocks.toSorted((a, b) => a.startMinute - b.startMinute);
    return sorted.map((b, i) => `${i === 0 ? "M" : "L"}${x(b.startMinute)},${y(b.value)} L${x(sorted[i + 1]?.startMinute ?? 1440)},${y(b.value)}`).join(" ");
  };
  const description = `${title}: ${current.map((b) => `from ${clockText(b.startMinute)} ${b.value} ${unit}`).join(", ")}`;
  return (
    <svg viewBox={`0 0 ${width} 212`} className={`mt-4 w-full ${show}`} role="img" aria-label={description}>
      <text x="0" y="14" className="fill-soft text-[14px]">{unit}</text>
      {[0, 0.25, 0.5, 0.75, 1].map((share) => (
        <g key={share}>
          <line x1={LEFT} x2={width - 12} y1={y(top * share)} y2={y(top * share)} className="stroke-hairline" />
          {share === 0 || share === 0.5 || share === 1 ? (
            <text x={LEFT - 8} y={y(top * share) + 5} textAnchor="end" className="fill-soft text-[14px]">{Number((top * share).toFixed(2))}</text>
          ) : null}
        </g>
      ))}
      {current.length > 0 ? <path d={`${path(current)} L${x(1440)},${y(0)} L${x(0)},${y(0)} Z`} className="fill-band" /> : null}
      {previous && previous.length > 0 ? <path d={path(previous)} className="fill-none stroke-before" strokeWidth="2" strokeDasharray="7 5" /> : null}
      {current.length > 0 ? <path d={path(current)} className="fill-none stroke-ink" strokeWidth="3" /> : null}
      {previous && previous.length > 0 ? <text x={width - 16} y={Math.max(TOP - 8, y(Math.max(...previous.map((b) => b.value))) - 7)} textAnchor="end" className="fill-soft text-[14px]">as it is now, dashed</text> : null}
      {[0, 360, 720, 1080, 1440].map((minute) => (
        <text key={minute} x={x(minute)} y="206" textAnchor={minute === 0 ? "start" : minute === 1440 ? "end" : "middle"} className="fill-soft text-[14px]">{clockText(minute)}</text>
      ))}
    </svg>
  );
}

function niceTop(highest: number): number {
  const size = 10 ** Math.floor(Math.log10(Math.max(highest, 1e-6)));
  return ([1, 1.5, 2, 3, 4, 5, 6, 8, 10].find((m) => m * size >= highest * 1.1) ?? 10) * size;
}
