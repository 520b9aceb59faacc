import { exactDailyBasalMilliUnits } from "./basal-total";
import { CHECK_LIMITS, CHECK_TEXTS, fillText, type Check, type CheckCode, type Severity } from "./check-texts";
import { clockText } from "./clock-text";
import { toNumber } from "./fraction";
import type { SettingsProfile } from "./profile";
import { blockAt, scheduleFault } from "./schedule";

/** What is known beside the profile. Doses in U a day, steps and recent doses in milli-units. */
export type CheckFacts = Readonly<{
  totalDailyDoseUnits: number | null;
  weightKg: number | null;
  basalStepMilliUnits: number;
  bolusStepMilliUnits: number;
  largestRecentBolusMilliUnits: number | null;
}>;

const SCHEDULES = ["basal", "carbRatio", "sensitivity", "target"] as const;

function check(code: CheckCode, severity: Severity, values: Record<string, string | number> = {}): Check {
  return { code, severity, text: fillText(CHECK_TEXTS[code], values) };
}

const oneDecimal = (value: number) => value.toFixed(1);
const units = (milliUnits: number) => String(milliUnits / 1000);

function doseChecks(profile: SettingsProfile, { totalDailyDoseUnits, weightKg }: CheckFacts): Check[] {
  if (totalDailyDoseUnits === null) return [];
  const { basalSharePercent, dailyDoseUnits, dailyDoseUnitsPerKg } = CHECK_LIMITS;
  const found: Check[] = [];
  // Milli-units over units x 10 is a percentage.
  const sharePercent = toNumber(exactDailyBasalMilliUnits(profile.basal)) / (totalDailyDoseUnits * 10);
  if (sharePercent < basalSharePercent.low || sharePercent > basalSharePercent.high) {
    found.push(check("basal-share", "asks", { percent: oneDecimal(sharePercent) }));
  }
  if (totalDailyDoseUnits < dailyDoseUnits.low || totalDailyDoseUnits > dailyDoseUnits.high) {
    found.push(check("dose-outside-span", "asks", { units: totalDailyDoseUnits }));
  }
  if (weightKg === null) return found;
  const perKg = totalDailyDoseUnits / weightKg;
  if (perKg < dailyDoseUnitsPerKg.low || perKg > dailyDoseUnitsPerKg.high) {
    found.push(check("dose-for-weight", "asks", { units: perKg.toFixed(2) }));
  }
  return found;
}

/** Compares sensitivity with ratio wherever one of them starts a new block; says the first place only. */
function pairChecks({ carbRatio, sensitivity }: SettingsProfile): Check[] {
  const { low, high } = CHECK_LIMITS.sensitivityOverRatio;
  const starts = [...carbRatio, ...sensitivity].map((block) => block.startMinute).toSorted((a, b) => a - b);
  for (const minute of starts) {
    const mgDlPerUnit = blockAt(sensitivity, minute).microMgDlPerUnit / 1_000_000;
    const quotient = mgDlPerUnit / (blockAt(carbRatio, minute).milligramsPerUnit / 1000);
    if (quotient < low || quotient > high) {
      return [check("ratio-sensitivity", "asks", { time: clockText(minute), times: oneDecimal(quotient) })];
    }
  }
  return [];
}

function limitChecks({ basal, limits }: SettingsProfile, facts: CheckFacts): Check[] {
  const found: Check[] = [];
  const { maxBasalMilliUnitsPerHour: maxBasal, maxBolusMilliUnits: maxBolus } = limits;
  const largestRate = Math.max(...basal.map((block) => block.milliUnitsPerHour));
  if (maxBasal !== null && maxBasal < largestRate) {
    found.push(check("limit-below-basal", "blocks", { limit: units(maxBasal), rate: units(largestRate) }));
  }
  if (maxBolus === null) {
    found.push(check("limit-open", "asks"));
  } else if (facts.largestRecentBolusMilliUnits !== null && maxBolus > facts.largestRecentBolusMilliUnits) {
    const recent = units(facts.largestRecentBolusMilliUnits);
    found.push(check("limit-above-recent", "asks", { limit: units(maxBolus), recent }));
  }
  return found;
}

function stepChecks({ basal, limits }: SettingsProfile, facts: CheckFacts): Check[] {
  const found: Check[] = [];
  for (const { startMinute, milliUnitsPerHour } of basal) {
    if (milliUnitsPerHour % facts.basalStepMilliUnits === 0) continue;
    const values = { time: clockText(startMinute), rate: units(milliUnitsPerHour) };
    found.push(check("basal-off-step", "blocks", { ...values, step: units(facts.basalStepMilliUnits) }));
  }
  const { maxBolusMilliUnits } = limits;
  if (maxBolusMilliUnits !== null && maxBolusMilliUnits % facts.bolusStepMilliUnits !== 0) {
    const values = { limit: units(maxBolusMilliUnits), step: units(facts.bolusStepMilliUnits) };
    found.push(check("limit-off-step", "blocks", values));
  }
  if (basal.some((block) => block.milliUnitsPerHour === 0)) found.push(check("basal-zero", "asks"));
  return found;
}

/**
 * The checks of a review: what blocks, what a reader is asked to look at, what
 * is only said. The text on ketones and sites always comes with them, because
 * settings that are too weak carry a risk of their own (settings.md 3.2).
 */
export function checkProfile(profile: SettingsProfile, facts: CheckFacts): Check[] {
  const gaps = SCHEDULES.flatMap((name) => {
    const fault = scheduleFault(profile[name]);
    return fault ? [check("day-not-covered", "blocks", { schedule: name, why: fault.text })] : [];
  });
  const always = check("ketones-and-site", "informs");
  if (gaps.length > 0) return [...gaps, always];
  return [
    ...stepChecks(profile, facts),
    ...limitChecks(profile, facts),
    ...doseChecks(profile, facts),
    ...pairChecks(profile),
    always,
  ];
}
