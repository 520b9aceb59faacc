/**
 * A likely difference as a lens: as thick as it is plausible, with a line at no
 * difference. The same numbers stand in the sentence above it.
 *
 * @param estimate after minus before; low90..high90 its likely range, one unit
 */
export function Lens({
  estimate, low90, high90, lowLabel, highLabel, label,
}: Readonly<{ estimate: number; low90: number; high90: number; lowLabel: string; highLabel: string; label: string }>) {
  return (
    <figure className="mt-6 max-w-text">
      <Drawn {...{ estimate, low90, high90, label }} width={600} show="hidden desk:block print:block" />
      <Drawn {...{ estimate, low90, high90, label }} width={330} show="desk:hidden print:hidden" />
      <figcaption className="flex justify-between gap-4 text-note text-soft">
        <span>{lowLabel}</span>
        <span className="font-semibold text-ink">{label}</span>
        <span>{highLabel}</span>
      </figcaption>
    </figure>
  );
}

/** Drawn anew for each width, so that its words keep their size. */
function Drawn({
  estimate, low90, high90, label, width, show,
}: Readonly<{ estimate: number; low90: number; high90: number; label: string; width: number; show: string }>) {
  const reach = 1.25 * Math.max(Math.abs(low90), Math.abs(high90), 1e-9);
  const x = (value: number) => width / 2 + ((width / 2 - 24) * value) / reach;
  const spread = (high90 - low90) / 2 / 1.645;
  const points = Array.from({ length: 61 }, (_, i) => estimate - 2.4 * spread + (4.8 * spread * i) / 60);
  const thickness = (value: number) => 17 * Math.exp(-0.5 * ((value - estimate) / spread) ** 2);
  const upper = points.map((v) => `${x(v).toFixed(1)},${(56 - thickness(v)).toFixed(1)}`);
  const lower = points.toReversed().map((v) => `${x(v).toFixed(1)},${(56 + thickness(v)).toFixed(1)}`);
  return (
    <svg viewBox={`0 0 ${width} 84`} className={`w-full ${show}`} role="img" aria-label={label}>
      <line x1="16" x2={width - 16} y1="56" y2="56" className="stroke-hairline" strokeWidth="2" />
      <polygon points={[...upper, ...lower].join(" ")} className="fill-range" />
      <line x1={x(0)} x2={x(0)} y1="24" y2="76" className="stroke-ink" strokeWidth="2" />
      <text x={Math.min(Math.max(x(0), 48), width - 48)} y="16" textAnchor="middle" className="fill-ink text-[14px]">no difference</text>
      <circle cx={x(estimate)} cy="56" r="6" className="fill-ink stroke-paper" strokeWidth="2" />
    </svg>
  );
}
