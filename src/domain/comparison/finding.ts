import { glucoseText, thresholdText } from "@/domain/glucose-text";
import { MGDL_PER_MMOL, type GlucoseUnit } from "@/domain/units";
import type { Comparison } from "./compare";
import {
  AT_A_COST, BLOCKED, BUNDLE, findingTitle, LONGER_SPAN, LOOK_FIRST, MEASURE, SETTLING, SHORT_FINDING, SMALLER_THAN_SWINGS,
} from "./finding-words";
import { LEVEL_PERCENT } from "./lows";
import { OUTCOMES } from "./outcomes";

export type Finding = Readonly<{
  title: string;
  short: string;
  /** Days used, measure after and before, difference with its likely range, lows: in this order. */
  sentences: ReadonlyArray<string>;
  /** What else belongs beside it. */
  notes: ReadonlyArray<string>;
  /** "So far it leans better", where there is no verdict yet. */
  leaning: string | null;
}>;

const MINUTES_PER_DAY_POINT = 14.4;
const DAYS_TO_CALL = 5;
const DAYS_TO_LOOK = 3;

const percent = (value: number) => `${value.toFixed(value < 10 ? 1 : 0)}%`;

/** A difference with its direction in words: "13 mg/dL lower (0.7 mmol/L)", "43 minutes a day more". */
function amount(value: number, c: Comparison, unit: GlucoseUnit): string {
  const { unit: outcomeUnit, minutesPerPoint, days } = OUTCOMES[c.outcome];
  const size = Math.abs(value);
  if (outcomeUnit === "mg/dL") {
    const mmol = (size / MGDL_PER_MMOL).toFixed(1);
    const text = unit === "mg/dL" ? `${Math.round(size)} mg/dL (${mmol} mmol/L)` : `${mmol} mmol/L (${Math.round(size)} mg/dL)`;
    return `${text} ${value < 0 ? "lower" : "higher"}`;
  }
  const way = value < 0 ? "less" : "more";
  if (minutesPerPoint === null) return `${size.toFixed(0)} points ${way}`;
  return `${Math.round(size * minutesPerPoint)} minutes a ${days === "nights" ? "night" : "day"} ${way}`;
}

function measured(value: number, c: Comparison, unit: GlucoseUnit): string {
  return OUTCOMES[c.outcome].unit === "mg/dL" ? glucoseText(value, unit) : percent(value);
}

/** The finding of a comparison in plain sentences; no estimate stands without its likely range. */
export function describeFinding(c: Comparison, unit: GlucoseUnit): Finding {
  const leaning = c.leaning ? `So far it leans ${c.leaning}.` : null;
  return { title: findingTitle(c.verdict, c.outcome, c.version), short: SHORT_FINDING[c.verdict], sentences: body(c, unit), notes: notes(c, unit), leaning };
}

function body(c: Comparison, unit: GlucoseUnit): string[] {
  const nights = OUTCOMES[c.outcome].days;
  if (c.verdict === "not-enough-days") {
    return [
      `There are ${c.after.length} clean ${nights} after and ${c.before.length} before so far; ${DAYS_TO_LOOK} on each side are needed to look, ${DAYS_TO_CALL} after to say more.`,
    ];
  }
  if (c.verdict === "more-lows" || c.outcome === "day-lows") return lowsBody(c, unit);
  if (!c.effect) return [];
  const { meanAfter, meanBefore, difference, low90, high90 } = c.effect;
  const isMean = OUTCOMES[c.outcome].unit === "mg/dL";
  const measure = isMean
    ? `${MEASURE[c.outcome]} was ${measured(meanAfter, c, unit)}, ${measured(meanBefore, c, unit)} in the ${c.before.length} before`
    : `${measured(meanAfter, c, unit)} ${MEASURE[c.outcome]}, ${measured(meanBefore, c, unit)} in the ${c.before.length} before`;
  const gap = `about ${amount(difference, c, unit)}, likely between ${amount(low90, c, unit)} and ${amount(high90, c, unit)}`;
  const first = `In the ${c.after.length} clean ${nights} after, ${measure}: ${gap}.`;
  return [first, ...closing(c), lowsSentence(c)];
}

