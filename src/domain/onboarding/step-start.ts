import { mgDlToMmol, type GlucoseUnit } from "@/domain/units";
import { clockText } from "@/domain/settings/clock-text";
import type { ApiProfile } from "@/domain/settings/profile-api-schema";
import type { WizardStep } from "./wizard-step";

type Flat = Record<string, string>;

/** Typed answers as field names with dots: {blocks: [{from: "00:00"}]} becomes {"blocks.0.from": "00:00"}. */
export function flattened(value: unknown, path = ""): Flat {
  if (value === null || value === undefined) return {};
  if (typeof value !== "object") return { [path]: typeof value === "string" ? value : JSON.stringify(value) };
  return Object.assign({}, ...Object.entries(value).map(([key, inner]) => flattened(inner, path ? `${path}.${key}` : key))) as Flat;
}

const blockRows = (blocks: ReadonlyArray<{ startMinute: number; value: string }>): Flat =>
  Object.assign({}, ...blocks.map((b, i) => ({ [`blocks.${i}.from`]: clockText(b.startMinute), [`blocks.${i}.value`]: b.value }))) as Flat;

/**
 * What stands in a page's fields when it opens: what was typed before, else the
 * cautious preset, else nothing.
 */
export function startOfStep(
  step: WizardStep,
  typed: Readonly<Record<string, unknown>>,
  preset: ApiProfile | null,
  unit: GlucoseUnit,
  steps: Readonly<{ basalUnits: number; bolusUnits: number }>,
): Flat {
  if (Object.keys(typed).length > 0) return flattened(typed);
  const glucose = (mgDl: number) => (unit === "mg/dL" ? String(Math.round(mgDl)) : mgDlToMmol(mgDl).toFixed(1));
  switch (step) {
    case "device":
      return { basalStepUnits: String(steps.basalUnits), bolusStepUnits: String(steps.bolusUnits) };
    case "basal":
      return blockRows((preset?.basal ?? []).map((b) => ({ startMinute: b.startMinute, value: b.unitsPerHour.toFixed(2) })));
    case "carb-ratio":
      return blockRows((preset?.carbRatio ?? []).map((b) => ({ startMinute: b.startMinute, value: String(b.gramsPerUnit) })));
    case "sensitivity":
      return blockRows((preset?.sensitivity ?? []).map((b) => ({ startMinute: b.startMinute, value: glucose(b.mgDlPerUnit) })));
    case "targets":
      return Object.assign(
        {},
        ...(preset?.target ?? []).map((b, i) => ({ [`blocks.${i}.from`]: clockText(b.startMinute), [`blocks.${i}.low`]: glucose(b.lowMgDl), [`blocks.${i}.high`]: glucose(b.highMgDl) })),
      ) as Flat;
    case "limits":
      return preset?.limits.maxBolusUnits ? { maxBolusUnits: String(preset.limits.maxBolusUnits) } : {};
    default:
      return {};
  }
}

/** How many block rows a page opens with: those that are filled, and one that stands ready. */
export function rowCount(start: Flat): number {
  const filled = Object.keys(start).filter((name) => /^blocks\.\d+\.from$/.test(name)).length;
  return filled + 1;
}
