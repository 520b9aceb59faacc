"use client";

import { ActionForm } from "@/components/form/action-form";
import { ChoiceField } from "@/components/form/choices";
import { SelectField, TextField } from "@/components/form/fields";
import { createJournalAction } from "../actions";
import { THERAPIES } from "../constants";
import { createJournalInput } from "../schema";

export function NewJournalForm({ zones, timeZone, glucoseUnit }: Readonly<{ zones: ReadonlyArray<string>; timeZone: string; glucoseUnit: string }>) {
  return (
    <ActionForm
      schema={createJournalInput}
      action={createJournalAction}
      submitLabel="Start the journal"
      start={{ name: "My notebook", glucoseUnit, timeZone, basalStepUnits: "0.05", bolusStepUnits: "0.05" }}
    >
      <TextField name="name" label="Name of the notebook" />
      <ChoiceField name="glucoseUnit" label="Glucose in" options={[{ value: "mg/dL", label: "mg/dL" }, { value: "mmol/L", label: "mmol/L" }]} isInline />
      <SelectField name="timeZone" label="Time zone of the notebook" options={zones.map((zone) => ({ value: zone, label: zone.replaceAll("_", " ") }))} />
      <ChoiceField name="therapy" label="How do you treat your diabetes now?" options={Object.entries(THERAPIES).map(([value, label]) => ({ value, label }))} isInline />
      <TextField name="plannedStartOn" label="Planned start day" type="date" isOptional size={12} hint="Ordinary meals, no travel, and not before a night alone." />
      <fieldset className="mt-8">
        <legend className="font-serif text-section">The new setup, in your own words</legend>
        <TextField name="pump" label="Pump" isOptional />
        <TextField name="sensor" label="Glucose sensor" isOptional />
        <TextField name="controller" label="What adjusts the insulin" isOptional />
        <TextField name="insulin" label="Insulin" isOptional />
        <TextField name="basalStepUnits" label="Smallest basal step of the pump" suffix="U/h" inputMode="decimal" hint="As its handbook says; it can be changed later." />
        <TextField name="bolusStepUnits" label="Smallest bolus step of the pump" suffix="U" inputMode="decimal" />
      </fieldset>
    </ActionForm>
  );
}
