import { dailyBasalMilliUnits } from "@/domain/settings/basal-total";
import { settingValueText } from "@/domain/settings/difference-text";
import type { SettingField } from "@/domain/settings/difference";
import { FAMILY_FACTS, type SettingFamily } from "@/domain/settings/family";
import type { SettingsProfile } from "@/domain/settings/profile";
import { blockAt, MINUTES_PER_DAY, type Schedule } from "@/domain/settings/schedule";
import type { StartingProfileAnswer } from "@/domain/settings/starting-answer";
import type { GlucoseUnit } from "@/domain/units";
import { againstText } from "./against-text";

/** One setting in one part of the day: as it is now, by plain arithmetic, and as the start has it. */
export type SideBySideRow = Readonly<{
  name: string;
  fromMinute: number;
  toMinute: number;
  now: string | null;
  arithmetic: string | null;
  start: string;
  /** The start against the plain arithmetic, such as "14% weaker"; null where there is none. */
  against: string | null;
}>;

type Side<B extends { startMinute: number }> = Readonly<{
  family: SettingFamily;
  field: SettingField & keyof B;
  /** In stored units, unrounded. */
  plain: number | null;
  now: Schedule<B> | null;
  start: Schedule<B>;
}>;

function rowsOf<B extends { startMinute: number }>({ family, field, plain, now, start }: Side<B>, unit: GlucoseUnit): SideBySideRow[] {
  const cuts = [...new Set([...(now ?? []), ...start].map((block) => block.startMinute))].toSorted((a, b) => a - b);
  const text = (value: unknown) => settingValueText({ family, field }, value as number, unit);
  return cuts.map((fromMinute, i) => {
    const value = blockAt(start, fromMinute)[field] as number;
    return {
      name: FAMILY_FACTS[family].label,
      fromMinute,
      toMinute: cuts[i + 1] ?? MINUTES_PER_DAY,
      now: now ? text(blockAt(now, fromMinute)[field]) : null,
      arithmetic: plain === null ? null : text(Number(plain.toPrecision(3))),
      start: text(value),
      against: plain === null ? null : againstText(family, plain, value),
    };
  });
}

/**
 * The review's table: what the person has now, what the plain arithmetic says,
 * and the careful start. The plain arithmetic is the standard preset before
 * rounding; it is shown to three figures and compared unrounded.
 *
 * @param now the working settings of a pump, null from injections
 */
export function sideBySide(
  start: SettingsProfile,
  now: Pick<SettingsProfile, "basal" | "carbRatio" | "sensitivity"> | null,
  arithmetic: StartingProfileAnswer | null,
  unit: GlucoseUnit,
): SideBySideRow[] {
  const scaled = (value: number | null | undefined, factor: number) => (value === null || value === undefined ? null : value * factor);
  return [
    ...rowsOf({ family: "basal", field: "milliUnitsPerHour", plain: scaled(arithmetic?.basal.exact?.standard, 1000), now: now?.basal ?? null, start: start.basal }, unit),
    ...rowsOf({ family: "carbRatio", field: "milligramsPerUnit", plain: scaled(arithmetic?.carbRatio.exact?.standard, 1000), now: now?.carbRatio ?? null, start: start.carbRatio }, unit),
    ...rowsOf({ family: "sensitivity", field: "microMgDlPerUnit", plain: scaled(arithmetic?.sensitivity.exact?.standard, 1e6), now: now?.sensitivity ?? null, start: start.sensitivity }, unit),
  ];
}

/** A day's programmed basal as "12.0 U". */
export function basalDayText(basal: SettingsProfile["basal"]): string {
  return `${(dailyBasalMilliUnits(basal, "nearest") / 1000).toFixed(1)} U`;
}
