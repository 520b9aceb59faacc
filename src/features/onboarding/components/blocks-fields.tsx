"use client";

import { useState } from "react";
import { Button } from "@/components/button";
import { StepLine } from "@/components/charts/step-line";
import { TextField } from "@/components/form/fields";
import { useFormContext } from "@/components/form/form-state";
import { readDecimal } from "@/domain/form-text";

type Value = { startMinute: number; value: number };

/** Blocks of a day: a start and a value each. One empty row stands ready; rows left empty are dropped. */
export function BlocksFields({
  rows, suffix, previous, title, isTotalShown,
}: Readonly<{
  rows: number;
  suffix: string;
  previous: ReadonlyArray<Value> | null;
  title: string;
  isTotalShown: boolean;
}>) {
  const { startOf } = useFormContext();
  const [count, setCount] = useState(rows);
  const [typed, setTyped] = useState<Record<string, string>>({});
  const textOf = (name: string) => typed[name] ?? startOf(name) ?? "";
  const blocks = Array.from({ length: count }, (_, i) => read(textOf(`blocks.${i}.from`), textOf(`blocks.${i}.value`))).filter((b) => b !== null);
  return (
    <div
      onInput={(event) => {
        const { name, value } = event.target as HTMLInputElement;
        setTyped((before) => ({ ...before, [name]: value }));
      }}
    >
      <StepLine title={title} unit={suffix} current={blocks} previous={previous} />
      {isTotalShown ? <p className="mt-1 font-semibold" role="status">{totalText(blocks)}</p> : null}
      <fieldset className="mt-5">
        <legend className="font-serif text-section">Blocks</legend>
        {Array.from({ length: count }, (_, i) => (
          <div key={i} className="flex flex-wrap items-end gap-x-6 border-b border-hairline pb-3">
            <TextField name={`blocks.${i}.from`} label={`From ${i + 1}`} size={6} inputMode="numeric" />
            <TextField name={`blocks.${i}.value`} label={`Value ${i + 1}`} suffix={suffix} inputMode="decimal" />
          </div>
        ))}
      </fieldset>
      <div className="mt-4">
        <Button kind="other" type="button" onClick={() => setCount(count + 1)}>Add a block</Button>
      </div>
    </div>
  );
}

function read(from: string, value: string): Value | null {
  const [, hours, minutes] = /^(\d{1,2})[:.](\d{2})$/.exec(from.trim()) ?? [];
  const number = readDecimal(value);
  if (hours === undefined || typeof number === "string") return null;
  return { startMinute: Number(hours) * 60 + Number(minutes), value: number };
}

function totalText(blocks: ReadonlyArray<Value>): string {
  const sorted = blocks.toSorted((a, b) => a.startMinute - b.startMinute);
  if (sorted[0]?.startMinute !== 0) return "The total shows when the first block starts at 00:00.";
  const total = sorted.reduce((sum, b, i) => sum + (b.value * ((sorted[i + 1]?.startMinute ?? 1440) - b.startMinute)) / 60, 0);
  return `${total.toFixed(1)} U of basal a day`;
}

/** Targets: a lower and an upper end for each block. */
export function TargetFields({ rows, unit }: Readonly<{ rows: number; unit: string }>) {
  const [count, setCount] = useState(rows);
  return (
    <>
      <fieldset className="mt-2">
        <legend className="font-serif text-section">Blocks</legend>
        {Array.from({ length: count }, (_, i) => (
          <div key={i} className="flex flex-wrap items-end gap-x-6 border-b border-hairline pb-3">
            <TextField name={`blocks.${i}.from`} label={`From ${i + 1}`} size={6} inputMode="numeric" />
            <TextField name={`blocks.${i}.low`} label={`Lower end ${i + 1}`} suffix={unit} inputMode="decimal" />
            <TextField name={`blocks.${i}.high`} label={`Upper end ${i + 1}`} suffix={unit} inputMode="decimal" />
          </div>
        ))}
      </fieldset>
      <div className="mt-4">
        <Button kind="other" type="button" onClick={() => setCount(count + 1)}>Add a block</Button>
      </div>
    </>
  );
}
