import { MGDL_PER_MMOL } from "@/domain/units";
import type { ApiProfile } from "@/domain/settings/profile-api-schema";
import { profileFromApi } from "@/domain/settings/profile-api";
import { normaliseSchedule } from "@/domain/settings/schedule";
import type { SettingsProfile } from "@/domain/settings/profile";
import type { DraftAnswers, DraftJournal } from "./draft";
import { stepSchemas } from "./step-schemas";

type Row = { from: number; value: number };

/**
 * The profile as it stands in the draft: what the person typed on each page,
 * and the cautious preset where a page was left as it was. A limit that the
 * person emptied stays empty.
 *
 * @param preset null where no number may be shown and none was typed
 * @returns null while a setting has neither
 */
export function draftedProfile(answers: DraftAnswers, preset: ApiProfile | null, journal: DraftJournal): SettingsProfile | null {
  const factor = journal.glucoseUnit === "mg/dL" ? 1 : MGDL_PER_MMOL;
  const schemas = stepSchemas(journal.glucoseUnit);
  const rows = (step: "basal" | "carb-ratio" | "sensitivity"): Row[] => {
    const read = schemas[step].safeParse(answers[step] ?? {});
    return read.success ? read.data.blocks : [];
  };
  const targets = schemas.targets.safeParse(answers.targets ?? {});
  const limits = schemas.limits.safeParse(answers.limits ?? {});
  const device = schemas.device.safeParse(answers.device ?? {});
  const pick = <T>(typed: T[], given: T[] | undefined): T[] => (typed.length > 0 ? typed : (given ?? []));
  const limit = (name: "maxBasalUnitsPerHour" | "maxBolusUnits" | "maxInsulinOnBoardUnits") => {
    const isTyped = limits.success && answers.limits !== undefined && name in answers.limits;
    return isTyped ? limits.data[name] : (preset?.limits[name] ?? null);
  };
  const api = {
    basal: pick(rows("basal").map((r) => ({ startMinute: r.from, unitsPerHour: r.value })), preset?.basal),
    carbRatio: pick(rows("carb-ratio").map((r) => ({ startMinute: r.from, gramsPerUnit: r.value })), preset?.carbRatio),
    sensitivity: pick(rows("sensitivity").map((r) => ({ startMinute: r.from, mgDlPerUnit: r.value * factor })), preset?.sensitivity),
    target: pick(
      (targets.success ? targets.data.blocks : []).map((r) => ({ startMinute: r.from, lowMgDl: Math.round(r.low * factor), highMgDl: Math.round(r.high * factor) })),
      preset?.target,
    ),
    durationOfActionMinutes: device.success && device.data.durationOfActionHours !== null ? Math.round(device.data.durationOfActionHours * 60) : (preset?.durationOfActionMinutes ?? 240),
    limits: {
      maxBasalUnitsPerHour: limit("maxBasalUnitsPerHour"),
      maxBolusUnits: limit("maxBolusUnits"),
      maxInsulinOnBoardUnits: limit("maxInsulinOnBoardUnits"),
    },
    features: limits.success ? limits.data.features : [],
  };
  if ([api.basal, api.carbRatio, api.sensitivity, api.target].some((list) => list.length === 0)) return null;
  const profile = profileFromApi(api);
  return {
    ...profile,
    basal: normaliseSchedule(profile.basal), carbRatio: normaliseSchedule(profile.carbRatio),
    sensitivity: normaliseSchedule(profile.sensitivity), target: normaliseSchedule(profile.target),
  };
}
