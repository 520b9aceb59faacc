import type { KeyboardEvent, MouseEvent } from "react";
import { fieldId } from "@/components/form/error-summary";
import { FieldNotes } from "@/components/form/fields";
import { useFormContext } from "@/components/form/form-state";
import { againstText } from "@/domain/onboarding/against-text";
import { partOfSchedule, stepNeighbours } from "@/domain/onboarding/block-facts";
import { startOfRow, type TypedRow } from "@/domain/onboarding/block-rows";
import { nudged } from "@/domain/onboarding/nudge";
import { readDecimal } from "@/domain/form-text";
import type { BlockPage } from "./block-page";

type Props = Readonly<{
  index: number;
  row: TypedRow;
  rows: ReadonlyArray<TypedRow>;
  page: BlockPage;
  onType: (index: number, name: string, value: string) => void;
  onPress: (event: MouseEvent<HTMLButtonElement>) => void;
}>;

/** One block: its start, its values, what stood there before, and two presses. */
export function BlockRow({ index, row, rows, page, onType, onPress }: Props) {
  const isFirst = index === 0 && startOfRow(row.from) === 0;
  const before = page.previous ? besideRow(row, rows, page) : null;
  const between = page.deviceStep === null ? null : betweenSteps(row.value ?? "", page.deviceStep);
  return (
    <tr>
      <td>
        {isFirst ? <>{row.from}<input type="hidden" name="blocks.0.from" value={row.from} /></> : <Cell name={`blocks.${index}.from`} label={`From ${index + 1}`} value={row.from} width="w-[5.4rem]" onType={(value) => onType(index, "from", value)} />}
      </td>
      {page.fields.map(({ name, label }) => (
        <td key={name}>
          <Cell
            name={`blocks.${index}.${name}`} label={`${page.fields.length === 1 ? "Value" : label} ${index + 1}, ${page.unit}`} value={row[name] ?? ""} width="w-[5.2rem]" isNumber
            onType={(value) => onType(index, name, value)}
            onNudge={(way) => onType(index, name, nudged(row[name] ?? "", page.nudge, way))}
          />
          {between ? <p className="text-note text-soft">Between two steps: {between}</p> : null}
          {before ? <p className="text-note text-soft desk:hidden">now {before.now}{before.difference ? `, ${before.difference}` : ""}</p> : null}
        </td>
      ))}
      {page.previous ? <><td className="number hidden desk:table-cell">{before?.now ?? "–"}</td><td className="number hidden desk:table-cell">{before?.difference ?? "–"}</td></> : null}
      <td className="number">
        <span className="inline-flex flex-wrap justify-end gap-x-4">
          <Press edit={`split.${index}`} word="Cut" label={`Cut block ${index + 1} in two`} onPress={onPress} />
          {index === 0 ? null : <Press edit={`remove.${index}`} word="Remove" label={`Remove block ${index + 1}`} onPress={onPress} />}
        </span>
      </td>
    </tr>
  );
}

function Press({ edit, word, label, onPress }: Readonly<{ edit: string; word: string; label: string; onPress: Props["onPress"] }>) {
  return <button type="submit" name="edit" value={edit} aria-label={label} onClick={onPress} className="link inline-flex min-h-target cursor-pointer items-center text-note">{word}</button>;
}

function Cell({
  name, label, value, width, isNumber = false, onType, onNudge,
}: Readonly<{ name: string; label: string; value: string; width: string; isNumber?: boolean; onType: (value: string) => void; onNudge?: (way: "up" | "down") => void }>) {
  const { errorOf, idPrefix } = useFormContext();
  const error = errorOf(name);
  const id = fieldId(name, idPrefix);
  const onKeyDown = (event: KeyboardEvent) => {
    if (!onNudge || (event.key !== "ArrowUp" && event.key !== "ArrowDown")) return;
    event.preventDefault();
    onNudge(event.key === "ArrowUp" ? "up" : "down");
  };
  return (
    <>
      <input
        id={id} name={name} value={value} aria-label={label} autoComplete="off" inputMode={isNumber ? "decimal" : "text"}
        aria-invalid={error ? true : undefined} aria-describedby={error ? `${id}-error` : undefined}
        onChange={(event) => onType(event.target.value)} onKeyDown={onKeyDown}
        className={`field ${width} ${isNumber ? "text-right" : ""}`}
      />
      <FieldNotes name={name} error={error} />
    </>
  );
}

/** What the previous setup held while this block runs, and how far the new value lies from its mean. */
function besideRow(row: TypedRow, rows: ReadonlyArray<TypedRow>, page: BlockPage): { now: string; difference: string | null } | null {
  const start = startOfRow(row.from);
  if (start === null || !page.previous) return null;
  const end = Math.min(1440, ...rows.flatMap((other) => startOfRow(other.from) ?? []).filter((minute) => minute > start));
  const part = partOfSchedule(page.previous, start, end);
  if (!part) return null;
  const value = readDecimal(row.value ?? "");
  const text = (number: number) => String(Number(number.toFixed(3)));
  return {
    now: part.low === part.high ? text(part.low) : `${text(part.low)} to ${text(part.high)}`,
    difference: typeof value === "string" ? null : againstText(page.family, part.mean, value),
  };
}

function betweenSteps(typed: string, step: number): string | null {
  const value = readDecimal(typed);
  const ends = typeof value === "string" ? null : stepNeighbours(value, step);
  return ends ? `${ends[0]} or ${ends[1]}` : null;
}
