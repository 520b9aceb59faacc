import type { AdjustedEffect } from "./adjusted";
import { callAdjusted } from "./adjusted-call";
import type { Effect } from "./effect";
import type { Lows } from "./lows";
import { OUTCOMES, type OutcomeId } from "./outcomes";
import { studentTQuantile } from "./student-t";

export type Verdict =
  | "not-enough-days" | "more-lows" | "better" | "worse"
  | "no-difference-that-matters" | "cannot-tell-yet" | "could-not-be-told";

const DAYS_TO_CALL = 5;
/** Points of time in range within which a difference does not matter (Battelino 2023, from memory). */
export const POINTS_THAT_MATTER = 5;

export type VerdictFacts = Readonly<{
  outcome: OutcomeId;
  /** Null with fewer than three usable days on a side. */
  effect: Effect | null;
  /** Days at equal insulin, where insulin was logged; decides in place of the plain difference. */
  adjusted: AdjustedEffect | null;
  lows: Lows;
  /** Whole-day time in range fell as clearly as a "worse" asks; only read for fewer lows. */
  hasTimeInRangeFallen: boolean;
  /** The person hoped for fewer highs (a lower mean counts as better only then). */
  isAimFewerHighs: boolean;
  /** The mean before lay above the target's upper end. */
  isBaselineAboveTarget: boolean;
  hasVersionEnded: boolean;
}>;

export type VerdictAnswer = Readonly<{
  verdict: Verdict;
  /** What kept a better from being called. */
  blockedBy: "lows" | null;
  /** Fewer lows, at the price of time in range. */
  isAtACost: boolean;
  /** So far, short of a verdict. */
  leaning: "better" | "worse" | null;
  decidedBy: "plain" | "adjusted";
}>;

/** The rules in their order: days, more lows, better, worse, no difference, can't tell. */
export function decide(facts: VerdictFacts): VerdictAnswer {
  const { effect, lows } = facts;
  const decidedBy = facts.adjusted ? "adjusted" : "plain";
  const answer = (verdict: Verdict, more: Partial<VerdictAnswer> = {}): VerdictAnswer => ({
    verdict, blockedBy: null, isAtACost: false, leaning: null, decidedBy, ...more,
  });
  const open: Verdict = facts.hasVersionEnded ? "could-not-be-told" : "cannot-tell-yet";
  if (lows.hasRisen) return answer("more-lows");
  if (facts.outcome === "day-lows") {
    if (!lows.effect) return answer("not-enough-days");
    if (lows.hasFallen) return answer("better", { isAtACost: facts.hasTimeInRangeFallen });
    return answer(open, { leaning: leaningOf(1 - lows.effect.chanceAbove) });
  }
  if (!effect) return answer("not-enough-days");
  const isMean = OUTCOMES[facts.outcome].unit === "mg/dL";
  const mayBeBetter = facts.isAimFewerHighs && (!isMean || facts.isBaselineAboveTarget);
  const { isBetter, isWorse } = facts.adjusted ? byInsulin(facts.adjusted) : byPlain(facts.outcome, effect);
  if (isBetter && mayBeBetter && !lows.mayHaveRisen) return answer("better");
  if (isWorse) return answer("worse");
  const blockedBy = isBetter && lows.mayHaveRisen ? ("lows" as const) : null;
  if (isWithinWhatMatters(facts.outcome, effect)) return answer("no-difference-that-matters", { blockedBy });
  const chance = chanceBetter(facts.outcome, effect, facts.adjusted);
  return answer(open, { blockedBy, leaning: blockedBy || (!mayBeBetter && chance >= 0.5) ? null : leaningOf(chance) });
}

function byInsulin(adjusted: AdjustedEffect) {
  const call = callAdjusted(adjusted);
  return { isBetter: call === "lower", isWorse: call === "higher" };
}

function byPlain(outcome: OutcomeId, effect: Effect) {
  const { betterWhen, leastDifference } = OUTCOMES[outcome];
  const sign = betterWhen === "higher" ? 1 : -1;
  const mayCall = effect.nAfter >= DAYS_TO_CALL;
  const lowEnd = Math.min(sign * effect.low95, sign * effect.high95);
  return {
    isBetter: mayCall && lowEnd > 0 && sign * effect.difference >= leastDifference,
    isWorse: mayCall && sign * effect.t < -studentTQuantile(0.95, effect.nu) && sign * effect.difference <= -leastDifference,
  };
}

/** Whether a whole-day time in range fell as clearly as "worse" asks. */
export function hasClearlyFallen(effect: Effect | null): boolean {
  return effect !== null && byPlain("day-time-in-range", effect).isWorse;
}

function isWithinWhatMatters(outcome: OutcomeId, effect: Effect): boolean {
  return OUTCOMES[outcome].unit === "points" && effect.low90 > -POINTS_THAT_MATTER && effect.high90 < POINTS_THAT_MATTER;
}

/** Chance that the lasting effect is on the better side, 0 to 1. */
export function chanceBetter(outcome: OutcomeId, effect: Effect, adjusted: AdjustedEffect | null): number {
  if (adjusted) return 1 - adjusted.chanceAbove;
  return OUTCOMES[outcome].betterWhen === "higher" ? effect.chanceAbove : 1 - effect.chanceAbove;
}

function leaningOf(chance: number): "better" | "worse" | null {
  if (chance >= 0.8) return "better";
  return chance <= 0.2 ? "worse" : null;
}
