import type { SettingField } from "./difference";
import type { GuardrailFacts, Spoken } from "./guardrail-facts";

function blocked(milliUnits: number, stepMilliUnits: number, unit: string): Spoken[] {
  if (milliUnits % stepMilliUnits === 0) return [];
  const below = Math.floor(milliUnits / stepMilliUnits) * stepMilliUnits;
  const text = (value: number) => `${value / 1000} ${unit}`;
  const values = { step: text(stepMilliUnits), below: text(below), above: text(below + stepMilliUnits) };
  return [{ code: "outside-step", severity: "blocks", values }];
}

/**
 * Values a device cannot hold. Of a change only what changed is looked at: a rate
 * that was off the step before does not block another one. A first version is
 * looked at whole.
 */
export function stepGuardrails(facts: GuardrailFacts): Spoken[] {
  const { proposed, difference, isStarting, basalStepMilliUnits, bolusStepMilliUnits } = facts;
  const newValues = (field: SettingField, all: ReadonlyArray<number | null>): number[] => {
    const changed = difference.changes.filter((change) => change.field === field).map((change) => change.newValue);
    const looked = isStarting ? all : changed;
    return [...new Set(looked.filter((value) => typeof value === "number"))];
  };
  const rates = newValues(
    "milliUnitsPerHour",
    proposed.basal.map((block) => block.milliUnitsPerHour),
  );
  const largestRate = newValues("maxBasalMilliUnitsPerHour", [proposed.limits.maxBasalMilliUnitsPerHour]);
  const largestBolus = newValues("maxBolusMilliUnits", [proposed.limits.maxBolusMilliUnits]);
  return [
    ...[...rates, ...largestRate].flatMap((rate) => blocked(rate, basalStepMilliUnits, "U/h")),
    ...largestBolus.flatMap((bolus) => blocked(bolus, bolusStepMilliUnits, "U")),
  ];
}
