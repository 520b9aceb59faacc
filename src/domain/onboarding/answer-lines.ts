import { GATE_QUESTIONS, type GateQuestion } from "@/domain/settings/gate-questions";
import type { GlucoseUnit } from "@/domain/units";
import type { TypedPage } from "./draft";
import type { WizardStep } from "./wizard-step";

/** An answer as the person typed it, under its question's name. */
export type AnswerLine = Readonly<{ label: string; value: string }>;

const LABELS: Readonly<Record<string, string>> = {
  weightKg: "Weight, kg", ageYears: "Age", totalDailyDoseUnits: "All insulin of a usual day, U", dailyTotals: "Totals of single days, U", hypoProne: "Lows often",
  largestMealBolusUnits: "Largest meal dose of late, U", workingBasal: "Basal now, U/h", workingCarbRatio: "Carb ratios now, g/U", workingSensitivity: "Sensitivity factors now",
  insulin: "Insulin", basalStepUnits: "Smallest basal step, U/h", bolusStepUnits: "Smallest bolus step, U", durationOfActionHours: "Duration of insulin action, hours",
  maxBasalUnitsPerHour: "Largest basal rate, U/h", maxBolusUnits: "Largest bolus, U", maxInsulinOnBoardUnits: "Largest insulin on board, U",
  previousSetup: "To go back to", longActingUnits: "Back-up long-acting a day, U", rapidUnits: "Back-up rapid every 4 hours, U", emergencyNumber: "Emergency number",
};

const WORDS: Readonly<Record<string, string>> = { yes: "Yes", no: "No", "not-sure": "Not sure" };

const textOf = (value: unknown) => (typeof value === "string" || typeof value === "number" ? String(value).trim() : "");

const unitOf: Partial<Record<WizardStep, (unit: GlucoseUnit) => string>> = {
  basal: () => "U/h",
  "carb-ratio": () => "g/U",
  sensitivity: (unit) => `${unit} per U`,
  targets: (unit) => unit,
};

function rowLines(step: WizardStep, name: string, rows: ReadonlyArray<Record<string, unknown>>, unit: GlucoseUnit): AnswerLine[] {
  return rows.flatMap((row): AnswerLine[] => {
    const t = (key: string) => textOf(row[key]);
    if (name === "contacts") return t("name") === "" && t("phone") === "" ? [] : [{ label: "To call", value: `${t("name")} ${t("phone")}`.trim() }];
    if (name === "features") return t("label") === "" ? [] : [{ label: t("label"), value: t("value") || "–" }];
    const value = step === "targets" ? [t("low"), t("high")].filter(Boolean).join(" to ") : t("value");
    return t("from") === "" && value === "" ? [] : [{ label: t("from") || "–", value: value === "" ? "–" : `${value} ${unitOf[step]?.(unit) ?? ""}`.trim() }];
  });
}

/** The answers of a page as lines to read, empty ones left out; text that can't be read yet is shown as it was typed. */
export function answerLines(step: WizardStep, typed: TypedPage, unit: GlucoseUnit): AnswerLine[] {
  return Object.entries(typed).flatMap(([name, value]): AnswerLine[] => {
    if (Array.isArray(value)) return rowLines(step, name, value.filter((row) => row !== null && typeof row === "object") as Record<string, unknown>[], unit);
    const text = textOf(value);
    if (text === "") return [];
    const label = step === "gate" && name in GATE_QUESTIONS ? GATE_QUESTIONS[name as GateQuestion].question : (LABELS[name] ?? name);
    return [{ label, value: WORDS[text] ?? text }];
  });
}
