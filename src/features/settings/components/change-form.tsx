"use client";

import { ActionForm } from "@/components/form/action-form";
import { ChoiceField, TicksField } from "@/components/form/choices";
import { SelectField, TextArea, TextField } from "@/components/form/fields";
import { Button } from "@/components/button";
import { CHANGE_REASONS } from "@/domain/settings/change-reason";
import { EXPECTED_DIRECTIONS, EXPECTED_OUTCOMES, EXPECTED_WINDOWS } from "@/domain/settings/expectation";
import type { GlucoseUnit } from "@/domain/units";
import { changeSettingAction } from "../actions";
import { CHANGEABLE_SETTINGS, REVERT_RULES } from "../constants";
import { changeSettingInput } from "../schema";
import { GuardrailAnswers } from "./guardrail-answers";

const options = (list: Readonly<Record<string, string>>) => Object.entries(list).map(([value, label]) => ({ value, label }));
const choose = (list: Readonly<Record<string, string>>) => [{ value: "", label: "Choose …" }, ...options(list)];

/** One setting, one part of the day, old to new; what is hoped for is fixed before the data. */
export function ChangeForm({
  journalId, baseVersion, unit, recentDays, mayRecord,
}: Readonly<{
  journalId: string;
  baseVersion: number;
  unit: GlucoseUnit;
  recentDays: ReadonlyArray<{ value: string; label: string }>;
  mayRecord: boolean;
}>) {
  const { own: _own, ...windows } = EXPECTED_WINDOWS;
  return (
    <ActionForm
      schema={changeSettingInput}
      action={changeSettingAction}
      submitLabel="Ask my educator"
      hidden={{ journalId, baseVersion: String(baseVersion) }}
      start={{ from: "00:00", to: "24:00", expectedWindow: "", expectedOutcome: "", expectedDirection: "", reason: "" }}
      extraButtons={mayRecord ? <Button kind="other" name="action" value="record">Record without review</Button> : null}
    >
      <ChoiceField name="setting" label="Which setting changes?" options={options(CHANGEABLE_SETTINGS)} />
      <div className="flex flex-wrap gap-x-6">
        <TextField name="from" label="From" size={6} inputMode="numeric" hint="Time of day, such as 05:00" />
        <TextField name="to" label="Until" size={6} inputMode="numeric" hint="24:00 is midnight" />
      </div>
      <TextField name="value" label={`New value (U/h, g/U, or ${unit} per U)`} inputMode="decimal" size={8} hint="For basal, ratio or sensitivity. A decimal comma is fine." isOptional />
      <div className="flex flex-wrap gap-x-6">
        <TextField name="targetLow" label="Target from" suffix={unit} inputMode="decimal" isOptional />
        <TextField name="targetHigh" label="Target to" suffix={unit} inputMode="decimal" isOptional />
      </div>
      <SelectField name="reason" label="Why?" options={choose(CHANGE_REASONS)} />
      <TextArea name="reasonText" label="In your own words" rows={3} isOptional />
      <TicksField name="evidenceDays" label="Which days looked like this?" hint="Three days show more than one; for lows, two." options={recentDays} isInline />
      <SelectField name="expectedOutcome" label="What do you hope to see move?" options={choose(EXPECTED_OUTCOMES)} hint="Fixed now, before the data, so that it counts later." />
      <SelectField name="expectedWindow" label="In which part of the day?" options={choose(windows)} />
      <SelectField name="expectedDirection" label="Which way?" options={choose(EXPECTED_DIRECTIONS)} />
      <TextField name="lookAgainOn" label="Date to look again" type="date" isOptional hint="At least three full days on." size={12} />
      <SelectField name="revertRule" label="When would you go back?" options={[{ value: "", label: "Nothing written down" }, ...REVERT_RULES.map((rule) => ({ value: rule, label: rule }))]} />
      <GuardrailAnswers />
    </ActionForm>
  );
}
