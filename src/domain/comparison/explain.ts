import type { Comparison } from "./compare";
import { effectiveDays, meanCorrelation } from "./correlation";
import { OUTCOMES } from "./outcomes";

export type Step = Readonly<{ title: string; text: string; rows: ReadonlyArray<{ name: string; value: string }> }>;

const n = (value: number, places = 3) => value.toFixed(places);

/** The shown comparison again, step by step, from the journal's own numbers. */
export function explainComparison(c: Comparison): Step[] {
  const { kind, sigma0, unit } = OUTCOMES[c.outcome];
  const shown = c.outcome === "day-lows" || c.verdict === "more-lows" ? c.lows.effect : c.effect;
  const days: Step = {
    title: "1. The days",
    text: `At most 28 days on each side. The day of the change and the day before it are never used: the day before is commonly what prompted the change. ${c.leftOut.length} more were left out for flags or missing readings.`,
    rows: [{ name: "Clean before", value: String(c.before.length) }, { name: "Clean after", value: String(c.after.length) }],
  };
  if (!shown) return [days, { title: "2. No figures yet", text: "Fewer than three clean days on a side: nothing is worked out.", rows: [] }];
  const before = c.before.map((d) => d.day);
  const after = c.after.map((d) => d.day);
  const isRoots = shown === c.lows.effect;
  return [
    days,
    {
      title: "2. The difference",
      text: isRoots ? "Lows are compared as the square root of each day’s percent below 70 mg/dL, since many days have none." : `Average after minus average before, in ${unit}.`,
      rows: [{ name: "Average before", value: n(shown.meanBefore, 2) }, { name: "Average after", value: n(shown.meanAfter, 2) }, { name: "Difference", value: n(shown.difference, 2) }],
    },
    {
      title: "3. Neighbouring days are partly the same day",
      text: "How alike days are is fixed beforehand, not fitted: a part that fades from day to day, and a slow drift over two weeks.",
      rows: [
        { name: "Mean likeness within before", value: n(meanCorrelation(kind, before, before)) },
        { name: "Mean likeness within after", value: n(meanCorrelation(kind, after, after)) },
        { name: "Mean likeness across", value: n(meanCorrelation(kind, before, after)) },
        { name: "Worth of the days before, in independent days", value: n(effectiveDays(kind, before), 1) },
        { name: "Worth of the days after", value: n(effectiveDays(kind, after), 1) },
        { name: "Variance factor q, weekends and settling included", value: n(shown.q) },
      ],
    },
    {
      title: "4. Your own day-to-day swing",
      text: `Your own days, pulled a little toward the usual swing of ${isRoots ? 1 : sigma0}.`,
      rows: [{ name: "Day-to-day SD", value: n(shown.sigma, 2) }, { name: "Degrees of freedom", value: n(shown.nu, 1) }],
    },
    {
      title: "5. The error bar",
      text: "Swing times the square root of q; the likely range is the middle 90%, and a call asks that the 95% range lies wholly on one side.",
      rows: [
        { name: "Standard error", value: n(shown.standardError, 2) },
        { name: "t", value: n(shown.t, 2) },
        { name: "90% range", value: `${n(shown.low90, 2)} to ${n(shown.high90, 2)}` },
        { name: "95% range", value: `${n(shown.low95, 2)} to ${n(shown.high95, 2)}` },
        { name: "Likely lasting part of the difference", value: n(shown.shrunk, 2) },
      ],
    },
    ...adjustedStep(c),
    {
      title: "What this was checked on",
      text: "Simulated people only, whose true answers are known. It has never been validated on real changes. Days stickier than assumed make it too bold; a change of habits together with the setting can’t be told from the setting.",
      rows: [],
    },
  ];
}

function adjustedStep({ adjusted }: Comparison): Step[] {
  if (!adjusted) return [];
  return [
    {
      title: "6. At equal insulin",
      text: "Some days simply need more insulin. Days that got about the same are compared, so that the change stands out from the day. This difference is in no unit of its own and only decides the call.",
      rows: [{ name: "Slope on insulin", value: n(adjusted.gamma) }, { name: "t at equal insulin", value: n(adjusted.t, 2) }, { name: "Degrees of freedom", value: n(adjusted.nu, 1) }],
    },
  ];
}
