import { parse } from "csv-parse/sync";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { PARSER_OPTIONS } from "./dialect";
import { previewCsv, type CsvPreview } from "./preview";
import { RowMapper, type CsvMapping, type MappedReading } from "./row-mapper";

const bytesOf = (text: string) => new TextEncoder().encode(text);

function read(bytes: Uint8Array, choice: Partial<CsvMapping> = {}) {
  const preview = previewCsv(bytes);
  if (typeof preview === "string") throw new Error(preview);
  const mapping = mappingOf(preview, choice);
  const mapper = new RowMapper(mapping);
  const text = new TextDecoder(mapping.encoding).decode(bytes);
  const rows: string[][] = parse(text, { ...PARSER_OPTIONS, delimiter: mapping.delimiter });
  const outcomes = rows.slice(mapping.headerRow + 1).map((row, i) => mapper.map(row, i + 1));
  return { preview, outcomes, readings: outcomes.flatMap((o): MappedReading[] => ("reading" in o ? [o.reading] : [])) };
}

function mappingOf(p: CsvPreview, choice: Partial<CsvMapping>): CsvMapping {
  return {
    ...p, unit: p.unit === "ask" ? "mg/dL" : p.unit, dateOrder: p.dateOrder === "ask" ? "day-first" : p.dateOrder,
    subject: null, timeZone: "UTC", shiftMinutes: 0, ...choice,
  };
}

function utf16(text: string, isBigEndian: boolean): Uint8Array {
  const bytes = new Uint8Array(text.length * 2);
  [...text].forEach((c, i) => new DataView(bytes.buffer).setUint16(i * 2, c.charCodeAt(0), !isBigEndian));
  return bytes;
}

describe("delimited glucose files", () => {
  it("passes over a preamble and keeps LOW and HIGH as bounds", () => {
    const { preview, readings } = read(bytesOf("Export of a device\nmade today\nTime,Glucose (mg/dL)\n2026-03-01 08:00,120\n2026-03-01 08:05,LOW\n2026-03-01 08:10,>400\n"));
    expect(preview).toMatchObject({ headerRow: 2, timeColumn: 0, glucoseColumn: 1, unit: "mg/dL", delimiter: "," });
    expect(readings.map((r) => [r.glucoseMgDl, r.bound, r.band])).toEqual([[120, null, 2], [40, "below", 0], [400, "above", 4]]);
  });

  it("is not fooled by decimal commas", () => {
    const { preview, readings } = read(bytesOf("Zeit;Glukose mmol/L\n27.10.2024 12:30;5,6\n27.10.2024 12:35;10,0\n28.10.2024 00:10;3,8\n"));
    expect(preview).toMatchObject({ delimiter: ";", unit: "mmol/L", dateOrder: "day-first" });
    expect(readings.map((r) => r.band)).toEqual([2, 2, 1]);
  });

  it("asks when nothing tells day from month, or one unit from the other", () => {
    expect(previewCsv(bytesOf("time,glucose\n03/04/2024 10:00,25\n03/04/2024 10:05,30\n"))).toMatchObject({ dateOrder: "ask", unit: "ask" });
  });

  it("joins a date column with a time column", () => {
    expect(read(bytesOf("Date,Time,Glucose mg/dL\n2026-03-01,08:00,120\n2026-03-01,08:05,125\n")).readings.map((r) => new Date(r.atMs).toISOString())).toEqual([
      "2026-03-01T08:00:00.000Z", "2026-03-01T08:05:00.000Z",
    ]);
  });

  it("reads twelve-hour clocks, epochs and spreadsheet days", () => {
    const at = (text: string) => read(bytesOf(`time,glucose mg/dL\n${text},120\n${text},120\n`)).readings.map((r) => new Date(r.atMs).toISOString().slice(0, 16));
    expect(at("03/27/2024 1:05 PM")).toEqual(["2024-03-27T13:05"]);
    expect(at("1711544700")).toEqual(["2024-03-27T13:05"]);
    expect(at("45378.5451388889")).toEqual(["2024-03-27T13:05"]);
  });

  it("tells the two passes of a repeated hour by the order of rows", () => {
    const rows = ["02:50", "02:55", "02:00", "02:05"].map((t) => `2024-10-27 ${t},120`);
    const { readings } = read(bytesOf(`time,glucose mg/dL\n2024-10-27 01:55,120\n${rows.join("\n")}\n`), { timeZone: "Europe/Oslo" });
    expect(readings.map((r) => new Date(r.atMs).toISOString().slice(11, 16))).toEqual(["23:55", "00:50", "00:55", "01:00", "01:05"]);
  });

  it("takes one person out of a file of several", () => {
    const { preview, readings, outcomes } = read(bytesOf("id,time,gl\nA,2015-06-06 16:50:27,153\nB,2015-06-06 16:50:27,90\nA,2015-06-06 16:55:27,150\n"), { subject: "A" });
    expect(preview.subjects).toEqual(["A", "B"]);
    expect(readings).toHaveLength(2);
    expect(outcomes.filter((o) => "passedOver" in o)).toHaveLength(1);
  });

  it("reads the same rows from 48 spellings of one trace", () => {
    const mgdl = [[120, 6.7], [71, 3.9], [250, 13.9]] as const;
    const spelled = (delimiter: string, mark: string, unit: "mg/dL" | "mmol/L") =>
      [`Time${delimiter}Glucose ${unit}`, ...mgdl.map(([a, b], i) => `2026-03-01 08:0${i}${delimiter}${(unit === "mg/dL" ? a.toFixed(1) : b.toFixed(1)).replace(".", mark)}`)].join("\r\n");
    let spellings = 0;
    for (const unit of ["mg/dL", "mmol/L"] as const) {
      const tables = [];
      for (const delimiter of [";", "\t", "|", ","]) {
        for (const mark of [".", ","]) {
          if (delimiter === "," && mark === ",") continue;
          const text = spelled(delimiter, mark, unit);
          for (const bytes of [bytesOf(text), bytesOf(`\ufeff${text}`), utf16(text, false), utf16(`\ufeff${text}`, true)]) {
            tables.push(read(bytes).readings.map((r) => [r.atMs, r.sourceValue]));
            spellings += 1;
          }
        }
      }
      for (const table of tables) expect(table).toEqual(tables[0]);
    }
    expect(spellings).toBeGreaterThanOrEqual(48);
  });

  it.each([
    [new Uint8Array([0x89, 0x50, 0x4e, 0x47, 1, 2]), "picture"],
    [new Uint8Array(), "empty"],
    [bytesOf("hello\nworld\n"), "No column"],
  ])("says in words why a file is none", (bytes, words) => expect(previewCsv(bytes)).toContain(words));

  it("never throws on broken files, and every row has one outcome", () => {
    const good = "time,glucose mg/dL\n" + Array.from({ length: 20 }, (_, i) => `2026-03-01 08:${String(i).padStart(2, "0")},${100 + i}`).join("\n");
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.nat(good.length), fc.string({ maxLength: 4 })), { maxLength: 8 }), (edits) => {
        const text = edits.reduce((t, [at, piece]) => t.slice(0, at) + piece + t.slice(at + piece.length), good);
        const preview = previewCsv(bytesOf(text));
        if (typeof preview === "string") return;
        const mapper = new RowMapper(mappingOf(preview, {}));
        for (const line of text.split("\n")) expect(Object.keys(mapper.map(line.split(","), 1))).toHaveLength(1);
      }),
      { numRuns: 1000 },
    );
  }, 60_000);
});
