import type { EntryData } from "./entry";

const DOSE_WORDS: Readonly<Record<string, string>> = {
  meal: "meal dose", correction: "correction", "meal-and-correction": "meal dose and correction", "injected-back-up": "injected back-up", "long-acting": "long-acting",
};

/** An entry in a line, in plain words. */
export function entryText(data: EntryData): string {
  switch (data.kind) {
    case "meal":
      return `${data.label || "Meal"}, ${data.carbohydrateGrams} g${data.speed === "unsure" ? "" : `, ${data.speed}`}`;
    case "dose":
      return data.timing === "missed" ? `Missed: ${DOSE_WORDS[data.doseKind] ?? data.doseKind}` : `${data.milliUnits / 1000} U, ${DOSE_WORDS[data.doseKind] ?? data.doseKind}, ${data.timing}`;
    case "activity":
      return `Activity, ${data.level}, ${data.durationMinutes} min${data.isPlanned ? "" : ", unplanned"}`;
    case "site":
      return `Site: ${data.event.replace("-", " ")}`;
    case "sensor":
      return `Sensor: ${data.event.replaceAll("-", " ")}`;
    case "feeling":
      return `Worn out … fresh ${data.wornOutToFresh}/10, worried … at ease ${data.worriedToAtEase}/10`;
    case "ketones":
      return `Ketones ${(data.ketonesMicroMolPerL / 1000).toFixed(1)} mmol/L`;
    case "note":
      return data.text;
  }
}

/** The same in two words, for a mark under a trace; null for what needs no mark. */
export function entryMark(data: EntryData): string | null {
  if (data.kind === "meal") return `${data.carbohydrateGrams} g`;
  if (data.kind === "dose") return data.timing === "missed" ? "missed" : `${Math.round(data.milliUnits / 100) / 10} U`;
  if (data.kind === "activity") return "moved";
  return null;
}
