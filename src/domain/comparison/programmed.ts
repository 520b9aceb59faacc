import type { SettingsProfile } from "@/domain/settings/profile";
import { spansOf, type Block, type Schedule } from "@/domain/settings/schedule";

function timeWeighted<B extends Block>(schedule: Schedule<B>, value: (block: B) => number): number {
  return spansOf(schedule).reduce((sum, { block, fromMinute, toMinute }) => sum + value(block) * (toMinute - fromMinute), 0) / 1440;
}

/** The time-weighted programmed sensitivity (mg/dL per U) and carb ratio (g/U) of a profile. */
export function programmedMeans(profile: SettingsProfile): { sensitivityMgDlPerUnit: number; carbRatioGramsPerUnit: number } {
  return {
    sensitivityMgDlPerUnit: timeWeighted(profile.sensitivity, (b) => b.microMgDlPerUnit / 1e6),
    carbRatioGramsPerUnit: timeWeighted(profile.carbRatio, (b) => b.milligramsPerUnit / 1000),
  };
}
