/** A block of a setting: it holds from its start on. */
export type StepValue = Readonly<{ startMinute: number; value: number }>;

/** Where a word stands at a line: its middle and its foot, in the drawing's own units. */
export type LabelPlace = Readonly<{ x: number; y: number }>;

type Scale = Readonly<{ x: (minute: number) => number; y: (value: number) => number; left: number; right: number; top: number }>;

const DAY_MINUTES = 1440;
const LETTER_WIDTH = 6.9;
const LINE_HEIGHT = 17;
const ABOVE = -8;
const BELOW = 18;

/** The middle of the longest block: the quietest place for a word. */
function quietest(blocks: ReadonlyArray<StepValue>): { minute: number; value: number } {
  const spans = blocks.map(({ startMinute, value }, i) => ({ from: startMinute, to: blocks[i + 1]?.startMinute ?? DAY_MINUTES, value }));
  const longest = spans.toSorted((a, b) => b.to - b.from - (a.to - a.from))[0] ?? { from: 0, to: DAY_MINUTES, value: 0 };
  return { minute: (longest.from + longest.to) / 2, value: longest.value };
}

/**
 * Places for the words at the present and the previous line: over the quietest
 * part of each, within the drawing, and under the line where the words would
 * meet each other or leave the top.
 */
export function labelPlaces(
  current: ReadonlyArray<StepValue>,
  previous: ReadonlyArray<StepValue> | null,
  words: Readonly<{ current: string; previous: string }>,
  scale: Scale,
): Readonly<{ current: LabelPlace | null; previous: LabelPlace | null }> {
  const place = (blocks: ReadonlyArray<StepValue> | null, word: string) => {
    if (!blocks || blocks.length === 0) return null;
    const { minute, value } = quietest(blocks);
    const half = (word.length * LETTER_WIDTH) / 2;
    const above = scale.y(value) + ABOVE;
    return { x: Math.min(Math.max(scale.x(minute), scale.left + half), scale.right - half), y: above < scale.top ? scale.y(value) + BELOW : above, line: scale.y(value), half };
  };
  const [now, before] = [place(current, words.current), place(previous, words.previous)];
  if (now && before && Math.abs(now.y - before.y) < LINE_HEIGHT && Math.abs(now.x - before.x) < now.half + before.half) {
    const lower = now.line >= before.line ? now : before;
    lower.y = lower.line + BELOW;
  }
  const pick = (placed: typeof now): LabelPlace | null => (placed ? { x: placed.x, y: placed.y } : null);
  return { current: pick(now), previous: pick(before) };
}
