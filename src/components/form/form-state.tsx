"use client";

import { createContext, useContext } from "react";
import type { UseFormRegister, FieldValues } from "react-hook-form";
import type { ErrorCode } from "@/domain/errors";

/** What the server said of the last send; the shape that every form action returns. */
export type FormState =
  | null
  | { ok: true; data: unknown }
  | { ok: false; code: ErrorCode; message: string; fields: Record<string, string[]>; typed: Record<string, string> };

export type FormAction = (previous: FormState, form: FormData) => Promise<FormState>;

type FormContextValue = Readonly<{
  register: UseFormRegister<FieldValues>;
  /** For fields that keep their own state, such as rows that come and go: hands the form a copy to check. */
  setValue: (name: string, value: unknown) => void;
  /** The one sentence beside a field, from the browser's check or the server's. */
  errorOf: (name: string) => string | undefined;
  /** What stands in the field at first: what was typed before, or the given start. */
  startOf: (name: string) => string | undefined;
  isBusy: boolean;
  /** Begins the id of every field; see `fieldId`. */
  idPrefix?: string;
}>;

const FormContext = createContext<FormContextValue | null>(null);

export const FormProvider = FormContext.Provider;

export function useFormContext(): FormContextValue {
  const value = useContext(FormContext);
  if (!value) throw new Error("a field stands outside a form");
  return value;
}
