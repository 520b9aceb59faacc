import { readDecimal } from "@/domain/form-text";
import { mgDlToMmol, type GlucoseUnit } from "@/domain/units";
import { clockText } from "@/domain/settings/clock-text";
import type { ApiProfile } from "@/domain/settings/profile-api-schema";
import type { TypedPage } from "./draft";
import type { WizardStep } from "./wizard-step";

/** Text by field name with dots, as a form keeps it. */
export type FlatPage = Readonly<Record<string, string>>;

/** Typed answers as field names with dots: {blocks: [{from: "00:00"}]} becomes {"blocks.0.from": "00:00"}. */
export function flattened(value: unknown, path = ""): FlatPage {
  if (value === null || value === undefined) return {};
  if (typeof value !== "object") return { [path]: typeof value === "string" ? value : JSON.stringify(value) };
  return Object.assign({}, ...Object.entries(value).map(([key, inner]) => flattened(inner, path ? `${path}.${key}` : key))) as FlatPage;
}

/** What the start of a page is worked out from. */
export type StartFacts = Readonly<{
  preset: ApiProfile | null;
  unit: GlucoseUnit;
  insulin: string;
  basalStepUnits: number;
  bolusStepUnits: number;
}>;

/** Two decimals, three where the value needs them: a carried-over value is never shown rounded. */
export function rateText(unitsPerHour: number): string {
  return unitsPerHour.toFixed(Math.round(unitsPerHour * 1000) % 10 === 0 ? 2 : 3);
}

const trimmed = (value: number, places: number) => String(Number(value.toFixed(places)));

const blockRows = (blocks: ReadonlyArray<Record<string, string>>): FlatPage => flattened({ blocks });

/** What a page opens with before anything was typed: the setup told earlier and the cautious preset. */
export function presetOfStep(step: WizardStep, { preset, unit, insulin, basalStepUnits, bolusStepUnits }: StartFacts): FlatPage {
  const glucose = (mgDl: number) => (unit === "mg/dL" ? trimmed(mgDl, 2) : mgDlToMmol(mgDl).toFixed(1));
  const factor = (mgDl: number) => (unit === "mg/dL" ? trimmed(mgDl, 2) : trimmed(mgDlToMmol(mgDl), 2));
  switch (step) {
    case "device":
      return { insulin, basalStepUnits: String(basalStepUnits), bolusStepUnits: String(bolusStepUnits) };
    case "basal":
      return blockRows((preset?.basal ?? []).map((b) => ({ from: clockText(b.startMinute), value: rateText(b.unitsPerHour) })));
    case "carb-ratio":
      return blockRows((preset?.carbRatio ?? []).map((b) => ({ from: clockText(b.startMinute), value: trimmed(b.gramsPerUnit, 3) })));
    case "sensitivity":
      return blockRows((preset?.sensitivity ?? []).map((b) => ({ from: clockText(b.startMinute), value: factor(b.mgDlPerUnit) })));
    case "targets":
      return blockRows((preset?.target ?? []).map((b) => ({ from: clockText(b.startMinute), low: glucose(b.lowMgDl), high: glucose(b.highMgDl) })));
    case "limits": {
      const { maxBasalUnitsPerHour: basal, maxBolusUnits: bolus } = preset?.limits ?? { maxBasalUnitsPerHour: null, maxBolusUnits: null };
      return { ...(basal === null ? {} : { maxBasalUnitsPerHour: String(basal) }), ...(bolus === null ? {} : { maxBolusUnits: String(bolus) }) };
    }
    default:
      return {};
  }
}

const fieldOf = (flatName: string) => flatName.split(".")[0] ?? "";

/** What stands in a page's fields when it opens: what was typed, and the preset where nothing was. */
export function startOfStep(step: WizardStep, typed: TypedPage, facts: StartFacts): FlatPage {
  const preset = Object.entries(presetOfStep(step, facts)).filter(([name]) => !(fieldOf(name) in typed));
  return { ...Object.fromEntries(preset), ...flattened(typed) };
}

/**
 * A page without what was left as the preset had it, so that the preset may
 * move when an earlier page changes; the person's own edits stay as typed.
 */
export function withoutPreset(step: WizardStep, typed: TypedPage, facts: StartFacts): TypedPage {
  if (!["basal", "carb-ratio", "sensitivity", "targets", "limits"].includes(step)) return typed;
  const preset = presetOfStep(step, facts);
  const isUntouched = (name: string, value: unknown) => {
    const ofField = (flat: FlatPage) => Object.entries(flat).filter(([key, text]) => (key === name || key.startsWith(`${name}.`)) && text !== "");
    const [now, then] = [ofField(flattened(value, name)), ofField(preset)];
    const isWithoutValue = name === "blocks" && now.every(([key]) => key.endsWith(".from"));
    return isWithoutValue || (then.length > 0 && now.length === then.length && now.every(([key, text]) => isSameNumber(text, preset[key] ?? "")));
  };
  return Object.fromEntries(Object.entries(typed).filter(([name, value]) => !isUntouched(name, value)));
}

function isSameNumber(a: string, b: string): boolean {
  if (a.trim() === b.trim()) return true;
  const [x, y] = [readDecimal(a), readDecimal(b)];
  return typeof x === "number" && x === y;
}
