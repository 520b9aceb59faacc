"use client";

import type { ReactNode } from "react";
import { fieldId } from "./error-summary";
import { describedBy, FieldNotes, type Option } from "./fields";
import { useFormContext } from "./form-state";

type Group = Readonly<{ name: string; label: string; hint?: ReactNode; options: ReadonlyArray<Option>; isInline?: boolean }>;

/** One of a few: radio buttons under a legend. */
export function ChoiceField(props: Group) {
  return <Choices {...props} type="radio" />;
}

/** Any of a few: checkboxes under a legend. */
export function TicksField(props: Group) {
  return <Choices {...props} type="checkbox" />;
}

function Choices({ name, label, hint, options, isInline, type }: Group & { type: "radio" | "checkbox" }) {
  const { register, errorOf, startOf, idPrefix } = useFormContext();
  const error = errorOf(name);
  const id = fieldId(name, idPrefix);
  const chosen = (startOf(name) ?? "").split("|");
  return (
    <fieldset className="mt-5" aria-describedby={describedBy(id, hint, error)}>
      <legend className="font-semibold">{label}</legend>
      <FieldNotes name={name} hint={hint} error={error} />
      <div className={isInline ? "flex flex-wrap gap-x-6" : ""}>
        {options.map((option, i) => (
          <div key={option.value} className="flex min-h-target items-start gap-3 py-2">
            <input
              id={i === 0 ? id : `${id}-${option.value}`}
              type={type}
              value={option.value}
              defaultChecked={chosen.includes(option.value)}
              className="mt-0.5 size-6 shrink-0 accent-ink"
              {...register(name)}
            />
            <label htmlFor={i === 0 ? id : `${id}-${option.value}`}>
              {option.label}
              {option.hint ? <span className="block text-note text-soft">{option.hint}</span> : null}
            </label>
          </div>
        ))}
      </div>
    </fieldset>
  );
}

/** One statement to agree to. */
export function TickField({ name, label }: Readonly<{ name: string; label: ReactNode }>) {
  const { register, errorOf, startOf, idPrefix } = useFormContext();
  const error = errorOf(name);
  const id = fieldId(name, idPrefix);
  return (
    <div className="mt-5">
      <FieldNotes name={name} error={error} />
      <div className="flex min-h-target items-start gap-3 py-2">
        <input
          id={id}
          type="checkbox"
          defaultChecked={startOf(name) === "on"}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, null, error)}
          className="mt-0.5 size-6 shrink-0 accent-ink"
          {...register(name)}
        />
        <label htmlFor={id}>{label}</label>
      </div>
    </div>
  );
}
