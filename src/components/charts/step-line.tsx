import { clockText } from "@/domain/settings/clock-text";
import { labelPlaces, type StepValue } from "./step-line-labels";

type Line = Readonly<{
  title: string;
  unit: string;
  current: ReadonlyArray<StepValue>;
  /** The other edge where the setting is a range; the part between is filled. */
  upper?: ReadonlyArray<StepValue>;
  previous: ReadonlyArray<StepValue> | null;
  /** How far published rules lie apart, as a wash behind the line. */
  spread?: Readonly<{ low: number; high: number }> | null;
  currentLabel: string;
  previousLabel: string;
}>;

const [LEFT, TOP, BOTTOM, RIGHT_GAP] = [48, 26, 184, 12];
const DAY_MINUTES = 1440;
const HANDLE = 8;

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
function Drawn({ title, unit, current, upper, previous, spread, currentLabel, previousLabel, width, show }: Line & Readonly<{ width: number; show: string }>) {
  const right = width - RIGHT_GAP;
  const x = (minute: number) => LEFT + ((right - LEFT) * minute) / DAY_MINUTES;
  const values = [...current, ...(upper ?? []), ...(previous ?? [])].map((b) => b.value);
  if (values.length === 0) return null;
  const top = niceTop(Math.max(...values));
  const y = (value: number) => BOTTOM - ((BOTTOM - TOP) * Math.min(value, top)) / top;
  const now = inOrder(current);
  const before = inOrder(previous ?? []);
  const label = labelPlaces(upper ? inOrder(upper) : now, before, { current: currentLabel, previous: previousLabel }, { x, y, left: LEFT, right, top: TOP - 12 });
  const description = `${title}: ${now.map((b, i) => `from ${clockText(b.startMinute)} ${b.value}${upper ? ` to ${inOrder(upper)[i]?.value ?? ""}` : ""} ${unit}`).join(", ")}`;
  return (
    <svg viewBox={`0 0 ${width} 212`} className={`mt-4 w-full ${show}`} role="img" aria-label={description}>
      <text x="0" y="14" className="fill-soft text-[14px]">{unit}</text>
      {spread ? <rect x={LEFT} width={right - LEFT} y={y(spread.high)} height={Math.max(0, y(spread.low) - y(spread.high))} className="fill-wash" /> : null}
      {[0, 0.25, 0.5, 0.75, 1].map((share) => (
        <g key={share}>
          <line x1={LEFT} x2={right} y1={y(top * share)} y2={y(top * share)} className="stroke-hairline" />
          <text x={LEFT - 8} y={y(top * share) + 5} textAnchor="end" className="fill-soft text-[14px]">{tickText(top * share, top)}</text>
        </g>
      ))}
      {now.length > 0 ? <path d={`${stepPath(now, x, y)} ${upper ? backPath(inOrder(upper), x, y) : `L${x(DAY_MINUTES)},${y(0)} L${x(now[0]?.startMinute ?? 0)},${y(0)}`} Z`} className="fill-band" fillOpacity="0.8" /> : null}
      {before.length > 0 ? <path d={stepPath(before, x, y)} className="fill-none stroke-before" strokeWidth="2" strokeDasharray="7 5" /> : null}
      {[now, ...(upper ? [inOrder(upper)] : [])].map((blocks, edge) => (
        <g key={edge}>
          {blocks.length > 0 ? <path d={stepPath(blocks, x, y)} className="fill-none stroke-ink" strokeWidth="3" /> : null}
          {blocks.map((b) => <rect key={b.startMinute} x={x(b.startMinute) - (b.startMinute === 0 ? 0 : HANDLE / 2)} y={y(b.value) - HANDLE / 2} width={HANDLE} height={HANDLE} className="fill-paper stroke-ink" strokeWidth="2" />)}
        </g>
      ))}
      {label.previous ? <text {...label.previous} textAnchor="middle" className="fill-soft stroke-paper text-[14px]" paintOrder="stroke" strokeWidth="4">{previousLabel}</text> : null}
      {label.current ? <text {...label.current} textAnchor="middle" className="fill-ink stroke-paper text-[14px] font-semibold" paintOrder="stroke" strokeWidth="4">{currentLabel}</text> : null}
      {[0, 360, 720, 1080, DAY_MINUTES].map((minute) => (
        <text key={minute} x={x(minute)} y="206" textAnchor={minute === 0 ? "start" : minute === DAY_MINUTES ? "end" : "middle"} className="fill-soft text-[14px]">{clockText(minute)}</text>
      ))}
    </svg>
  );
}

function inOrder(blocks: ReadonlyArray<StepValue>): StepValue[] {
  return blocks.toSorted((a, b) => a.startMinute - b.startMinute);
}

type Scale = (value: number) => number;

function stepPath(blocks: ReadonlyArray<StepValue>, x: Scale, y: Scale): string {
  return blocks.map((b, i) => `${i === 0 ? "M" : "L"}${x(b.startMinute)},${y(b.value)} L${x(blocks[i + 1]?.startMinute ?? DAY_MINUTES)},${y(b.value)}`).join(" ");
}

/** The same edge walked from the evening to the morning, to close a range. */
function backPath(blocks: ReadonlyArray<StepValue>, x: Scale, y: Scale): string {
  return blocks.map((b, i) => `L${x(blocks[i + 1]?.startMinute ?? DAY_MINUTES)},${y(b.value)} L${x(b.startMinute)},${y(b.value)}`).toReversed().join(" ");
}

function tickText(value: number, top: number): string {
  return top < 2 ? value.toFixed(2) : String(Number(value.toFixed(1)));
}

function niceTop(highest: number): number {
  const size = 10 ** Math.floor(Math.log10(Math.max(highest, 1e-6)));
  return ([1, 1.5, 2, 3, 4, 5, 6, 8, 10].find((m) => m * size >= highest * 1.12) ?? 10) * size;
}
