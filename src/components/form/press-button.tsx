"use client";

import { useActionState } from "react";
import type { FormAction } from "./form-state";

/** A form of one press: hidden values and a button, as a link in a sentence or as a button. */
export function PressButton({
  action, label, hidden = {}, look = "other",
}: Readonly<{ action: FormAction; label: string; hidden?: Readonly<Record<string, string>>; look?: "next" | "other" | "link" }>) {
  const [state, dispatch, isBusy] = useActionState(action, null);
  return (
    <form action={dispatch} className="inline" onSubmit={(event) => { if (isBusy) event.preventDefault(); }}>
      {Object.entries(hidden).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />)}
      <button type="submit" aria-disabled={isBusy} className={look === "link" ? "link inline-flex min-h-8 cursor-pointer items-center" : `button button-${look}`}>{label}</button>
      {state && !state.ok ? <span role="alert" className="ml-3 font-semibold text-emergency">{state.message}</span> : null}
    </form>
  );
}
