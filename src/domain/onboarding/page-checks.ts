import type { Check, CheckCode } from "@/domain/settings/check-texts";
import { checkProfile, type CheckFacts } from "@/domain/settings/checks";
import { profileDifference } from "@/domain/settings/difference";
import type { SettingFamily } from "@/domain/settings/family";
import type { SettingsProfile } from "@/domain/settings/profile";
import type { WizardStep } from "./wizard-step";

/** The checks that speak of what a page sets. */
const OF_PAGE: Partial<Record<WizardStep, Readonly<{ family: SettingFamily; name: string; codes: ReadonlyArray<CheckCode> }>>> = {
  basal: { family: "basal", name: "Basal", codes: ["basal-off-step", "basal-zero", "basal-share", "limit-below-basal"] },
  "carb-ratio": { family: "carbRatio", name: "The ratio", codes: ["ratio-sensitivity"] },
  sensitivity: { family: "sensitivity", name: "The factor", codes: ["ratio-sensitivity"] },
  targets: { family: "target", name: "The target", codes: [] },
  limits: { family: "limits", name: "The limits", codes: ["limit-below-basal", "limit-off-step", "limit-open", "limit-above-recent"] },
};

/**
 * What the margin of a page says in plain sentences: that the day is covered,
 * what the checks found, and where the profile is stronger than another one.
 *
 * @param cautious the cautious start to compare with; null where there is none to show
 */
export function pageChecks(step: WizardStep, profile: SettingsProfile, facts: CheckFacts, cautious: SettingsProfile | null): string[] {
  const page = OF_PAGE[step];
  if (!page) return [];
  const found = checkProfile(profile, facts).filter((check: Check) => page.codes.includes(check.code)).map(({ text }) => text);
  const stepUnits = facts.basalStepMilliUnits / 1000;
  const covered = step === "limits" ? [] : ["Covers 24 hours without a gap."];
  const onStep = step === "basal" && !found.some((text) => text.includes("step of")) ? [`Every rate is on the device's step of ${stepUnits} U/h.`] : [];
  return [...covered, ...onStep, ...found, ...comparedWith(page, profile, cautious)];
}

function comparedWith({ family, name }: Readonly<{ family: SettingFamily; name: string }>, profile: SettingsProfile, cautious: SettingsProfile | null): string[] {
  if (!cautious) return [];
  const changes = profileDifference(cautious, profile).changes.filter((change) => change.family === family);
  const isStronger = changes.some(({ direction }) => direction === "stronger");
  const isWeaker = changes.some(({ direction }) => direction === "weaker");
  if (isStronger) return [`${name} is stronger than the cautious start${isWeaker ? " in one part of the day and weaker in another" : ""}. Your educator sees that, and why is yours to say.`];
  return isWeaker ? [`${name} is weaker than the cautious start.`] : [`${name} is the cautious start.`];
}
