import { Trace } from "@/components/charts/trace";
import { entryMark } from "@/domain/journal/entry-text";
import { mgDlToMmol } from "@/domain/units";
import type { DayView } from "../queries/days";

/** The day's trace in the journal's unit, with meals and doses in a lane below. */
export function DayTrace({ view }: Readonly<{ view: DayView }>) {
  const unit = view.journal.glucoseUnit;
  const inUnit = (mgDl: number) => (unit === "mg/dL" ? Math.round(mgDl) : Math.round(mgDlToMmol(mgDl) * 10) / 10);
  const marks = view.entries.flatMap(({ minute, data }) => {
    const label = entryMark(data);
    return label === null ? [] : [{ minute, label }];
  });
  if (view.points.length === 0) return <p className="mt-4 text-soft">No glucose of this day yet.</p>;
  return (
    <Trace
      points={view.points.map((p) => ({ minute: p.minute, value: inUnit(p.glucoseMgDl) }))}
      marks={marks}
      low={unit === "mg/dL" ? 70 : 3.9}
      high={unit === "mg/dL" ? 180 : 10}
      unit={unit}
      label={`Glucose of ${view.date}: ${view.points.length} readings, from ${inUnit(Math.min(...view.points.map((p) => p.glucoseMgDl)))} to ${inUnit(Math.max(...view.points.map((p) => p.glucoseMgDl)))} ${unit}`}
    />
  );
}
