"use client";

import type { ReactNode } from "react";
import { fieldId } from "./error-summary";
import { useFormContext } from "./form-state";

type Common = Readonly<{
  name: string;
  label: string;
  hint?: ReactNode;
  isOptional?: boolean;
}>;

/** The ids of a field's hint and error, for `aria-describedby`. */
export function describedBy(id: string, hint: ReactNode, error: string | undefined): string | undefined {
  const ids = [hint ? `${id}-hint` : "", error ? `${id}-error` : ""].filter(Boolean);
  return ids.length > 0 ? ids.join(" ") : undefined;
}

function Frame({ name, label, hint, isOptional, children }: Common & { children: ReactNode }) {
  const { errorOf, idPrefix } = useFormContext();
  const error = errorOf(name);
  return (
    <div className="mt-5">
      <label htmlFor={fieldId(name, idPrefix)} className="block font-semibold">
        {label}
        {isOptional ? <span className="font-normal text-soft"> (optional)</span> : null}
      </label>
      <FieldNotes name={name} hint={hint} error={error} />
      {children}
    </div>
  );
}

export function FieldNotes({ name, hint, error }: Readonly<{ name: string; hint?: ReactNode; error?: string }>) {
  const id = fieldId(name, useFormContext().idPrefix);
  return (
    <>
      {hint ? <div id={`${id}-hint`} className="text-note text-soft">{hint}</div> : null}
      {error ? (
        <p id={`${id}-error`} className="font-semibold text-emergency">
          <span className="sr-only">Error:</span>{" "}
          {error}
        </p>
      ) : null}
    </>
  );
}

/** One line of text, or with `suffix` a quantity: the unit stands outside the box and in the label. */
export function TextField({
  suffix, type = "text", inputMode, autoComplete, size, ...common
}: Common & Readonly<{
  suffix?: string;
  type?: "text" | "email" | "password" | "date" | "time" | "tel" | "datetime-local";
  inputMode?: "decimal" | "numeric" | "text";
  autoComplete?: string;
  size?: number;
}>) {
  const { register, errorOf, startOf, idPrefix } = useFormContext();
  const error = errorOf(common.name);
  const id = fieldId(common.name, idPrefix);
  return (
    <Frame {...common} label={suffix ? `${common.label}, ${suffix}` : common.label}>
      <div className="mt-1 flex items-center gap-2">
        <input
          id={id}
          type={type}
          inputMode={inputMode}
          autoComplete={autoComplete ?? "off"}
          size={size ?? (suffix ? 8 : 34)}
          defaultValue={startOf(common.name) ?? ""}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy(id, common.hint, error)}
          className={`field ${suffix ? "text-right" : "w-full"}`}
          {...register(common.name)}
        />
        {suffix ? <span aria-hidden="true" className="text-soft">{suffix}</span> : null}
      </div>
    </Frame>
  );
}

export function TextArea({ rows = 4, ...common }: Common & Readonly<{ rows?: number }>) {
  const { register, errorOf, startOf, idPrefix } = useFormContext();
  const error = errorOf(common.name);
  const id = fieldId(common.name, idPrefix);
  return (
    <Frame {...common}>
      <textarea
        id={id}
        rows={rows}
        defaultValue={startOf(common.name) ?? ""}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, common.hint, error)}
        className="field mt-1 block w-full"
        {...register(common.name)}
      />
    </Frame>
  );
}

export type Option = Readonly<{ value: string; label: string; hint?: string }>;

export function SelectField({ options, ...common }: Common & Readonly<{ options: ReadonlyArray<Option> }>) {
  const { register, errorOf, startOf, idPrefix } = useFormContext();
  const error = errorOf(common.name);
  const id = fieldId(common.name, idPrefix);
  return (
    <Frame {...common}>
      <select
        id={id}
        defaultValue={startOf(common.name) ?? ""}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, common.hint, error)}
        className="field mt-1 block"
        {...register(common.name)}
      >
        {options.map(({ value, label }) => <option key={value} value={value}>{label}</option>)}
      </select>
    </Frame>
  );
}
