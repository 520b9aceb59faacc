import { GATE_DOSE_LIMITS } from "./gate-dose";

/** blocks: cannot go on; asks: a reader is asked to look; informs: only said. */
export type Severity = "blocks" | "asks" | "informs";

export type Check = Readonly<{ code: CheckCode; severity: Severity; text: string }>;

/**
 * The spans the checks of a review use. Basal share: published shares run from
 * 30 to 60 % (settings.md 1.3). Daily dose: settings.md 3.2 rule 3. Sensitivity
 * over ratio: from the strongest sensitivity rule over the weakest ratio rule,
 * 1500 / 500, to the weakest over the UK start, 1960 / 400 (computed here).
 */
export const CHECK_LIMITS = {
  basalSharePercent: { low: 30, high: 60 },
  dailyDoseUnits: GATE_DOSE_LIMITS.dailyDoseUnits,
  dailyDoseUnitsPerKg: GATE_DOSE_LIMITS.dailyDoseUnitsPerKg,
  sensitivityOverRatio: { low: 3, high: 4.9 },
} as const;

export const CHECK_TEXTS = {
  "day-not-covered": "{schedule}: {why}.",
  "basal-off-step": "The rate from {time}, {rate} U/h, is not on the pump's step of {step} U/h.",
  "limit-off-step": "The largest bolus, {limit} U, is not on the pump's step of {step} U.",
  "basal-zero": "A basal rate of zero stands in this profile. Look at it with your educator.",
  "limit-below-basal": "The basal limit of {limit} U/h lies below a rate of {rate} U/h.",
  "limit-open": "No limit for a bolus is written down. One published protocol used the largest dose of the two weeks before.",
  "limit-above-recent": "The bolus limit of {limit} U lies above the largest recent bolus, {recent} U.",
  "basal-share": "Basal is {percent}% of the day's insulin here. Published shares run from 30 to 60%.",
  "dose-outside-span": "The daily dose of {units} U lies outside 20 to 100 U, the span the formulas were made for.",
  "dose-for-weight": "The daily dose is {units} U for each kg. The usual span is 0.3 to 1.0.",
  "ratio-sensitivity":
    "From {time} the sensitivity factor is {times} times the carb ratio. Pairs of published rules lie between 3.0 and 4.9 times.",
  "ketones-and-site":
    "Settings on the weak side carry a risk of their own: high glucose with ketones can come within hours when insulin runs short or a site stops working. Keep ketone strips and your sick-day plan at hand.",
  "carried-over": "The present pump settings are carried over unchanged. The arithmetic stands beside them.",
  "lows-before-carry-over":
    "Settings are carried over where results are acceptable. Lows are frequent here, so the educator looks at them first.",
} as const;

export type CheckCode = keyof typeof CHECK_TEXTS;

/** Put values into the {named} places of a text. */
export function fillText(template: string, values: Readonly<Record<string, string | number>>): string {
  return template.replace(/\{(\w+)\}/g, (place, name: string) => String(values[name] ?? place));
}