function closing(c: Comparison): string[] {
  if (c.verdict === "could-not-be-told") return [`That gap is smaller than your own ups and downs. ${LONGER_SPAN}`];
  if (c.verdict === "no-difference-that-matters") return [`Whatever it changed is smaller than ${Math.round(5 * (OUTCOMES[c.outcome].minutesPerPoint ?? MINUTES_PER_DAY_POINT))} minutes a ${OUTCOMES[c.outcome].days === "nights" ? "night" : "day"}.`];
  if (c.verdict !== "cannot-tell-yet") return [];
  const more = c.daysNeeded?.ifDifferenceStays ?? null;
  if (c.blockedBy) return [BLOCKED];
  if (more === null) return [SMALLER_THAN_SWINGS];
  if (more === 0) return ["That gap could still come from your own ups and downs."];
  return [`That gap is smaller than your own ups and downs. If it stays like this, about ${more} more clean ${OUTCOMES[c.outcome].days} would show it.`];
}

function lowsBody(c: Comparison, unit: GlucoseUnit): string[] {
  const { percentAfter, percentBefore, percentDifference, effect } = c.lows;
  if (percentAfter === null || percentBefore === null || percentDifference === null || !effect) return [];
  const minutes = Math.round(Math.abs(percentDifference) * MINUTES_PER_DAY_POINT);
  const way = percentDifference < 0 ? "less" : "more";
  const first = `In the ${effect.nAfter} clean days after, ${percent(percentAfter)} of the day was below ${thresholdText(70, unit)}, ${percent(percentBefore)} in the ${effect.nBefore} before: about ${minutes} minutes a day ${way}${lowsRange(c)}.`;
  if (c.verdict === "more-lows") return [first, LOOK_FIRST];
  if (c.verdict === "better") return [first];
  return [first, ...closing(c)];
}

/** The likely range of lows in minutes, back from square roots around the mean before. */
function lowsRange(c: Comparison): string {
  const { effect, percentBefore } = c.lows;
  if (!effect || percentBefore === null) return "";
  const ends = [effect.low90, effect.high90].map((end) => {
    const root = Math.max(0, effect.meanBefore + end);
    return Math.round((root ** 2 - effect.meanBefore ** 2) * MINUTES_PER_DAY_POINT);
  });
  const text = (minutes: number) => `${Math.abs(minutes)} ${minutes < 0 ? "less" : "more"}`;
  return `, likely between ${text(ends[0] ?? 0)} and ${text(ends[1] ?? 0)} on an ordinary day`;
}

function lowsSentence({ lows }: Comparison): string {
  if (lows.percentAfter === null || lows.percentBefore === null) return "Lows can’t be compared yet.";
  const figures = `${percent(lows.percentAfter)} of the day after, ${percent(lows.percentBefore)} before`;
  if (lows.mayHaveRisen) return `Lows may have risen: ${figures}.`;
  return `Lows did not clearly rise: ${figures}.`;
}

function notes(c: Comparison, unit: GlucoseUnit): string[] {
  const all: string[] = [];
  if (c.attribution === "bundle") all.push(BUNDLE);
  if (c.isAtACost) all.push(AT_A_COST);
  if (c.isSettling) all.push(SETTLING);
  if (c.level?.isAbove) {
    all.push(
      `Whatever the cause: ${percent(c.level.below70Percent)} of these days was below ${thresholdText(70, unit)} and ${percent(c.level.below54Percent)} below ${thresholdText(54, unit)}. The usual aims for most adults are under ${LEVEL_PERCENT.below70}% and under ${LEVEL_PERCENT.below54}%.`,
    );
  }
  return all;
}
