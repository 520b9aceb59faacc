"use client";

import { ActionForm } from "@/components/form/action-form";
import { TickField } from "@/components/form/choices";
import { TextField } from "@/components/form/fields";
import { planStartAction, startJournalAction } from "../actions";
import { planStartInput, startJournalInput } from "../schema";

export function StartDayForm({ journalId, today }: Readonly<{ journalId: string; today: string }>) {
  return (
    <ActionForm schema={startJournalInput} action={startJournalAction} submitLabel="This is day 1" idPrefix="start" hidden={{ journalId }} start={{ startedOn: today }}>
      <TextField name="startedOn" label="Day 1" type="date" size={12} hint="Today, or the day of the last two weeks on which it began. Everything else counts from it." />
      <TickField name="hasKetoneStrips" label="Ketone strips in date are at hand." />
      <TickField name="hasFastCarbohydrate" label="Fast carbohydrate for three lows is at hand." />
    </ActionForm>
  );
}

export function PlanDayForm({ journalId, plannedStartOn }: Readonly<{ journalId: string; plannedStartOn: string | null }>) {
  return (
    <ActionForm schema={planStartInput} action={planStartAction} submitLabel="Write down the day" submitKind="other" idPrefix="plan" hidden={{ journalId }} start={{ plannedStartOn: plannedStartOn ?? "" }}>
      <TextField name="plannedStartOn" label="Planned start day" type="date" size={12} hint="Ordinary meals, no travel, and not before a night alone. Opens nothing by itself." />
    </ActionForm>
  );
}
