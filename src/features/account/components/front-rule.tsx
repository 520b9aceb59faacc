const NOTCHES = [
  { number: 6, y: 30, words: "asked, not yet in effect", isWaiting: true, isLow: false },
  { number: 5, y: 70, words: "back, and steady", isWaiting: false, isLow: false },
  { number: 4, y: 100, words: "▼ more lows, undone", isWaiting: false, isLow: true },
  { number: 3, y: 138, words: "lower nights, likely", isWaiting: false, isLow: false },
  { number: 2, y: 198, words: "can’t be told yet", isWaiting: false, isLow: false },
  { number: 1, y: 244, words: "started weaker on purpose", isWaiting: false, isLow: false },
];

/** The brand's own drawing: a door-frame where versions are notched. */
export function FrontRule() {
  return (
    <svg viewBox="0 0 320 300" className="w-full max-w-sm" role="img" aria-label="A long rule with six notches, each a version of the settings with what followed it">
      <line x1="40" x2="40" y1="4" y2="296" className="stroke-ink" strokeWidth="3" />
      {NOTCHES.map(({ number, y, words, isWaiting, isLow }) => (
        <g key={number}>
          <text x="26" y={y + 6} textAnchor="end" className="fill-ink font-serif text-[18px] font-semibold">{number}</text>
          <line x1="40" x2="72" y1={y} y2={y} className="stroke-ink" strokeWidth="4" strokeDasharray={isWaiting ? "5 4" : undefined} />
          <text x="84" y={y + 5} className={`text-[16px] ${isLow ? "fill-low" : "fill-ink"}`}>{words}</text>
        </g>
      ))}
      <text x="26" y="280" textAnchor="end" className="fill-ink font-serif text-[18px] font-semibold">0</text>
      <line x1="40" x2="56" y1="274" y2="274" className="stroke-ink" strokeWidth="2.5" />
      <text x="84" y="279" className="fill-soft text-[16px]">the way back</text>
    </svg>
  );
}
