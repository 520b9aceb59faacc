import { exactDailyBasalMilliUnits } from "./basal-total";
import { evaluateFormula, type Formula } from "./formula";
import { fractionOf, over, toNumber } from "./fraction";
import type { BasalBlock } from "./profile";
import type { Provenance } from "./provenance";
import type { Schedule } from "./schedule";

/**
 * Published ways to put a number on the way back to injections (settings.md 4.5).
 * They disagree, so all are shown and the educator marks one. Never an
 * instruction: every row is arithmetic with its source.
 */
type BackUpInput = "programmedBasal" | "totalDailyDose";

type BackUpRule = Readonly<{
  id: string;
  label: string;
  kind: "long-acting-per-day" | "rapid-every-4-hours";
  formula: Formula<BackUpInput>;
  source: string;
  provenance: Provenance;
}>;

const BACK_UP_RULES: ReadonlyArray<BackUpRule> = [
  {
    id: "back-up-1.0",
    label: "long-acting insulin of a day: the programmed basal total",
    kind: "long-acting-per-day",
    formula: [{ constant: 1, times: ["programmedBasal"] }],
    source: "UK pump e-learning; Hamilton Health Sciences 2014; US diabetes charity 2020",
    provenance: "R",
  },
  {
    id: "back-up-1.2",
    label: "long-acting insulin of a day: the programmed basal total x 1.2",
    kind: "long-acting-per-day",
    formula: [{ constant: 1.2, times: ["programmedBasal"] }],
    source: "Finnish Health Village backup page 2023",
    provenance: "R",
  },
  {
    id: "back-up-sixth",
    label: "no long-acting insulin at hand: a sixth of the daily dose as rapid insulin every 4 hours, with 30 g of carbohydrate",
    kind: "rapid-every-4-hours",
    formula: [{ constant: 1, times: ["totalDailyDose"], dividedBy: 6 }],
    source: "Royal Children's Hospital Melbourne",
    provenance: "R",
  },
];

/** A row of the back-up worksheet. `units` is exact in U; rounding belongs to display. */
export type BackUpDose = Readonly<Omit<BackUpRule, "formula"> & { units: number }>;

/**
 * Every published back-up dose for a profile, from the programmed basal and not
 * from what automation delivered (common practice, no source).
 *
 * @param basal the schedule as programmed
 * @param totalDailyDoseUnits U a day, or `null` where it is not known; rows that need it are then left out
 */
export function backUpDoses(basal: Schedule<BasalBlock>, totalDailyDoseUnits: number | null): BackUpDose[] {
  const inputs = {
    programmedBasal: over(exactDailyBasalMilliUnits(basal), fractionOf(1000)),
    ...(totalDailyDoseUnits === null ? {} : { totalDailyDose: fractionOf(totalDailyDoseUnits) }),
  };
  return BACK_UP_RULES.flatMap(({ formula, ...rule }) => {
    const units = evaluateFormula(formula, inputs);
    return units === null ? [] : [{ ...rule, units: toNumber(units) }];
  });
}
