"use client";

import { useEffect, useRef, useState, type MouseEvent } from "react";
import { StepLine } from "@/components/charts/step-line";
import { useFormContext } from "@/components/form/form-state";
import { fieldId } from "@/components/form/error-summary";
import { dayTotalMilli, readableBlocks, type ValueBlock } from "@/domain/onboarding/block-facts";
import { editRows, type RowEdit, type TypedRow } from "@/domain/onboarding/block-rows";
import type { BlockPage } from "./block-page";
import { BlockRow } from "./block-row";

/**
 * The blocks of a day: a start and one or two values each, with the line they
 * draw. Add, cut and remove are buttons that also post, so that the page works
 * without script; with it, the line, the total and the differences follow each key.
 */
export function BlockEditor({ rowCount, page }: Readonly<{ rowCount: number; page: BlockPage }>) {
  const { startOf, setValue, idPrefix } = useFormContext();
  const names = page.fields.map(({ name }) => name);
  const [rows, setRows] = useState<ReadonlyArray<TypedRow>>(() => {
    const start = Array.from({ length: rowCount }, (_, i) => rowOf(names, (name) => startOf(`blocks.${i}.${name}`) ?? ""));
    return start.length > 0 ? start : editRows([], "add", names).rows;
  });
  const [said, setSaid] = useState("");
  const focusNext = useRef<string | null>(null);

  useEffect(() => {
    if (focusNext.current) document.getElementById(focusNext.current)?.focus();
    focusNext.current = null;
  });

  const keep = (after: ReadonlyArray<TypedRow>) => {
    setRows(after);
    setValue("blocks", after);
  };
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    event.preventDefault();
    const { rows: after, focusRow, say }: RowEdit = editRows(rows, event.currentTarget.value, names);
    focusNext.current = fieldId(`blocks.${focusRow}.${focusRow === 0 ? (names[0] ?? "value") : "from"}`, idPrefix);
    setSaid(say);
    keep(after);
  };
  const type = (index: number, name: string, value: string) => keep(rows.map((row, i) => (i === index ? { ...row, [name]: value } : row)));

  return (
    <div>
      <Drawing rows={rows} page={page} />
      {page.isTotalShown ? <p className="mt-2 font-semibold" role="status">{totalText(rows)}</p> : null}
      {/* The button that the Enter key presses: it saves, whatever stands above the form's own. */}
      <button type="submit" tabIndex={-1} aria-hidden="true" className="sr-only">Save</button>
      <table className="table mt-5">
        <caption className="pb-1 text-left font-serif text-section">Blocks</caption>
        <thead>
          <tr>
            <th scope="col">From</th>
            {page.fields.map(({ name, label }) => <th key={name} scope="col">{label}{name === names.at(-1) ? <span className="font-normal text-soft">, {page.unit}</span> : null}</th>)}
            {page.previous ? <><th scope="col" className="number hidden desk:table-cell">Now</th><th scope="col" className="number hidden desk:table-cell">Difference</th></> : null}
            <th scope="col"><span className="sr-only">Change the block</span></th>
          </tr>
        </thead>
        <tbody>{rows.map((row, i) => <BlockRow key={i} index={i} row={row} rows={rows} page={page} onType={type} onPress={press} />)}</tbody>
      </table>
      <p className="sr-only" role="status">{said}</p>
      <div className="mt-4">
        <button type="submit" name="edit" value="add" onClick={press} className="button button-other">Add a block</button>
      </div>
    </div>
  );
}

function rowOf(names: ReadonlyArray<string>, read: (name: string) => string): TypedRow {
  return { ...Object.fromEntries(names.map((name) => [name, read(name)])), from: read("from") };
}

function Drawing({ rows, page }: Readonly<{ rows: ReadonlyArray<TypedRow>; page: BlockPage }>) {
  const [first = "value", second] = page.fields.map(({ name }) => name);
  const current = readableBlocks(rows, first);
  const upper = second ? readableBlocks(rows, second) : undefined;
  const total = (blocks: ReadonlyArray<ValueBlock>) => (page.isTotalShown ? dayTotalMilli(blocks) : null);
  const word = (name: string, blocks: ReadonlyArray<ValueBlock>) => {
    const milli = total(blocks);
    return milli === null ? name : `${name}, ${(milli / 1000).toFixed(1)} U`;
  };
  const isCautious = page.cautious !== null && JSON.stringify(current) === JSON.stringify(page.cautious);
  if (current.length === 0 && !page.previous) return null;
  return (
    <>
      <StepLine
        title={page.title} unit={page.unit} current={current} upper={upper} previous={page.previous} spread={page.spread}
        currentLabel={word(isCautious ? "cautious start" : "your start", current)}
        previousLabel={page.previous ? word("as it is now", page.previous) : ""}
      />
      {page.spread ? <p className="text-note text-soft">Shaded: how far the published rules lie apart, {page.spread.low.toFixed(page.nudge < 1 ? 2 : 1)} to {page.spread.high.toFixed(page.nudge < 1 ? 2 : 1)} {page.unit}.</p> : null}
    </>
  );
}

function totalText(rows: ReadonlyArray<TypedRow>): string {
  const milli = dayTotalMilli(readableBlocks(rows));
  return milli === null ? "The total shows once the first block has a value." : `${(milli / 1000).toFixed(2).replace(/0$/, "")} U of basal a day`;
}
