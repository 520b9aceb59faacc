type Dot = Readonly<{ day: number; value: number; side: "before" | "after" }>;

/** One dot a day: hollow before, filled after. Decorative; the sentence beside it carries the figures. */
export function MiniStrip({ dots }: Readonly<{ dots: ReadonlyArray<Dot> }>) {
  if (dots.length < 2) return null;
  const days = dots.map((d) => d.day);
  const values = dots.map((d) => d.value);
  const [first, last] = [Math.min(...days), Math.max(...days)];
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const x = (day: number) => 6 + (288 * (day - first)) / Math.max(1, last - first);
  const y = (value: number) => 34 - (24 * (value - low)) / Math.max(1e-9, high - low);
  const middle = y(values.reduce((sum, v) => sum + v, 0) / values.length);
  return (
    <svg viewBox="0 0 300 44" className="mt-2 w-full max-w-sm" aria-hidden="true">
      <line x1="0" x2="300" y1={middle} y2={middle} className="stroke-hairline" />
      {dots.map((dot) => (
        <circle
          key={`${dot.side}-${dot.day}`}
          cx={x(dot.day)}
          cy={y(dot.value)}
          r="3.6"
          className={dot.side === "before" ? "fill-paper stroke-before" : "fill-ink stroke-ink"}
          strokeWidth="1.6"
        />
      ))}
    </svg>
  );
}
