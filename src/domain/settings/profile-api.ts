import type { ApiProfile } from "./profile-api-schema";
import { settingsProfileSchema, type SettingsProfile } from "./profile";
import { microMgDlPerUnitFrom, sensitivityIn } from "./sensitivity-unit";

const thousandths = (value: number) => Math.round(value * 1000);
const thousandthsOrNull = (value: number | null) => (value === null ? null : thousandths(value));
const decimal = (value: number) => value / 1000;
const decimalOrNull = (value: number | null) => (value === null ? null : decimal(value));

/** From the interface's numbers to stored integers. */
export function profileFromApi(api: ApiProfile): SettingsProfile {
  const { maxBasalUnitsPerHour, maxBolusUnits, maxInsulinOnBoardUnits } = api.limits;
  return settingsProfileSchema.parse({
    ...api,
    basal: api.basal.map(({ startMinute, unitsPerHour }) => ({
      startMinute,
      milliUnitsPerHour: thousandths(unitsPerHour),
    })),
    carbRatio: api.carbRatio.map(({ startMinute, gramsPerUnit }) => ({
      startMinute,
      milligramsPerUnit: thousandths(gramsPerUnit),
    })),
    sensitivity: api.sensitivity.map(({ startMinute, mgDlPerUnit }) => ({
      startMinute,
      microMgDlPerUnit: microMgDlPerUnitFrom(mgDlPerUnit, "mg/dL"),
    })),
    limits: {
      maxBasalMilliUnitsPerHour: thousandthsOrNull(maxBasalUnitsPerHour),
      maxBolusMilliUnits: thousandthsOrNull(maxBolusUnits),
      maxInsulinOnBoardMilliUnits: thousandthsOrNull(maxInsulinOnBoardUnits),
    },
  });
}

/** From stored integers to the interface's numbers; the inverse of `profileFromApi`. */
export function profileToApi(profile: SettingsProfile): ApiProfile {
  const { maxBasalMilliUnitsPerHour, maxBolusMilliUnits, maxInsulinOnBoardMilliUnits } = profile.limits;
  return {
    basal: profile.basal.map(({ startMinute, milliUnitsPerHour }) => ({
      startMinute,
      unitsPerHour: decimal(milliUnitsPerHour),
    })),
    carbRatio: profile.carbRatio.map(({ startMinute, milligramsPerUnit }) => ({
      startMinute,
      gramsPerUnit: decimal(milligramsPerUnit),
    })),
    sensitivity: profile.sensitivity.map(({ startMinute, microMgDlPerUnit: micro }) => ({
      startMinute,
      mgDlPerUnit: sensitivityIn(micro, "mg/dL"),
    })),
    target: profile.target.map((block) => ({ ...block })),
    durationOfActionMinutes: profile.durationOfActionMinutes,
    limits: {
      maxBasalUnitsPerHour: decimalOrNull(maxBasalMilliUnitsPerHour),
      maxBolusUnits: decimalOrNull(maxBolusMilliUnits),
      maxInsulinOnBoardUnits: decimalOrNull(maxInsulinOnBoardMilliUnits),
    },
    features: profile.features.map((feature) => ({ ...feature })),
  };
}
