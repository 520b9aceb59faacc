"use client";

import { ActionForm } from "@/components/form/action-form";
import { ChoiceField } from "@/components/form/choices";
import { SelectField, TextArea, TextField } from "@/components/form/fields";
import { DAY_FLAGS } from "@/domain/journal/day-flag";
import { DOSE_KINDS, DOSE_TIMINGS, MEAL_SPEEDS } from "@/domain/journal/entry";
import { logDoseAction, logKetonesAction, logMealAction, logNoteAction, setFlagAction } from "../actions";
import { logDoseInput, logKetonesInput, logMealInput, logNoteInput, setFlagInput } from "../schema";

const options = (list: ReadonlyArray<string>) => list.map((value) => ({ value, label: value.replaceAll("-", " ") }));
const WHEN = <TextField name="at" label="When" type="datetime-local" size={20} />;

/** Six kinds of entry, each a press away; the time stands ready and can lie in the past. */
export function LogForms({ journalId, now, today }: Readonly<{ journalId: string; now: string; today: string }>) {
  const hidden = { journalId };
  const forms = [
    {
      title: "Meal",
      form: (
        <ActionForm schema={logMealInput} action={logMealAction} submitLabel="Log the meal" hidden={hidden} start={{ at: now, speed: "unsure" }}>
          <TextField name="carbohydrateGrams" label="Carbohydrate" suffix="g" inputMode="numeric" />
          <TextField name="label" label="What" isOptional />
          <ChoiceField name="speed" label="How fast it works" options={options(MEAL_SPEEDS)} isInline />
          {WHEN}
        </ActionForm>
      ),
    },
    {
      title: "Dose",
      form: (
        <ActionForm schema={logDoseInput} action={logDoseAction} submitLabel="Log the dose" hidden={hidden} start={{ at: now, doseKind: "meal", timing: "with" }}>
          <TextField name="units" label="Insulin" suffix="U" inputMode="decimal" />
          <SelectField name="doseKind" label="Kind" options={options(DOSE_KINDS)} />
          <ChoiceField name="timing" label="Against the meal" options={options(DOSE_TIMINGS)} isInline />
          {WHEN}
        </ActionForm>
      ),
    },
    {
      title: "Ketones",
      form: (
        <ActionForm schema={logKetonesInput} action={logKetonesAction} submitLabel="Log the ketones" hidden={hidden} start={{ at: now }}>
          <TextField name="ketonesMmolPerL" label="Blood ketones" suffix="mmol/L" inputMode="decimal" hint="0.6 or more: your sick-day plan. 3.0 or more, vomiting or drowsy: emergency." />
          {WHEN}
        </ActionForm>
      ),
    },
    {
      title: "Note",
      form: (
        <ActionForm schema={logNoteInput} action={logNoteAction} submitLabel="Keep the note" hidden={hidden} start={{ at: now }}>
          <TextArea name="text" label="Note" rows={3} />
          {WHEN}
        </ActionForm>
      ),
    },
    {
      title: "Day flag",
      form: (
        <ActionForm schema={setFlagInput} action={setFlagAction} submitLabel="Flag the days" hidden={hidden} start={{ code: "", firstDay: today, lastDay: today }}>
          <SelectField name="code" label="What was different" options={[{ value: "", label: "Choose …" }, ...Object.entries(DAY_FLAGS).map(([value, { label }]) => ({ value, label }))]} />
          <TextField name="firstDay" label="First day" type="date" size={12} />
          <TextField name="lastDay" label="Last day" type="date" size={12} />
          <TextField name="note" label="In a few words" isOptional />
        </ActionForm>
      ),
    },
  ];
  return (
    <div className="mt-6 grid grid-cols-2 items-start gap-3 desk:grid-cols-5">
      {forms.map(({ title, form }) => (
        <details key={title} name="log" className="group open:col-span-2 open:desk:col-span-5">
          <summary className="button button-other w-full list-none group-open:mb-1">{title}</summary>
          {form}
        </details>
      ))}
    </div>
  );
}
