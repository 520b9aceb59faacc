import { spreadDailyBasal, EARLY_MORNING_SHAPE, FLAT_SHAPE, type BasalShape } from "./basal-shape";
import type { FormulaInputs } from "./formula";
import { fractionOf, over, toNumber, type Fraction } from "./fraction";
import { evaluateMethod, type Method, type MethodInput, type MethodPopulation, type MethodSetting } from "./method";
import { methodById, methodsFor, valueOfMethod } from "./methods";
import type { Presets, Range, Section, StartingProfileAnswer } from "./starting-answer";
import { MGDL_PER_MMOL_OF_RULES, STARTING_RULES, startingCarbRatio, startingSensitivity } from "./starting-rules";

/** What each preset's arithmetic starts from. */
export type SectionFacts = Readonly<{
  inputs: Presets<FormulaInputs<MethodInput>>;
  dose: Presets<Fraction>;
  populations: ReadonlyArray<MethodPopulation>;
  hypoProne: boolean;
  stepMilliUnits: number;
}>;

const HOURS_PER_DAY = fractionOf(24);

function both<T, U>(presets: Presets<T>, f: (value: T) => U): Presets<U> {
  return { cautious: f(presets.cautious), standard: f(presets.standard) };
}

function described({ id, label, source, provenance }: Method) {
  return { id, label, source, provenance };
}

/** Every rule of a setting that was written for these people and can be worked out for them. */
function evaluated(setting: MethodSetting, { populations, inputs }: SectionFacts) {
  return populations
    .flatMap((population) => methodsFor(setting, population))
    .flatMap((method) => {
      const value = both(inputs, (known) => evaluateMethod(method, known));
      if (value.cautious === null || value.standard === null) return [];
      return [{ method, value: { cautious: value.cautious, standard: value.standard } }];
    });
}

function rangeOf(values: number[]): Range {
  return { low: Math.min(...values), high: Math.max(...values) };
}

/** How far apart the methods lie, at each preset's dose. */
function spreadOf(rows: ReadonlyArray<Presets<number>>): Presets<Range> {
  return { cautious: rangeOf(rows.map((row) => row.cautious)), standard: rangeOf(rows.map((row) => row.standard)) };
}

export function doseSection(facts: SectionFacts): StartingProfileAnswer["totalDailyDose"] {
  const methods = evaluated("totalDailyDose", facts)
    .filter(({ method }) => facts.hypoProne || !STARTING_RULES.pumpWithLows.some((id) => id === method.id))
    .map(({ method, value }) => ({ ...described(method), units: toNumber(value.cautious) }));
  return { methods, ...both(facts.dose, toNumber), spread: rangeOf(methods.map(({ units }) => units)) };
}

export function basalSection(facts: SectionFacts): StartingProfileAnswer["basal"] {
  const hourly = (perDay: Fraction) => over(perDay, HOURS_PER_DAY);
  const blocks = (methodId: string, shape: BasalShape) =>
    both(facts.inputs, (inputs) =>
      spreadDailyBasal(valueOfMethod(methodId, inputs), shape, facts.stepMilliUnits).map((block) => ({
        startMinute: block.startMinute,
        unitsPerHour: block.milliUnitsPerHour / 1000,
      })),
    );
  const flat = (methodId: string) => both(blocks(methodId, FLAT_SHAPE), ([block]) => block?.unitsPerHour ?? 0);
  const methods = evaluated("basal", facts).map(({ method, value }) => ({
    ...described(method),
    unitsPerDay: both(value, toNumber),
    unitsPerHour: both(value, (perDay) => toNumber(hourly(perDay))),
  }));
  return {
    methods,
    ...flat(STARTING_RULES.basal),
    exact: both(facts.inputs, (inputs) => toNumber(hourly(valueOfMethod(STARTING_RULES.basal, inputs)))),
    spread: spreadOf(methods.map(({ unitsPerHour }) => unitsPerHour)),
    otherShare: { ...described(methodById(STARTING_RULES.otherBasal)), ...flat(STARTING_RULES.otherBasal) },
    otherShape: { ...EARLY_MORNING_SHAPE.described, ...blocks(STARTING_RULES.basal, EARLY_MORNING_SHAPE.shape) },
  };
}

export function carbRatioSection(facts: SectionFacts): StartingProfileAnswer["carbRatio"] {
  const methods = evaluated("carbRatio", facts).map(({ method, value }) => ({
    ...described(method),
    gramsPerUnit: both(value, toNumber),
  }));
  const presets = both(facts.dose, startingCarbRatio);
  return {
    methods,
    ...both(presets, ({ rounded }) => toNumber(rounded)),
    exact: both(presets, ({ exact }) => toNumber(exact)),
    spread: spreadOf(methods.map(({ gramsPerUnit }) => gramsPerUnit)),
  };
}

export function sensitivitySection(facts: SectionFacts): StartingProfileAnswer["sensitivity"] {
  const methods = evaluated("sensitivity", facts).map(({ method, value }) => ({
    ...described(method),
    mgDlPerUnit: both(value, toNumber),
    mmolPerUnit: both(value, (mgDl) => toNumber(over(mgDl, fractionOf(MGDL_PER_MMOL_OF_RULES)))),
  }));
  const { hypoProne } = facts;
  const mgDl = both(facts.dose, (dose) => startingSensitivity(dose, { hypoProne, glucoseUnit: "mg/dL" }));
  const mmol = both(facts.dose, (dose) => startingSensitivity(dose, { hypoProne, glucoseUnit: "mmol/L" }));
  return {
    methods,
    ...both(mgDl, ({ rounded }) => toNumber(rounded)),
    exact: both(mgDl, ({ exact }) => toNumber(exact)),
    spread: spreadOf(methods.map(({ mgDlPerUnit }) => mgDlPerUnit)),
    mmol: both(mmol, ({ rounded }) => toNumber(rounded)),
  };
}

export function durationSection(facts: SectionFacts, minutes: number): Section<{ minutes: Presets<number> }> {
  const methods = evaluated("durationOfAction", facts).map(({ method, value }) => ({
    ...described(method),
    minutes: both(value, toNumber),
  }));
  return {
    methods,
    cautious: minutes,
    standard: minutes,
    exact: { cautious: minutes, standard: minutes },
    spread: spreadOf(methods.map((method) => method.minutes)),
  };
}
