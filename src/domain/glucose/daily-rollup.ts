import { civilOf, minutesInCivilDay } from "@/domain/civil-time";

/** Whole mg/dL from 0 to this and above are counted one by one. */
const HIGHEST_BIN = 600;
const NIGHT_MINUTES = 360;
const USUAL_INTERVAL_MINUTES = 5;

export type DayRollup = {
  dayNumber: number;
  part: "day" | "night";
  readings: number;
  sumMgDl: number;
  sumSquares: number;
  /** Very low, low, in range, high, very high. */
  bandCounts: number[];
  /** Counts per whole mg/dL, up to the last one that occurs. */
  histogram: number[];
  /** Real minutes of the civil day (23, 24 or 25 h) or of its 00:00-06:00. */
  minutesInPart: number;
  intervalMinutes: number;
};

type Reading = Readonly<{ atMs: number; glucoseMgDl: number; band: number }>;

/**
 * Figures of each civil day, and of its 00:00-06:00, that can be added up: a
 * page of a year never touches raw readings.
 *
 * @param readings of one source, in order of time
 * @param zone     the journal's IANA zone
 */
export function rollUp(readings: ReadonlyArray<Reading>, zone: string): DayRollup[] {
  const intervalMinutes = usualInterval(readings);
  const rows = new Map<string, DayRollup>();
  for (const { atMs, glucoseMgDl, band } of readings) {
    const { dayNumber, minuteOfDay } = civilOf(atMs, zone);
    for (const part of minuteOfDay < NIGHT_MINUTES ? (["day", "night"] as const) : (["day"] as const)) {
      const key = `${part}${dayNumber}`;
      let row = rows.get(key);
      if (!row) rows.set(key, (row = emptyRow(dayNumber, part, zone, intervalMinutes)));
      row.readings += 1;
      row.sumMgDl += glucoseMgDl;
      row.sumSquares += glucoseMgDl ** 2;
      row.bandCounts[band] = (row.bandCounts[band] ?? 0) + 1;
      const bin = Math.min(HIGHEST_BIN, Math.max(0, Math.round(glucoseMgDl)));
      while (row.histogram.length <= bin) row.histogram.push(0);
      row.histogram[bin] = (row.histogram[bin] ?? 0) + 1;
    }
  }
  return [...rows.values()].toSorted((a, b) => a.dayNumber - b.dayNumber || (a.part < b.part ? -1 : 1));
}

function emptyRow(dayNumber: number, part: "day" | "night", zone: string, intervalMinutes: number): DayRollup {
  const minutes = minutesInCivilDay(dayNumber, zone);
  return {
    dayNumber, part, readings: 0, sumMgDl: 0, sumSquares: 0, bandCounts: [0, 0, 0, 0, 0], histogram: [],
    minutesInPart: part === "day" ? minutes.day : minutes.night, intervalMinutes,
  };
}

/** The rounded middle of the gaps between neighbours, 1 to 30 minutes. */
function usualInterval(readings: ReadonlyArray<Reading>): number {
  const gaps = readings.slice(1).map((r, i) => Math.round((r.atMs - (readings[i]?.atMs ?? r.atMs)) / 60_000)).toSorted((a, b) => a - b);
  const middle = gaps[Math.floor(gaps.length / 2)] ?? USUAL_INTERVAL_MINUTES;
  return Math.min(30, Math.max(1, middle));
}
