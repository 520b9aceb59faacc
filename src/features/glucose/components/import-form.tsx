"use client";

import { ActionForm } from "@/components/form/action-form";
import { ChoiceField } from "@/components/form/choices";
import { SelectField, TextField } from "@/components/form/fields";
import { useFormContext } from "@/components/form/form-state";
import type { CsvPreview } from "@/domain/exchange/csv/preview";
import { runImportAction } from "../actions";
import { runImportInput } from "../schema";
import { ImportProgress } from "./import-progress";

/** How the file is read: every guess shown and changeable; unit, zone and day order settled before anything is stored. */
export function ImportForm({
  journalId, importId, preview, zones, timeZone,
}: Readonly<{ journalId: string; importId: string; preview: CsvPreview; zones: ReadonlyArray<string>; timeZone: string }>) {
  const columns = preview.columns.map((label, i) => ({ value: String(i), label }));
  const none = { value: "none", label: "None" };
  return (
    <ActionForm
      schema={runImportInput}
      action={runImportAction}
      submitLabel="Store the valid rows"
      hidden={{ journalId, importId, encoding: preview.encoding, delimiter: preview.delimiter, headerRow: String(preview.headerRow) }}
      start={{
        timeColumn: String(preview.timeColumn),
        dateColumn: preview.dateColumn === null ? "none" : String(preview.dateColumn),
        glucoseColumn: String(preview.glucoseColumn),
        subjectColumn: preview.subjectColumn === null ? "none" : String(preview.subjectColumn),
        subject: preview.subjects[0] ?? "none",
        unit: preview.unit === "ask" ? "" : preview.unit,
        dateOrder: preview.dateOrder === "ask" ? "" : preview.dateOrder,
        timeZone,
        shiftMinutes: "0",
      }}
    >
      <SelectField name="timeColumn" label="Column of times" options={columns} />
      <SelectField name="dateColumn" label="Column of dates, if apart" options={[none, ...columns]} />
      <SelectField name="glucoseColumn" label="Column of glucose values" options={columns} />
      <SelectField name="subjectColumn" label="Column that names a person, if any" options={[none, ...columns]} />
      {preview.subjects.length > 0 ? <SelectField name="subject" label="Whose rows are yours?" options={preview.subjects.map((s) => ({ value: s, label: s }))} hint="Rows of others are passed over." /> : null}
      <ChoiceField name="unit" label="Unit of the file" hint={preview.evidence} options={[{ value: "mg/dL", label: "mg/dL" }, { value: "mmol/L", label: "mmol/L" }]} isInline />
      <ChoiceField name="dateOrder" label="In dates such as 03/04/2026" options={[{ value: "day-first", label: "the day comes first" }, { value: "month-first", label: "the month comes first" }]} isInline />
      <SelectField
        name="timeZone"
        label="Zone of the file’s clock"
        hint={preview.hasOffset ? "The times say their own offset; the zone is not needed for this file." : "The times have no offset, so the zone decides."}
        options={zones.map((zone) => ({ value: zone, label: zone.replaceAll("_", " ") }))}
      />
      <TextField name="shiftMinutes" label="Shift every time by" suffix="minutes" inputMode="numeric" hint="For a device whose clock was off. Leave 0 otherwise." />
      <Busy journalId={journalId} importId={importId} />
    </ActionForm>
  );
}

function Busy(props: Readonly<{ journalId: string; importId: string }>) {
  return useFormContext().isBusy ? <ImportProgress {...props} /> : null;
}
