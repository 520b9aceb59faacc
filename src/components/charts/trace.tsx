type Point = Readonly<{ minute: number; value: number }>;
type Mark = Readonly<{ minute: number; label: string }>;

const LINK_MINUTES = 20;

type Layout = Readonly<{ width: number; left: number; bottom: number; size: string; lanes: number; show: string }>;
const DESK: Layout = { width: 720, left: 50, bottom: 210, size: "text-[14px]", lanes: 2, show: "hidden desk:block print:block" };
const PHONE: Layout = { width: 344, left: 40, bottom: 170, size: "text-[13px]", lanes: 3, show: "desk:hidden print:hidden" };

/** One day of glucose with what was logged in a lane of its own below the time axis. Gaps stay gaps. */
export function Trace(props: Readonly<{ points: ReadonlyArray<Point>; marks: ReadonlyArray<Mark>; low: number; high: number; unit: string; label: string }>) {
  return (
    <>
      <Drawn {...props} layout={DESK} />
      <Drawn {...props} layout={PHONE} />
    </>
  );
}

function Drawn({
  points, marks, low, high, unit, label, layout,
}: Readonly<{ points: ReadonlyArray<Point>; marks: ReadonlyArray<Mark>; low: number; high: number; unit: string; label: string; layout: Layout }>) {
  const { width, left, bottom, size, lanes, show } = layout;
  const top = Math.max(high * 1.4, ...points.map((p) => p.value));
  const x = (minute: number) => left + ((width - left - 8) * minute) / 1440;
  const y = (value: number) => bottom - ((bottom - 24) * value) / top;
  const pieces: string[] = [];
  points.forEach((p, i) => {
    const before = points[i - 1];
    pieces.push(`${before && p.minute - before.minute <= LINK_MINUTES ? "L" : "M"}${x(p.minute).toFixed(1)},${y(p.value).toFixed(1)}`);
  });
  const lane = (i: number) => bottom + 42 + 18 * (i % lanes);
  const last = points.at(-1);
  return (
    <svg viewBox={`0 0 ${width} ${bottom + (marks.length > 0 ? 34 + 18 * lanes : 26)}`} className={`mt-4 w-full ${show}`} role="img" aria-label={label}>
      <text x="0" y="14" className={`fill-soft ${size}`}>{unit}</text>
      {([[low, "stroke-low"], [high, "stroke-high"]] as const).map(([value, colour]) => (
        <g key={value}>
          <line x1={left} x2={width - 8} y1={y(value)} y2={y(value)} className={colour} strokeWidth="1.6" strokeDasharray="2 4" />
          <text x={left - 8} y={y(value) + 5} textAnchor="end" className={`fill-soft ${size}`}>{value}</text>
        </g>
      ))}
      <path d={pieces.join(" ")} className="fill-none stroke-ink" strokeWidth="2.6" strokeLinejoin="round" />
      {points.filter((p) => p.value < low).map((p) => (
        <path key={p.minute} d={`M${x(p.minute) - 3},${y(p.value) - 5} h6 l-3,6 z`} className="fill-low" />
      ))}
      {last ? <circle cx={x(last.minute)} cy={y(last.value)} r="4.5" className="fill-ink" /> : null}
      {[0, 360, 720, 1080, 1440].map((minute) => (
        <text key={minute} x={x(minute)} y={bottom + 20} textAnchor={minute === 0 ? "start" : minute === 1440 ? "end" : "middle"} className={`fill-soft ${size}`}>
          {String(minute / 60).padStart(2, "0")}:00
        </text>
      ))}
      {marks.map((mark, i) => (
        <g key={`${mark.minute}-${i}`}>
          <line x1={x(mark.minute)} x2={x(mark.minute)} y1={bottom} y2={bottom + 8} className="stroke-ink" strokeWidth="2" />
          <text x={Math.min(Math.max(x(mark.minute), left + 30), width - 50)} y={lane(i)} textAnchor="middle" className={`fill-ink ${size}`}>{mark.label}</text>
        </g>
      ))}
    </svg>
  );
}
