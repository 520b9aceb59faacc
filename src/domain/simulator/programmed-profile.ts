import type { SettingsProfile } from "@/domain/settings/profile";
import { spansOf, type Block, type Schedule } from "@/domain/settings/schedule";
import { mgDlToMmol } from "@/domain/units";
import type { LoopSettings } from "./loop-settings";
import { SLOT_MINUTES, SLOTS_PER_DAY } from "./slots";

/** A value for every slot of a day; a block that starts inside a slot holds from the next one on. */
function bySlot<B extends Block>(schedule: Schedule<B>, value: (block: B) => number): Float64Array {
  const slots = new Float64Array(SLOTS_PER_DAY);
  for (const { block, fromMinute, toMinute } of spansOf(schedule)) {
    slots.fill(value(block), Math.ceil(fromMinute / SLOT_MINUTES), Math.ceil(toMinute / SLOT_MINUTES));
  }
  return slots;
}

/**
 * A stored profile as the simulated loop reads it: U/h, g/U and mmol/L per U by the
 * slot. The loop has one aim for the whole day, the middle of the first target block.
 */
export function programmedProfile(profile: SettingsProfile): LoopSettings {
  const [target] = profile.target;
  const aimMgDl = target ? (target.lowMgDl + target.highMgDl) / 2 : 0;
  return {
    basalUnitsPerHour: bySlot(profile.basal, ({ milliUnitsPerHour }) => milliUnitsPerHour / 1000),
    carbRatioGramsPerUnit: bySlot(profile.carbRatio, ({ milligramsPerUnit }) => milligramsPerUnit / 1000),
    sensitivityMmolPerUnit: bySlot(profile.sensitivity, ({ microMgDlPerUnit }) => mgDlToMmol(microMgDlPerUnit / 1_000_000)),
    aimMmol: mgDlToMmol(aimMgDl),
  };
}
