import { civilOf } from "@/domain/civil-time";
import { countEpisodes, type Episodes } from "./episodes";
import { toGrid } from "./grid";
import { meanAmplitude } from "./mage";
import type { MetricReading } from "./metric-reading";
import { percentileProfile, type ProfileStep } from "./percentiles";
import { bloodGlucoseRisk, glycemiaRisk, type GriZone } from "./risk";
import { sensorActive, type Span } from "./sensor-active";
import { summarise, type Summary } from "./summary";
import { conga, meanOfDailyDifferences } from "./variability";

/** Why a figure is null. */
export type MissingReason = "no-readings" | "one-reading" | "too-few-days" | "no-pair-a-day-apart" | "no-swing";

export type Metrics = { [K in keyof Summary]: Summary[K] | null } & {
  from: string | null;
  to: string | null;
  readings: number;
  /** Civil days with at least one reading. */
  days: number;
  sensorActiveFraction: number | null;
  gri: number | null;
  griZone: GriZone | null;
  lbgi: number | null;
  hbgi: number | null;
  modd: number | null;
  mage: number | null;
  conga: number | null;
  episodes: Episodes | null;
  percentiles: ProfileStep[] | null;
  /** A reason for each figure that is null. */
  reasons: Partial<Record<string, MissingReason>>;
};

/** GMI is shown from this many days (Bergenstal 2018: 10 to 14, from memory). */
const GMI_DAYS = 10;

const NO_SUMMARY = {
  meanMgDl: null, sdMgDl: null, cvFraction: null, gmiPercent: null, veryLowFraction: null, lowFraction: null,
  inRangeFraction: null, highFraction: null, veryHighFraction: null, tightRangeFraction: null,
};

/**
 * Every figure of a span of readings in one object; a figure that the readings
 * cannot carry is null and has its reason in `reasons`.
 *
 * @param unordered readings of one source, mg/dL
 * @param zone      the journal's IANA zone
 * @param span      what was asked for, `toMs` left out: readings outside it are
 *                  not counted, and time without readings lowers the active
 *                  share; without one, from the first reading to the last
 * @param gmiDays   days GMI is held back for; 0 only to check the arithmetic
 */
export function metricsOf(
  unordered: ReadonlyArray<MetricReading>,
  zone: string,
  { span, gmiDays = GMI_DAYS }: Readonly<{ span?: Span; gmiDays?: number }> = {},
): Metrics {
  const readings = unordered
    .filter((r) => !span || (r.atMs >= span.fromMs && r.atMs < span.toMs))
    .toSorted((a, b) => a.atMs - b.atMs);
  const days = new Set(readings.map((r) => civilOf(r.atMs, zone).dayNumber)).size;
  const summary = summarise(readings);
  const grid = toGrid(readings, zone);
  const risk = summary && glycemiaRisk(summary);
  const figures = {
    sensorActiveFraction: grid && sensorActive(readings, grid.intervalMinutes, span),
    ...(summary ?? NO_SUMMARY),
    ...(days < gmiDays ? { gmiPercent: null } : {}),
    gri: risk?.gri ?? null,
    griZone: risk?.griZone ?? null,
    ...(bloodGlucoseRisk(readings.map((r) => r.glucoseMgDl)) ?? { lbgi: null, hbgi: null }),
    modd: grid && meanOfDailyDifferences(grid),
    mage: grid && meanAmplitude(grid),
    conga: grid && conga(grid),
    episodes: grid && countEpisodes(grid),
    percentiles: percentileProfile(readings, zone),
  };
  const iso = (atMs: number | undefined) => (atMs === undefined ? null : new Date(atMs).toISOString());
  const from = iso(span?.fromMs ?? readings[0]?.atMs);
  const to = iso(span?.toMs ?? readings.at(-1)?.atMs);
  return { from, to, readings: readings.length, days, ...figures, reasons: reasonsFor(figures, readings.length) };
}

const OWN_REASON: Record<string, MissingReason> = {
  gmiPercent: "too-few-days", percentiles: "too-few-days", mage: "no-swing", modd: "no-pair-a-day-apart", conga: "no-pair-a-day-apart",
};

function reasonsFor(figures: Record<string, unknown>, readings: number): Metrics["reasons"] {
  const missing = Object.keys(figures).filter((name) => figures[name] === null);
  return Object.fromEntries(missing.map((name) => [name, readings === 0 ? "no-readings" : (OWN_REASON[name] ?? "one-reading")]));
}
