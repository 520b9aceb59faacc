import { MGDL_PER_MMOL, type GlucoseUnit } from "@/domain/units";
import { fractionOf, times, toNumber } from "./fraction";
import type { MethodPopulation } from "./method";
import type { Provenance } from "./provenance";
import { roundToStep, weakerRounding } from "./rounding";
import type { StartingProfileAnswer } from "./starting-answer";

/**
 * Target of the first days: the upper end of the usual clinic range. No source
 * that could be read gives a figure for it (settings.md 1.10 and 3.2 rule 7).
 */
export const STARTING_TARGET = {
  lowMgDl: 120,
  highMgDl: 130,
  label: "upper end of the usual range, for the first days",
  source: "a higher target in the first days",
  provenance: "CP",
} as const;

/** Published targets to show beside it: settings.md 1.10. */
export const PUBLISHED_TARGETS: ReadonlyArray<{
  id: string;
  label: string;
  lowMgDl: number;
  highMgDl: number;
  population: MethodPopulation;
  source: string;
  provenance: Provenance;
}> = [
  {
    id: "target-100-150",
    label: "goal of a correction, adults; upper end where lows are frequent",
    lowMgDl: 100,
    highMgDl: 150,
    population: "adult",
    source: "Joslin blog 2013",
    provenance: "R",
  },
  {
    id: "target-4-7-mmol",
    label: "4.0 to 7.0 mmol/L, children",
    lowMgDl: 72,
    highMgDl: 126,
    population: "child",
    source: "Royal Children's Hospital Melbourne",
    provenance: "R",
  },
  {
    id: "target-4.5-5.5-mmol",
    label: "4.5 to 5.5 mmol/L in a calculator, children over 5 years",
    lowMgDl: 81,
    highMgDl: 99,
    population: "child",
    source: "Perth children's hospital parent guide",
    provenance: "R",
  },
];

/**
 * The starting target as a device in the person's unit can hold it, never below
 * the figure itself: for mmol/L up to the next tenth, then to a whole mg/dL.
 */
export function startingTarget(unit: GlucoseUnit): { lowMgDl: number; highMgDl: number } {
  const { lowMgDl, highMgDl } = STARTING_TARGET;
  if (unit === "mg/dL") return { lowMgDl, highMgDl };
  const tenthOfMmol = times(fractionOf(MGDL_PER_MMOL), fractionOf(0.1));
  const up = (glucoseMgDl: number) => {
    const onTenth = roundToStep(fractionOf(glucoseMgDl), weakerRounding("target", tenthOfMmol));
    return toNumber(roundToStep(onTenth, weakerRounding("target", fractionOf(1))));
  };
  return { lowMgDl: up(lowMgDl), highMgDl: up(highMgDl) };
}

/** The target of both presets with the published ones for these people beside it. */
export function startingTargetSection(
  unit: GlucoseUnit,
  populations: ReadonlyArray<MethodPopulation>,
): StartingProfileAnswer["target"] {
  const target = startingTarget(unit);
  return {
    methods: PUBLISHED_TARGETS.filter(({ population }) => populations.includes(population)).map(
      ({ population: _population, ...published }) => published,
    ),
    cautious: target,
    standard: target,
    source: STARTING_TARGET.source,
    provenance: STARTING_TARGET.provenance,
  };
}
