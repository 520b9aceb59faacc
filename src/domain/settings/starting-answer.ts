import type { Check } from "./check-texts";
import type { Gate } from "./gate";
import type { ApiProfile } from "./profile-api-schema";
import type { Provenance } from "./provenance";

/** The same figure for both presets. The cautious one never means more insulin. */
export type Presets<T> = Readonly<{ cautious: T; standard: T }>;
export type Range = Readonly<{ low: number; high: number }>;

type Sourced = Readonly<{ id: string; label: string; source: string; provenance: Provenance }>;

/**
 * One setting: the presets (rounded to the weaker side), the exact figures they
 * came from, how far the published methods lie apart at each preset's dose, and
 * the methods themselves. With the gate closed every list is empty and every
 * figure `null`.
 */
export type Section<M> = Readonly<{
  methods: ReadonlyArray<Sourced & M>;
  cautious: number | null;
  standard: number | null;
  exact: Presets<number> | null;
  spread: Presets<Range> | null;
}>;

type TargetRange = Readonly<{ lowMgDl: number; highMgDl: number }>;
type BasalBlocks = ReadonlyArray<{ startMinute: number; unitsPerHour: number }>;

/**
 * The answer to a starting-profile request, in the shape of the HTTP interface.
 * Daily doses in U, basal in U/h, ratio in g/U, sensitivity in mg/dL for one U
 * (and in mmol/L beside it), duration in minutes.
 */
export type StartingProfileAnswer = Readonly<{
  gate: Gate;
  /** "injections" is cut down and spread out; "pump" is carried over unchanged. */
  route: "injections" | "pump";
  totalDailyDose: Readonly<{
    methods: ReadonlyArray<Sourced & { units: number }>;
    cautious: number | null;
    standard: number | null;
    spread: Range | null;
  }>;
  basal: Section<{ unitsPerDay: Presets<number>; unitsPerHour: Presets<number> }> &
    Readonly<{
      /** The other published share of the daily dose, to stand beside the preset. */
      otherShare: (Sourced & Presets<number>) | null;
      /** A published shape of the day, to stand beside the flat start. */
      otherShape: (Sourced & Presets<BasalBlocks>) | null;
    }>;
  carbRatio: Section<{ gramsPerUnit: Presets<number> }>;
  sensitivity: Section<{ mgDlPerUnit: Presets<number>; mmolPerUnit: Presets<number> }> &
    Readonly<{ mmol: Presets<number> | null }>;
  target: Readonly<{
    methods: ReadonlyArray<Sourced & TargetRange>;
    cautious: TargetRange | null;
    standard: TargetRange | null;
    source: string | null;
    provenance: Provenance | null;
  }>;
  durationOfAction: Section<{ minutes: Presets<number> }>;
  checks: ReadonlyArray<Check>;
  profile: Presets<ApiProfile> | null;
}>;

const NOTHING = { methods: [], cautious: null, standard: null, exact: null, spread: null } as const;

/** The answer while the gate is closed: why, the standing text, and not one number. */
export function answerWithoutNumbers(
  gate: Gate,
  route: StartingProfileAnswer["route"],
  checks: ReadonlyArray<Check>,
): StartingProfileAnswer {
  return {
    gate,
    route,
    totalDailyDose: { methods: [], cautious: null, standard: null, spread: null },
    basal: { ...NOTHING, otherShare: null, otherShape: null },
    carbRatio: NOTHING,
    sensitivity: { ...NOTHING, mmol: null },
    target: { methods: [], cautious: null, standard: null, source: null, provenance: null },
    durationOfAction: NOTHING,
    checks,
    profile: null,
  };
}
