"use client";

import { useState } from "react";
import { Button } from "@/components/button";
import { ChoiceField } from "@/components/form/choices";
import { SelectField, TextArea, TextField } from "@/components/form/fields";
import { FEATURE_KINDS } from "@/domain/onboarding/feature-rows";
import { GATE_QUESTIONS } from "@/domain/settings/gate-questions";
import type { GlucoseUnit } from "@/domain/units";

const YES_NO = [{ value: "yes", label: "Yes" }, { value: "no", label: "No" }];
const YES_NO_NOT_SURE = [...YES_NO, { value: "not-sure", label: "Not sure" }];

export function AboutYouFields({ therapy, unit }: Readonly<{ therapy: string; unit: GlucoseUnit }>) {
  return (
    <>
      <TextField name="weightKg" label="Weight" suffix="kg" inputMode="decimal" />
      <TextField name="ageYears" label="Age" suffix="years" inputMode="numeric" />
      <TextField
        name="totalDailyDoseUnits"
        label="All insulin of a usual day"
        suffix="U"
        inputMode="decimal"
        hint={therapy === "injections" ? "Long-acting and meals together, averaged over the last 4 to 14 days." : "Basal and meals together, averaged over 14 days of pump wear."}
      />
      <TextArea name="dailyTotals" label="Or the total of each day" isOptional hint="One day a line, such as 38.5. The average is used where the field above is empty." rows={3} />
      <TextField name="largestMealBolusUnits" label="Largest meal dose of late" suffix="U" inputMode="decimal" isOptional />
      <ChoiceField name="hypoProne" label="Do you have lows often?" options={YES_NO} isInline />
      {therapy === "injections" ? null : (
        <>
          <TextArea name="workingBasal" label="Basal rates that work now, U/h" hint="One block a line: a time and a value, such as 00:00 0.60. They are carried over unchanged." rows={5} />
          <TextArea name="workingCarbRatio" label="Carb ratios that work now, g/U" hint="One block a line." rows={4} />
          <TextArea name="workingSensitivity" label={`Sensitivity factors that work now, ${unit} per U`} hint="One block a line." rows={4} />
        </>
      )}
    </>
  );
}

/** Nothing is judged; not sure counts as yes; every answer can be changed later. */
export function GateFields() {
  return Object.entries(GATE_QUESTIONS).map(([name, { question }]) => <ChoiceField key={name} name={name} label={question} options={YES_NO_NOT_SURE} isInline />);
}

export function DeviceFields() {
  return (
    <>
      <TextField name="insulin" label="Insulin" isOptional />
      <TextField name="basalStepUnits" label="Smallest basal step" suffix="U/h" inputMode="decimal" />
      <TextField name="bolusStepUnits" label="Smallest bolus step" suffix="U" inputMode="decimal" />
      <TextField
        name="durationOfActionHours"
        label="Duration of insulin action"
        suffix="hours"
        inputMode="decimal"
        isOptional
        hint="As your system names it. The duration of a bolus calculator and that of a loop’s model are not the same number; leave it empty to keep the system’s own."
      />
    </>
  );
}

const KIND_OPTIONS = Object.entries(FEATURE_KINDS).map(([value, label]) => ({ value, label }));

/** @param featureCount rows that are filled already; some stand ready behind them */
export function LimitFields({ featureCount }: Readonly<{ featureCount: number }>) {
  const [rows, setRows] = useState(Math.max(3, featureCount + 1));
  return (
    <>
      <TextField name="maxBasalUnitsPerHour" label="Largest basal rate" suffix="U/h" inputMode="decimal" isOptional />
      <TextField name="maxBolusUnits" label="Largest bolus" suffix="U" inputMode="decimal" isOptional hint="A cap that was used in a trial: the largest meal dose of the last two weeks (Burnside protocol, 2020)." />
      <TextField name="maxInsulinOnBoardUnits" label="Largest insulin on board" suffix="U" inputMode="decimal" isOptional />
      <fieldset className="mt-8">
        <legend className="font-serif text-section">Switches and numbers of your own device</legend>
        <p className="text-note text-soft">Under the names that your device uses. A row left empty is left out.</p>
        {Array.from({ length: rows }, (_, row) => (
          <div key={row} className="flex flex-wrap gap-x-5 border-b border-hairline pb-4">
            <TextField name={`features.${row}.label`} label={`Name ${row + 1}`} size={18} />
            <SelectField name={`features.${row}.kind`} label={`Holds ${row + 1}`} options={KIND_OPTIONS} />
            <TextField name={`features.${row}.value`} label={`Set to ${row + 1}`} size={10} />
          </div>
        ))}
      </fieldset>
      <div className="mt-4"><Button kind="other" type="button" onClick={() => setRows(rows + 1)}>Add a row</Button></div>
    </>
  );
}

/** Two people, and two helplines of the devices. */
const CONTACT_ROWS = [0, 1, 2, 3];

/** What stands on the fallback card; the wizard and the card's own form share it. */
export function CardFields() {
  return (
    <>
      <TextArea name="previousSetup" label="What you would go back to" rows={6} hint="Your present doses or settings, by time of day, as they are now: long-acting with its time, rapid for meals and corrections." />
      <TextField name="longActingUnits" label="Long-acting insulin a day, if your educator has written one down" suffix="U" inputMode="decimal" isOptional />
      <TextField name="rapidUnits" label="Rapid insulin every 4 hours while no long-acting is at hand, if your educator has written one down" suffix="U" inputMode="decimal" isOptional />
      <TextField name="emergencyNumber" label="Emergency number where you live" inputMode="numeric" size={10} />
      <fieldset className="mt-6">
        <legend className="font-semibold">Who can be called</legend>
        <p className="text-note text-soft">Two people, if there are two; one of them knows what a severe low looks like. Then the helplines of your devices.</p>
        {CONTACT_ROWS.map((row) => (
          <div key={row} className="flex flex-wrap gap-x-6">
            <TextField name={`contacts.${row}.name`} label={`Name ${row + 1}`} size={20} />
            <TextField name={`contacts.${row}.phone`} label={`Phone ${row + 1}`} type="tel" size={16} />
          </div>
        ))}
      </fieldset>
    </>
  );
}
