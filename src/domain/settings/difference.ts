import { directionOf, SETTING_FAMILIES, type Direction, type SettingFamily } from "./family";
import type { SettingsProfile } from "./profile";
import type { Feature } from "./profile-features";
import { blockAt, MINUTES_PER_DAY, type Schedule } from "./schedule";

/** The number that changed, by its stored name, which ends in its unit. */
export type SettingField =
  | "milliUnitsPerHour"
  | "milligramsPerUnit"
  | "microMgDlPerUnit"
  | "lowMgDl"
  | "highMgDl"
  | "durationOfActionMinutes"
  | keyof SettingsProfile["limits"]
  | "feature";

export type SettingValue = Feature["value"] | null;

/** One setting, one part of the day, old and new. The whole day is 0 to 1440. */
export type SettingChange = Readonly<{
  family: SettingFamily;
  field: SettingField;
  /** The person's own label of a feature, otherwise `null`. */
  label: string | null;
  fromMinute: number;
  toMinute: number;
  oldValue: SettingValue;
  newValue: SettingValue;
  /** Size of the step against the old value, always positive; `null` where there is no number to compare with. */
  stepPercent: number | null;
  direction: Direction;
}>;

/** What differs between two profiles; `families` are those touched, in their fixed order. */
export type ProfileDifference = Readonly<{
  changes: ReadonlyArray<SettingChange>;
  families: ReadonlyArray<SettingFamily>;
}>;

type Place = Pick<SettingChange, "family" | "field" | "label" | "fromMinute" | "toMinute">;

function changeOf(place: Place, oldValue: SettingValue, newValue: SettingValue): SettingChange[] {
  if (oldValue === newValue) return [];
  const isNumeric = typeof oldValue === "number" && typeof newValue === "number";
  const stepPercent = isNumeric && oldValue !== 0 ? (Math.abs(newValue - oldValue) * 100) / Math.abs(oldValue) : null;
  const asNumber = (value: SettingValue) => (typeof value === "number" ? value : null);
  const direction = directionOf(place.family, asNumber(oldValue), asNumber(newValue));
  return [{ ...place, oldValue, newValue, stepPercent, direction }];
}

/** Neighbouring parts of the day with the same old and new value are one change. */
function joined(changes: SettingChange[]): SettingChange[] {
  return changes.reduce<SettingChange[]>((list, change) => {
    const last = list.at(-1);
    const continues =
      last?.toMinute === change.fromMinute && last.oldValue === change.oldValue && last.newValue === change.newValue;
    return last && continues ? [...list.slice(0, -1), { ...last, toMinute: change.toMinute }] : [...list, change];
  }, []);
}

function scheduleChanges<Field extends SettingField, B extends { startMinute: number } & Record<Field, number>>(
  family: SettingFamily,
  field: Field,
  before: Schedule<B>,
  after: Schedule<B>,
): SettingChange[] {
  const cuts = [...new Set([...before, ...after].map((block) => block.startMinute))].toSorted((a, b) => a - b);
  const changes = cuts.flatMap((fromMinute, index) => {
    const place = { family, field, label: null, fromMinute, toMinute: cuts[index + 1] ?? MINUTES_PER_DAY };
    return changeOf(place, blockAt(before, fromMinute)[field], blockAt(after, fromMinute)[field]);
  });
  return joined(changes);
}

const WHOLE_DAY = { fromMinute: 0, toMinute: MINUTES_PER_DAY } as const;

function featureChanges(before: ReadonlyArray<Feature>, after: ReadonlyArray<Feature>): SettingChange[] {
  const labels = new Set([...before, ...after].map((feature) => feature.label));
  const valueIn = (features: ReadonlyArray<Feature>, label: string) =>
    features.find((feature) => feature.label === label)?.value ?? null;
  return [...labels].flatMap((label) =>
    changeOf({ family: "features", field: "feature", label, ...WHOLE_DAY }, valueIn(before, label), valueIn(after, label)),
  );
}

/**
 * What changed from one profile to another: by family, by part of the day, old
 * and new, size of the step, and whether it means more or less insulin. Cutting
 * a block in two without changing a value is no difference.
 *
 * @throws {AppError} INVALID_INPUT when a schedule of either profile leaves a gap
 */
export function profileDifference(before: SettingsProfile, after: SettingsProfile): ProfileDifference {
  const limit = (field: keyof SettingsProfile["limits"]) =>
    changeOf({ family: "limits", field, label: null, ...WHOLE_DAY }, before.limits[field], after.limits[field]);
  const changes = [
    ...scheduleChanges("basal", "milliUnitsPerHour", before.basal, after.basal),
    ...scheduleChanges("carbRatio", "milligramsPerUnit", before.carbRatio, after.carbRatio),
    ...scheduleChanges("sensitivity", "microMgDlPerUnit", before.sensitivity, after.sensitivity),
    ...scheduleChanges("target", "lowMgDl", before.target, after.target),
    ...scheduleChanges("target", "highMgDl", before.target, after.target),
    ...changeOf(
      { family: "durationOfAction", field: "durationOfActionMinutes", label: null, ...WHOLE_DAY },
      before.durationOfActionMinutes,
      after.durationOfActionMinutes,
    ),
    ...limit("maxBasalMilliUnitsPerHour"),
    ...limit("maxBolusMilliUnits"),
    ...limit("maxInsulinOnBoardMilliUnits"),
    ...featureChanges(before.features, after.features),
  ];
  const families = SETTING_FAMILIES.filter((family) => changes.some((change) => change.family === family));
  return { changes, families };
}
