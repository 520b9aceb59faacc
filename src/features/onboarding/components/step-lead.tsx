import { GATE_CLOSED_TEXT } from "@/domain/settings/gate-questions";
import type { WizardView } from "../queries/wizard";

const n = (value: number) => String(Number(value.toFixed(2)));

/** Pages that need no number: what they are for, in a sentence. */
const PLAIN: Partial<Record<WizardView["step"], string>> = {
  "about-you": "The arithmetic starts from your weight and the insulin of a usual day.",
  gate: "Plain yes, no or not sure. Not sure counts as yes. Nothing is judged, and all of it can be changed later.",
  targets: "The first week commonly aims higher than later on; 110 mg/dL (6.1 mmol/L) is an ordinary target for later (common practice, no source).",
  limits: "Caps that a device enforces whatever is typed into it, and switches of its own, in its own words.",
  margin: "A start is set weaker than the arithmetic on purpose, so that the first surprises are high rather than low. Here is by how much.",
  fallback: "Written down before day 1, one press away on every page, and on paper in the kit.",
  review: "Nothing comes into effect by asking. Your educator looks at it and signs, sends it back with remarks, or declines.",
};

const NUMBER_PAGES = ["basal", "carb-ratio", "sensitivity", "targets", "margin"];

/** The page's first sentence: the arithmetic in words, with the spread, never one bare number. */
export function StepLead({ view }: Readonly<{ view: WizardView }>) {
  const { arithmetic: a, step } = view;
  if (view.isGateOpen === false && step === "device") return <p>{GATE_CLOSED_TEXT}</p>;
  if (view.isGateOpen === false && NUMBER_PAGES.includes(step)) {
    return <p>Your educator sees the arithmetic here. You can write down numbers you know already, or leave this page as it is.</p>;
  }
  if (a?.route === "pump" && ["basal", "carb-ratio", "sensitivity"].includes(step)) return <CarriedOver view={view} />;
  if (a && step === "basal" && a.basal.spread && a.basal.exact) {
    const { low, high } = a.basal.spread.cautious;
    return <p>Published rules give between {n(low * 24)} and {n(high * 24)} U of basal a day. The cautious start uses 40% of {n(a.totalDailyDose.cautious ?? 0)} U, {n(a.basal.exact.cautious)} U/h around the clock. Rounded to the weaker side: {n(a.basal.cautious ?? 0)}.</p>;
  }
  if (a && step === "carb-ratio" && a.carbRatio.spread && a.carbRatio.exact) {
    const { low, high } = a.carbRatio.spread.cautious;
    return <p>Published rules range from {n(low)} to {n(high)} g per unit. The 500 rule gives {n(a.carbRatio.exact.cautious)} for {n(a.totalDailyDose.cautious ?? 0)} U a day. Rounded to the weaker side: {n(a.carbRatio.cautious ?? 0)}.</p>;
  }
  if (a && step === "sensitivity" && a.sensitivity.spread && a.sensitivity.exact) return <Sensitivity view={view} />;
  const plain = PLAIN[step];
  return plain ? <p>{plain}</p> : null;
}

function Sensitivity({ view }: Readonly<{ view: WizardView }>) {
  const { sensitivity } = view.arithmetic ?? {};
  if (!sensitivity?.spread || !sensitivity.exact) return null;
  const isMgDl = view.journal.glucoseUnit === "mg/dL";
  const unit = isMgDl ? "mg/dL" : "mmol/L";
  const inUnit = (mgDl: number) => (isMgDl ? n(mgDl) : n(mgDl / 18));
  const chosen = isMgDl ? sensitivity.cautious : (sensitivity.mmol?.cautious ?? null);
  const { low, high } = sensitivity.spread.cautious;
  return <p>Published rules range from {inUnit(low)} to {inUnit(high)} {unit} per unit. The cautious rule gives {inUnit(sensitivity.exact.cautious)}. Rounded to the weaker side: {n(chosen ?? 0)}.</p>;
}

/** Working settings of a pump go over as they are; the arithmetic only stands beside them. */
function CarriedOver({ view }: Readonly<{ view: WizardView }>) {
  const { arithmetic: a, step } = view;
  const isMmol = view.journal.glucoseUnit === "mmol/L";
  const section = step === "basal" ? a?.basal : step === "carb-ratio" ? a?.carbRatio : a?.sensitivity;
  const unit = step === "basal" ? "U/h" : step === "carb-ratio" ? "g/U" : `${view.journal.glucoseUnit} per U`;
  const shown = (value: number) => n(step === "sensitivity" && isMmol ? value / 18 : value);
  return (
    <p>
      Your working settings are carried over unchanged.
      {section?.spread ? ` Published rules would range from ${shown(section.spread.standard.low)} to ${shown(section.spread.standard.high)} ${unit} for your daily dose.` : ""}
    </p>
  );
}
