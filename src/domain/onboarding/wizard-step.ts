/** The wizard's pages, in order; one subject a page. */
export const WIZARD_STEPS = [
  "about-you", "gate", "device", "basal", "carb-ratio", "sensitivity", "targets", "limits", "margin", "fallback", "review",
] as const;

export type WizardStep = (typeof WIZARD_STEPS)[number];

export const STEP_TITLES: Readonly<Record<WizardStep, string>> = {
  "about-you": "About you, in a few numbers.",
  gate: "Twelve questions before any number.",
  device: "Your insulin and what the device allows.",
  basal: "Basal, around the clock.",
  "carb-ratio": "Carb ratio, meal by meal.",
  sensitivity: "Sensitivity: what one unit does.",
  targets: "Targets for the first week.",
  limits: "Limits and switches.",
  margin: "How much weaker than the arithmetic.",
  fallback: "The way back, before day 1.",
  review: "Look it all over, then ask.",
};

export const STEP_NAMES: Readonly<Record<WizardStep, string>> = {
  "about-you": "About you", gate: "Questions", device: "Insulin and device", basal: "Basal", "carb-ratio": "Carb ratio", sensitivity: "Sensitivity",
  targets: "Targets", limits: "Limits", margin: "Margin", fallback: "Way back", review: "Review",
};

/** The step that follows; the last follows itself. */
export function nextStep(step: WizardStep): WizardStep {
  return WIZARD_STEPS[WIZARD_STEPS.indexOf(step) + 1] ?? step;
}
