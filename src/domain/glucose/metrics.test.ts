import { describe, expect, it } from "vitest";
import { toMetricReading } from "./metric-reading";
import { metricsOf } from "./metrics";

const STEP_MS = 300_000;
const every5 = (n: number, mgDlAt: (i: number) => number, startMs = Date.UTC(2026, 2, 1)) =>
  Array.from({ length: n }, (_, i) => toMetricReading({ atMs: startMs + i * STEP_MS, value: mgDlAt(i), unit: "mg/dL", glucoseMgDl: mgDlAt(i) }));

describe("metricsOf", () => {
  it("gives null and a reason for each figure without a reading", () => {
    const { from, to, readings, days, reasons, ...figures } = metricsOf([], "UTC");
    expect({ from, to, readings, days }).toEqual({ from: null, to: null, readings: 0, days: 0 });
    expect(Object.values(figures).every((figure) => figure === null)).toBe(true);
    expect(Object.keys(reasons).toSorted()).toEqual(Object.keys(figures).toSorted());
    expect(new Set(Object.values(reasons))).toEqual(new Set(["no-readings"]));
  });

  it("holds GMI back below ten days and the profile below five", () => {
    const nine = metricsOf(every5(9 * 288, () => 154), "UTC");
    expect(nine).toMatchObject({ days: 9, gmiPercent: null, reasons: { gmiPercent: "too-few-days" } });
    expect(nine.percentiles).toHaveLength(96);
    expect(metricsOf(every5(10 * 288, () => 154), "UTC").gmiPercent).toBeCloseTo(6.99368, 8);
    expect(metricsOf(every5(4 * 288, () => 154), "UTC").reasons.percentiles).toBe("too-few-days");
  });

  it("counts a whole day of 23 hours as fully active", () => {
    const metrics = metricsOf(every5(23 * 12, () => 100, Date.parse("2026-03-28T23:00:00Z")), "Europe/Oslo");
    expect(metrics).toMatchObject({ days: 1, sensorActiveFraction: 1 });
  });

  it("lets time without readings lower the active share of the span asked for", () => {
    const span = { fromMs: Date.UTC(2026, 2, 1), toMs: Date.UTC(2026, 2, 15) };
    const metrics = metricsOf(every5(8 * 288, () => 100), "UTC", { span: { ...span, fromMs: Date.UTC(2026, 2, 2) } });
    expect(metrics).toMatchObject({ from: "2026-03-02T00:00:00.000Z", to: "2026-03-15T00:00:00.000Z", readings: 7 * 288, days: 7 });
    expect(metrics.sensorActiveFraction).toBeCloseTo(7 / 13, 10);
    expect(metricsOf(every5(14 * 288, () => 100), "UTC", { span }).sensorActiveFraction).toBe(1);
  });

  it("has one reason per null figure, and none for the rest, in a short span", () => {
    const metrics = metricsOf(every5(12, (i) => 100 + i), "UTC");
    const nulls = Object.entries(metrics).filter(([, value]) => value === null).map(([name]) => name);
    expect(Object.keys(metrics.reasons).toSorted()).toEqual(nulls.toSorted());
  });

  it("does not depend on the order of the readings", () => {
    const readings = every5(600, (i) => 120 + 60 * Math.sin(i / 40));
    expect(metricsOf(readings.toReversed(), "UTC")).toEqual(metricsOf(readings, "UTC"));
  });
});
