import type { OutcomeId } from "@/domain/comparison/outcomes";
import type { LoopSettings } from "@/domain/simulator/loop-settings";
import type { OutcomeSeries } from "@/domain/simulator/outcome-series";
import { mmolToMgDl } from "@/domain/units";

type Dated = Readonly<{ day: number }>;

const joined = <D extends Dated>(before: ReadonlyArray<D>, after: ReadonlyArray<D>, changeDay: number): D[] => [
  ...before.filter(({ day }) => day < changeDay),
  ...after.filter(({ day }) => day >= changeDay),
];

/**
 * The days of one run up to the change, those of the other from the change day on:
 * two lives with the same chance that part at the change. The few hours that would
 * carry over fall into the change day, which no comparison uses.
 */
export function splice(before: OutcomeSeries, after: OutcomeSeries, changeDay: number): OutcomeSeries {
  const ids = Object.keys(before.series) as OutcomeId[];
  const series = Object.fromEntries(ids.map((id) => [id, joined(before.series[id], after.series[id], changeDay)]));
  return {
    series: series as OutcomeSeries["series"],
    below54Percent: joined(before.below54Percent, after.below54Percent, changeDay),
    insulin: {
      night: joined(before.insulin.night, after.insulin.night, changeDay),
      day: joined(before.insulin.day, after.insulin.day, changeDay),
    },
  };
}

/** Time-weighted mean of what is programmed: mg/dL per U and g/U. */
export function programmedMeans({ sensitivityMmolPerUnit, carbRatioGramsPerUnit }: LoopSettings) {
  const mean = (values: Float64Array) => values.reduce((a, b) => a + b, 0) / values.length;
  return { sensitivityMgDlPerUnit: mmolToMgDl(mean(sensitivityMmolPerUnit)), carbRatioGramsPerUnit: mean(carbRatioGramsPerUnit) };
}
