import { CHECK_TEXTS, type Check, type CheckCode, type Severity } from "./check-texts";
import { checkProfile } from "./checks";
import { estimateDailyDose, type DailyDose } from "./daily-dose";
import { toNumber, type Fraction } from "./fraction";
import { evaluateGate } from "./gate";
import type { MethodPopulation } from "./method";
import { presetProfile, type PresetOptions } from "./preset-profile";
import type { SettingsProfile } from "./profile";
import { profileFromApi, profileToApi } from "./profile-api";
import { answerWithoutNumbers, type Presets, type StartingProfileAnswer } from "./starting-answer";
import type { StartingProfileRequest } from "./starting-profile-request";
import { inputsAt } from "./starting-rules";
import { basalSection, carbRatioSection, doseSection, durationSection, sensitivitySection } from "./starting-sections";
import { startingTargetSection } from "./starting-target";

/** From this age on the duration for older adults is used. Common practice, no source. */
const OLDER_FROM_YEARS = 65;
const ADULT_FROM_YEARS = 18;

function note(code: CheckCode, severity: Severity): Check {
  return { code, severity, text: CHECK_TEXTS[code] };
}

function presentDose({ injectionsTotalDailyDoseUnits, pump }: StartingProfileRequest) {
  if (pump) return { route: "pump", dailyDoseUnits: pump.totalDailyDoseUnits } as const;
  return { route: "injections", dailyDoseUnits: injectionsTotalDailyDoseUnits ?? 0 } as const;
}

/** Rules for adults are always shown; those for children and pregnancy only to a reviewer of one. */
function populationsOf({ ageYears, gate }: StartingProfileRequest): MethodPopulation[] {
  const populations: MethodPopulation[] = ["adult"];
  if (ageYears < ADULT_FROM_YEARS || gate.under18 === "yes") populations.push("child");
  if (gate.pregnant === "yes" || gate.pregnant === "not-sure") populations.push("pregnancy");
  return populations;
}

function presetOptions(request: StartingProfileRequest): PresetOptions {
  return {
    hypoProne: request.hypoProne,
    isOlderOrRenal: request.ageYears >= OLDER_FROM_YEARS || request.gate.kidneyLiverAdrenal !== "no",
    insulinStepMilliUnits: Math.round(request.insulinStepUnits * 1000),
    glucoseUnit: request.glucoseUnit,
    largestRecentBolusUnits: request.largestRecentBolusUnits ?? null,
    largestRecentBasalUnitsPerHour: request.largestRecentBasalUnitsPerHour ?? null,
  };
}

function checksOf(
  request: StartingProfileRequest,
  profile: Presets<SettingsProfile>,
  dose: DailyDose,
  stepMilliUnits: number,
): Check[] {
  const recentUnits = request.largestRecentBolusUnits ?? null;
  const checksAt = (preset: SettingsProfile, totalDailyDose: Fraction) =>
    checkProfile(preset, {
      totalDailyDoseUnits: toNumber(totalDailyDose),
      weightKg: request.weightKg,
      basalStepMilliUnits: stepMilliUnits,
      bolusStepMilliUnits: stepMilliUnits,
      largestRecentBolusMilliUnits: recentUnits === null ? null : Math.round(recentUnits * 1000),
    });
  const found = [...checksAt(profile.cautious, dose.cautious), ...checksAt(profile.standard, dose.standard)];
  if (dose.route === "pump") found.unshift(note("carried-over", "informs"));
  if (dose.route === "pump" && request.hypoProne) found.unshift(note("lows-before-carry-over", "asks"));
  return found.filter(({ text }, index) => found.findIndex((other) => other.text === text) === index);
}

/**
 * The published starting arithmetic for typed inputs, in the combination of
 * settings.md 3.2: ours, of cited rules, never a guideline. Nothing is stored and
 * nothing here is an instruction; a licensed professional decides.
 *
 * With a closed gate the answer holds the reasons and not one number, unless an
 * educator asks (`forReview`). From a pump the present settings are carried over
 * unchanged in both presets, with the arithmetic at the pump's dose beside them.
 */
export function startingProfile(request: StartingProfileRequest): StartingProfileAnswer {
  const present = presentDose(request);
  const dose = estimateDailyDose(request.weightKg, present);
  const gate = evaluateGate({ answers: request.gate, ageYears: request.ageYears, dose });
  if (!gate.open && !request.forReview) {
    return answerWithoutNumbers(gate, present.route, [note("ketones-and-site", "informs")]);
  }
  const options = presetOptions(request);
  const carriedOver = request.pump ? profileFromApi(request.pump) : null;
  const profile = {
    cautious: carriedOver ?? presetProfile(dose.cautious, options),
    standard: carriedOver ?? presetProfile(dose.standard, options),
  };
  const populations = populationsOf(request);
  const facts = {
    inputs: { cautious: inputsAt(dose.cautious, dose), standard: inputsAt(dose.standard, dose) },
    dose: { cautious: dose.cautious, standard: dose.standard },
    populations,
    hypoProne: request.hypoProne,
    stepMilliUnits: options.insulinStepMilliUnits,
  };
  return {
    gate,
    route: present.route,
    totalDailyDose: doseSection(facts),
    basal: basalSection(facts),
    carbRatio: carbRatioSection(facts),
    sensitivity: sensitivitySection(facts),
    target: startingTargetSection(request.glucoseUnit, populations),
    durationOfAction: durationSection(facts, presetProfile(dose.cautious, options).durationOfActionMinutes),
    checks: checksOf(request, profile, dose, options.insulinStepMilliUnits),
    profile: { cautious: profileToApi(profile.cautious), standard: profileToApi(profile.standard) },
  };
}
