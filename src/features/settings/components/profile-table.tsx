import { clockText } from "@/domain/settings/clock-text";
import { settingValueText } from "@/domain/settings/difference-text";
import type { SettingsProfile } from "@/domain/settings/profile";
import type { GlucoseUnit } from "@/domain/units";

type Row = { from: string; values: string[] };

/** A whole profile as tables by block, values right-aligned. */
export function ProfileTable({ profile, unit }: Readonly<{ profile: SettingsProfile; unit: GlucoseUnit }>) {
  const text = (family: "basal" | "carbRatio" | "sensitivity" | "target", field: Parameters<typeof settingValueText>[0]["field"], value: number) =>
    settingValueText({ family, field }, value, unit);
  const groups: { title: string; rows: Row[] }[] = [
    { title: "Basal rate", rows: profile.basal.map((b) => ({ from: clockText(b.startMinute), values: [text("basal", "milliUnitsPerHour", b.milliUnitsPerHour)] })) },
    { title: "Carb ratio", rows: profile.carbRatio.map((b) => ({ from: clockText(b.startMinute), values: [text("carbRatio", "milligramsPerUnit", b.milligramsPerUnit)] })) },
    { title: "Sensitivity factor", rows: profile.sensitivity.map((b) => ({ from: clockText(b.startMinute), values: [text("sensitivity", "microMgDlPerUnit", b.microMgDlPerUnit)] })) },
    {
      title: "Glucose target",
      rows: profile.target.map((b) => ({ from: clockText(b.startMinute), values: [`${text("target", "lowMgDl", b.lowMgDl)} to ${text("target", "highMgDl", b.highMgDl)}`] })),
    },
  ];
  return (
    <div className="max-w-text desk:grid desk:grid-cols-2 desk:gap-x-8">
      {groups.map(({ title, rows }) => (
        <table key={title} className="table mt-4 self-start">
          <caption className="text-left font-semibold">{title}</caption>
          <thead className="sr-only">
            <tr><th scope="col">From</th><th scope="col">Value</th></tr>
          </thead>
          <tbody>
            {rows.map(({ from, values }) => (
              <tr key={from}>
                <th scope="row" className="font-normal text-soft">{from}</th>
                <td className="number">{values.join(" ")}</td>
              </tr>
            ))}
          </tbody>
        </table>
      ))}
      <p className="mt-4 text-note text-soft">
        Duration of insulin action {Math.round((profile.durationOfActionMinutes / 60) * 10) / 10} h.
        {profile.limits.maxBolusMilliUnits === null ? "" : ` Largest bolus ${profile.limits.maxBolusMilliUnits / 1000} U.`}
        {profile.limits.maxBasalMilliUnitsPerHour === null ? "" : ` Largest basal rate ${(profile.limits.maxBasalMilliUnitsPerHour / 1000).toFixed(2)} U/h.`}
        {profile.features.map(({ label, value }) => ` ${label}: ${typeof value === "boolean" ? (value ? "on" : "off") : String(value)}.`)}
      </p>
    </div>
  );
}
