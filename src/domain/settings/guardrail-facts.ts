import type { ChangeReason } from "./change-reason";
import type { Severity } from "./check-texts";
import type { ProfileDifference } from "./difference";
import type { SettingFamily } from "./family";
import type { GuardrailCode, GuardrailLimits } from "./guardrail-table";
import type { SettingsProfile } from "./profile";

/** Everything a guardrail may look at. `null` means not known, and then it stays silent. */
export type GuardrailFacts = Readonly<{
  difference: ProfileDifference;
  proposed: SettingsProfile;
  reason: ChangeReason;
  /** A first version has nothing to be compared with; only gate, steps and basal share are looked at. */
  isStarting: boolean;
  /** Written or asked for by an educator. */
  isByEducator: boolean;
  /** For each family, the version that last changed it and for how long it has been in effect. */
  lastChanged: Readonly<Partial<Record<SettingFamily, { versionNumber: number; hours: number }>>>;
  evidenceDays: number;
  /** How many of them carry a flag that leaves a day out. */
  flaggedEvidenceDays: number;
  /** Share of readings below 70 mg/dL, 0 to 1. */
  lowFractionOfLast3Days: number | null;
  highestKetonesMmolOfLast24Hours: number | null;
  /** Insulin of a usual day, U. */
  totalDailyDoseUnits: number | null;
  basalStepMilliUnits: number;
  bolusStepMilliUnits: number;
  isGateOpen: boolean;
  isApproved: boolean;
  /** What this person's educator has set instead of the usual numbers. */
  overrides: Readonly<Partial<GuardrailLimits>>;
}>;

/** A guardrail that has something to say, before its words are filled in. */
export type Spoken = Readonly<{
  code: GuardrailCode;
  severity: Severity;
  values?: Readonly<Record<string, string | number>>;
  tellsEducator?: boolean;
}>;
