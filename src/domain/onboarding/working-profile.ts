import { MGDL_PER_MMOL } from "@/domain/units";
import type { TypedBlock } from "@/domain/settings/blocks-text";
import type { ApiProfile } from "@/domain/settings/profile-api-schema";
import { startingTarget } from "@/domain/settings/starting-target";
import type { DraftJournal } from "./draft";

/** Only fills the shape: the rules' own duration replaces it (`arithmeticOf`). */
const ANY_DURATION_MINUTES = 240;

type Working = Readonly<{ workingBasal?: TypedBlock[] | null; workingCarbRatio?: TypedBlock[] | null; workingSensitivity?: TypedBlock[] | null; largestMealBolusUnits: number | null }>;

/**
 * The working settings of a pump as typed, in the shape of the interface; null
 * while one is missing. The target of the first days stands in until its page is
 * filled in; the duration is replaced by the rules' own.
 */
export function workingProfile({ workingBasal, workingCarbRatio, workingSensitivity, largestMealBolusUnits }: Working, journal: DraftJournal): ApiProfile | null {
  if (!workingBasal || !workingCarbRatio || !workingSensitivity) return null;
  const factor = journal.glucoseUnit === "mg/dL" ? 1 : MGDL_PER_MMOL;
  const { bolusStepMilliUnits: step } = journal.setup;
  return {
    basal: workingBasal.map(({ startMinute, value }) => ({ startMinute, unitsPerHour: Math.round(value * 1000) / 1000 })),
    carbRatio: workingCarbRatio.map(({ startMinute, value }) => ({ startMinute, gramsPerUnit: Math.round(value * 1000) / 1000 })),
    sensitivity: workingSensitivity.map(({ startMinute, value }) => ({ startMinute, mgDlPerUnit: value * factor })),
    target: [{ startMinute: 0, ...startingTarget(journal.glucoseUnit) }],
    durationOfActionMinutes: ANY_DURATION_MINUTES,
    limits: {
      maxBasalUnitsPerHour: null,
      maxBolusUnits: largestMealBolusUnits === null ? null : (Math.floor(Math.round(largestMealBolusUnits * 1000) / step) * step) / 1000,
      maxInsulinOnBoardUnits: null,
    },
    features: [],
  };
}
