import { readBlocks } from "@/domain/settings/blocks-text";
import { mgDlToMmol, type GlucoseUnit } from "@/domain/units";
import type { FlatPage } from "@/domain/onboarding/step-start";
import type { WizardView } from "../queries/wizard";
import { BlockEditor } from "./block-editor";
import type { BlockPage } from "./block-page";
import { MarginTable } from "./margin-table";
import { AboutYouFields, CardFields, DeviceFields, GateFields, LimitFields } from "./step-fields";
import { BackUpTable } from "./back-up-table";

/** The fields of one page. */
export function StepPage({ view, start }: Readonly<{ view: WizardView; start: FlatPage }>) {
  const unit = view.journal.glucoseUnit;
  const rows = countOf(start, /^blocks\.(\d+)\./);
  switch (view.step) {
    case "about-you":
      return <AboutYouFields therapy={view.journal.therapy} unit={unit} />;
    case "gate":
      return <GateFields />;
    case "device":
      return <DeviceFields />;
    case "basal":
    case "carb-ratio":
    case "sensitivity":
    case "targets":
      return <BlockEditor rowCount={rows} page={blockPage(view, unit)} />;
    case "limits":
      return <LimitFields featureCount={countOf(start, /^features\.(\d+)\./)} />;
    case "margin":
      return <MarginTable view={view} />;
    case "fallback":
      return <><CardFields /><BackUpTable view={view} /></>;
    default:
      return null;
  }
}

function countOf(start: FlatPage, name: RegExp): number {
  return Math.max(0, ...Object.keys(start).map((key) => Number(name.exec(key)?.[1] ?? -1) + 1));
}

/** What the editor shows beside the rows; numbers of the rules only while the gate is open. */
function blockPage(view: WizardView, unit: GlucoseUnit): BlockPage {
  const { arithmetic, journal } = view;
  const preset = arithmetic?.profile?.cautious;
  const typed = (name: string) => {
    const text = view.answers["about-you"]?.[name];
    const blocks = readBlocks(typeof text === "string" ? text : "");
    return journal.therapy === "injections" || typeof blocks === "string" ? null : blocks;
  };
  const round = (value: number) => Number(value.toFixed(2));
  const glucose = (mgDl: number) => round(unit === "mg/dL" ? mgDl : mgDlToMmol(mgDl));
  const value = { name: "value" };
  switch (view.step) {
    case "basal":
      return {
        title: "Basal rate", unit: "U/h", family: "basal", fields: [{ ...value, label: "Rate" }], previous: typed("workingBasal"), spread: arithmetic?.basal.spread?.cautious ?? null,
        cautious: preset?.basal.map((b) => ({ startMinute: b.startMinute, value: b.unitsPerHour })) ?? null,
        deviceStep: journal.setup.basalStepMilliUnits / 1000, nudge: journal.setup.basalStepMilliUnits / 1000, isTotalShown: true,
      };
    case "carb-ratio":
      return {
        title: "Carb ratio", unit: "g/U", family: "carbRatio", fields: [{ ...value, label: "Ratio" }], previous: typed("workingCarbRatio"), spread: arithmetic?.carbRatio.spread?.cautious ?? null,
        cautious: preset?.carbRatio.map((b) => ({ startMinute: b.startMinute, value: b.gramsPerUnit })) ?? null, deviceStep: null, nudge: 1, isTotalShown: false,
      };
    case "sensitivity": {
      const spread = arithmetic?.sensitivity.spread?.cautious;
      return {
        title: "Sensitivity factor", unit: `${unit} per U`, family: "sensitivity", fields: [{ ...value, label: "Factor" }], previous: typed("workingSensitivity"),
        spread: spread ? { low: glucose(spread.low), high: glucose(spread.high) } : null,
        cautious: preset?.sensitivity.map((b) => ({ startMinute: b.startMinute, value: glucose(b.mgDlPerUnit) })) ?? null, deviceStep: null, nudge: unit === "mg/dL" ? 1 : 0.1, isTotalShown: false,
      };
    }
    default:
      return {
        title: "Glucose target", unit, family: "target", fields: [{ name: "low", label: "Lower end" }, { name: "high", label: "Upper end" }], previous: null, spread: null,
        cautious: preset?.target.map((b) => ({ startMinute: b.startMinute, value: unit === "mg/dL" ? b.lowMgDl : Number(mgDlToMmol(b.lowMgDl).toFixed(1)) })) ?? null,
        deviceStep: null, nudge: unit === "mg/dL" ? 1 : 0.1, isTotalShown: false,
      };
  }
}
