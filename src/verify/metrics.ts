import { toMetricReading } from "@/domain/glucose/metric-reading";
import { metricsOf } from "@/domain/glucose/metrics";
import { numberIn, printRows, readRows } from "./csv-file";

type Row = { id: string; metric: string; value: string | number | null };

/**
 * Recompute the figures of every person in a file of `id,time,gl` (mg/dL,
 * times read as UTC). GMI is printed however short the span, so that the
 * arithmetic can be checked; a journal holds it back below ten days.
 */
export function figuresOf(rows: Record<string, string>[]): Row[] {
  const people = new Map<string, Record<string, string>[]>();
  for (const row of rows) {
    const own = people.get(row.id ?? "");
    if (own) own.push(row);
    else people.set(row.id ?? "", [row]);
  }
  return [...people].flatMap(([id, own]) => {
    const readings = own.map((row) => {
      const glucoseMgDl = numberIn(row, "gl");
      return toMetricReading({ atMs: utcMs(row.time ?? ""), value: glucoseMgDl, unit: "mg/dL", glucoseMgDl });
    });
    return flatten(metricsOf(readings, "UTC", { gmiDays: 0 })).map(([metric, value]) => ({ id, metric, value }));
  });
}

/** @throws {Error} when the text is no time */
function utcMs(time: string): number {
  const atMs = Date.parse(/(Z|[+-]\d\d:?\d\d)$/.test(time) ? time : `${time.replace(" ", "T")}${time.includes(":") ? "" : "T00:00:00"}Z`);
  if (Number.isNaN(atMs)) throw new Error(`column time: "${time}" is not a time`);
  return atMs;
}

/** Nested fields get a dot; the steps of the percentile profile are named by their minute. */
function flatten(value: unknown, name = ""): [string, string | number | null][] {
  if (value === undefined) return [];
  if (value === null || typeof value === "number" || typeof value === "string") return [[name, value]];
  const entries = Array.isArray(value)
    ? value.map(({ minute, ...rest }: { minute: number }) => [String(minute), rest] as const)
    : Object.entries(value);
  return entries.flatMap(([key, inner]) => flatten(inner, name ? `${name}.${key}` : key));
}

export function run([file]: string[]): Promise<void> {
  if (!file) throw new Error("metrics needs FILE.csv with the columns id,time,gl");
  printRows(["id", "metric", "value"], figuresOf(readRows(file)));
  return Promise.resolve();
}
