"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import { startTransition, useActionState, useEffect, useId, useState, type ReactNode } from "react";
import { get, useForm, type FieldErrors, type FieldValues } from "react-hook-form";
import type { z } from "zod";
import { Button } from "../button";
import { ErrorSummary } from "./error-summary";
import { FormProvider, type FormAction, type FormState } from "./form-state";

/**
 * A form that is checked by one schema on both sides, works without script,
 * keeps what was typed, and puts every refusal beside its field with the same
 * words as in the summary on top.
 */
export function ActionForm({
  schema, action, submitLabel, start = {}, hidden = {}, extraButtons, idPrefix, submitKind, children, onDone, done, isEmptiedWhenDone = false,
}: Readonly<{
  schema: z.ZodType<FieldValues, FieldValues>;
  action: FormAction;
  submitLabel: string;
  /** What stands in the fields at first, by field name. */
  start?: Readonly<Record<string, string | ReadonlyArray<string>>>;
  hidden?: Readonly<Record<string, string>>;
  extraButtons?: ReactNode;
  /** Needed where two forms with a field of the same name stand on one page. */
  idPrefix?: string;
  /** "other" where sending is not the page's one next step. */
  submitKind?: "next" | "other";
  children?: ReactNode;
  onDone?: (data: unknown) => void;
  /** What is said once the server has taken it; unlike `onDone` it works without script. */
  done?: ReactNode | ((data: unknown) => ReactNode);
  /** For secrets and for forms that are sent again and again. */
  isEmptiedWhenDone?: boolean;
}>) {
  const [state, dispatch, isBusy] = useActionState(action, null);
  const formId = useId();
  const form = useForm<FieldValues>({
    resolver: zodResolver(schema),
    shouldFocusError: false,
    defaultValues: { ...nested(start), ...nested(hidden) },
  });
  const { errors, submitCount } = form.formState;
  /** The server's answer that a later check in the browser has overtaken. */
  const [overtaken, setOvertaken] = useState<FormState>(null);
  const answer = state && !state.ok ? state : null;
  const refused = isBusy || answer === overtaken ? null : answer;

  useEffect(() => {
    if (state?.ok) onDone?.(state.data);
  }, [state, onDone]);
  const { reset } = form;
  useEffect(() => {
    if (state?.ok && isEmptiedWhenDone) reset();
  }, [state, isEmptiedWhenDone, reset]);

  const errorOf = (name: string): string | undefined => {
    const own: { message?: string; root?: { message?: string } } | undefined = get(errors, name);
    return own?.message ?? own?.root?.message ?? refused?.fields[name]?.[0];
  };
  const items = [...clientItems(errors), ...Object.entries(refused?.fields ?? {}).map(([name, all]) => ({ name, message: all[0] ?? "" }))];
  const summary = items.length > 0 ? uniqueByName(items) : [];
  const doneWords = state?.ok && summary.length === 0 ? (typeof done === "function" ? done(state.data) : done) : null;

  return (
    <FormProvider
      value={{
        register: form.register,
        setValue: (name, value) => form.setValue(name, value, { shouldValidate: submitCount > 0 }),
        errorOf,
        startOf: (name) => answer?.typed[name] ?? [start[name] ?? []].flat().join("|"),
        isBusy,
        idPrefix,
      }}
    >
      <form
        id={formId}
        action={dispatch}
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          if (isBusy) return;
          const submitter = event.nativeEvent.submitter;
          const data = new FormData(event.currentTarget, submitter);
          void form.handleSubmit(() => startTransition(() => dispatch(data)), () => setOvertaken(state))(event);
        }}
        className="mt-6 max-w-text"
      >
        {summary.length > 0 || refused ? (
          <ErrorSummary key={`${submitCount}-${refused ? JSON.stringify(refused.fields) : ""}`} message={refused?.message} items={summary} unseen={[...Object.keys(hidden), "form"]} idPrefix={idPrefix} />
        ) : null}
        {done ? <div role="status">{doneWords ? <div className="mb-6 border-l-4 border-range py-1 pl-4">{doneWords}</div> : null}</div> : null}
        {Object.entries(hidden).map(([name, value]) => <input key={name} type="hidden" {...form.register(name)} defaultValue={value} />)}
        {children}
        <div className="mt-6 flex flex-wrap gap-3">
          <Button kind={submitKind} isBusy={isBusy}>{isBusy ? "Saving …" : submitLabel}</Button>
          {extraButtons}
        </div>
      </form>
    </FormProvider>
  );
}

type Item = { name: string; message: string };

function clientItems(errors: FieldErrors, path = ""): Item[] {
  return Object.entries(errors).flatMap(([key, value]) => {
    if (!value || typeof value !== "object") return [];
    const name = path ? `${path}.${key}` : key;
    const message = (value as { message?: unknown }).message;
    if (typeof message === "string") return [{ name, message }];
    return key === "ref" ? [] : clientItems(value as FieldErrors, name);
  });
}

function uniqueByName(items: Item[]): Item[] {
  return [...new Map(items.toReversed().map((item) => [item.name, item])).values()].toReversed();
}

/** {"a.0.b": "x"} as {a: [{b: "x"}]}, which is how the form library keeps its values. */
function nested(flat: Readonly<Record<string, string | ReadonlyArray<string>>>): FieldValues {
  const result: FieldValues = {};
  for (const [path, value] of Object.entries(flat)) {
    const keys = path.split(".");
    let at = result as Record<string, unknown>;
    keys.forEach((key, i) => {
      if (i === keys.length - 1) at[key] = value;
      else at = (at[key] ??= /^\d+$/.test(keys[i + 1] ?? "") ? [] : {}) as Record<string, unknown>;
    });
  }
  return result;
}
