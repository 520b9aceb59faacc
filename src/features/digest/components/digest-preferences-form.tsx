"use client";

import { useState } from "react";
import { ActionForm } from "@/components/form/action-form";
import { ChoiceField, TickField } from "@/components/form/choices";
import { SelectField, TextField } from "@/components/form/fields";
import { Notice } from "@/components/notice";
import { WEEKDAYS, type DigestPreference } from "@/domain/digest/preference";
import { clockText } from "@/domain/settings/clock-text";
import { saveDigestPreferenceAction } from "../actions";
import { LEVEL_WORDS } from "../constants";
import { digestPreferenceInput } from "../schema";

/** How much of a week comes by mail, and when, in the reader's own zone. */
export function DigestPreferencesForm({ preference, timeZone }: Readonly<{ preference: DigestPreference; timeZone: string }>) {
  const { level, weekday, minuteOfDay, isToldOfComments } = preference;
  const [isSaved, setSaved] = useState(false);
  return (
    <>
      <ActionForm
        schema={digestPreferenceInput}
        action={saveDigestPreferenceAction}
        submitLabel="Save these choices"
        start={{ level, weekday: String(weekday), minuteOfDay: clockText(minuteOfDay), isToldOfComments: isToldOfComments ? "on" : "" }}
        idPrefix="digest"
        onDone={() => setSaved(true)}
      >
        <ChoiceField name="level" label="Your week by mail" options={LEVEL_WORDS} />
        <SelectField name="weekday" label="On" options={WEEKDAYS.map((label, i) => ({ value: String(i + 1), label }))} />
        <TextField name="minuteOfDay" label="At" suffix="HH:MM" hint={`In your time zone, ${timeZone.replaceAll("_", " ")}.`} />
        <TickField name="isToldOfComments" label="Tell me by mail when there is something new to read; the mail does not hold the words." />
      </ActionForm>
      {isSaved ? <Notice>Saved. The next mail follows these choices.</Notice> : null}
    </>
  );
}
