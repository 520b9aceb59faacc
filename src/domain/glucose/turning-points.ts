const SHORT_POINTS = 5;
/** Steps of the long mean; a shorter trace has no turning points. */
export const LONG_POINTS = 32;

type Trace = ReadonlyArray<number | null>;

/**
 * The highs and lows between which a trace swings, in order. Where a 5-point
 * trailing mean crosses a 32-point one an arc ends; an arc above has a
 * highest value, an arc below a lowest. Trailing means lag, so each is looked
 * for from the turning point before it to the end of its arc.
 *
 * @param trace even steps, mg/dL; missing steps are left out of the means
 */
export function turningPoints(trace: Trace): number[] {
  const long = trailingMean(trace, LONG_POINTS);
  const points: number[] = [];
  let sign = 0;
  let from = 0;
  const closeArc = (end: number) => {
    const arc = trace.slice(from, end + 1);
    const known = arc.filter((v) => v !== null);
    if (known.length === 0) return;
    const extreme = known.reduce((a, b) => (sign < 0 ? Math.min(a, b) : Math.max(a, b)));
    points.push(extreme);
    from += arc.indexOf(extreme);
  };
  trailingMean(trace, SHORT_POINTS).forEach((short, i) => {
    const slow = long[i] ?? null;
    const next = short === null || slow === null ? 0 : Math.sign(short - slow);
    if (next === 0 || next === sign) return;
    // A trace that begins level belongs to the arc before its first crossing.
    if (sign === 0 && i > 0) sign = -next;
    if (sign !== 0) closeArc(i);
    sign = next;
  });
  closeArc(trace.length - 1);
  return points;
}

/** Trailing mean of so many steps; the first whole one stands for those before it. */
function trailingMean(trace: Trace, steps: number): (number | null)[] {
  return trace.map((_, i) => {
    const end = Math.max(i + 1, steps);
    const known = trace.slice(end - steps, end).filter((v) => v !== null);
    return known.length === 0 ? null : known.reduce((sum, v) => sum + v, 0) / known.length;
  });
}
