import { describe, expect, it } from "vitest";
import type { SettingsProfile } from "@/domain/settings/profile";
import { versionLine } from "./version-line";
import { versionNews, type VersionFacts } from "./version-news";

const profile = (milliUnitsPerHour: number): SettingsProfile => ({
  basal: [{ startMinute: 0, milliUnitsPerHour }],
  carbRatio: [{ startMinute: 0, milligramsPerUnit: 17_000 }],
  sensitivity: [{ startMinute: 0, microMgDlPerUnit: 60_000_000 }],
  target: [{ startMinute: 0, lowMgDl: 120, highMgDl: 130 }],
  durationOfActionMinutes: 240,
  limits: { maxBasalMilliUnitsPerHour: null, maxBolusMilliUnits: null, maxInsulinOnBoardMilliUnits: null },
  features: [],
});

const facts = (given: Partial<VersionFacts> & { number: number }): VersionFacts => ({
  kind: "change", parentNumber: given.number - 1, profile: profile(500), state: "in-effect",
  stateSince: new Date("2026-03-01T00:00:00Z"), effectiveFrom: null, effectiveUntil: null, ...given,
});

const SPAN = { from: new Date("2026-03-09T00:00:00Z"), until: new Date("2026-03-16T00:00:00Z") };
const tuesday = new Date("2026-03-10T23:30:00Z");

describe("versionNews", () => {
  it("tells what went into effect within the span, first moment included and last not", () => {
    const at = (effectiveFrom: Date) => versionNews([facts({ number: 2, effectiveFrom })], SPAN, "UTC").length;
    expect([at(SPAN.from), at(new Date(SPAN.until.getTime() - 1)), at(SPAN.until), at(new Date(SPAN.from.getTime() - 1))]).toEqual([1, 1, 0, 0]);
  });

  it("dates it on the reader's own calendar and says what differs from the version it came from", () => {
    const [news] = versionNews([facts({ number: 2, profile: profile(550), effectiveFrom: tuesday }), facts({ number: 1 })], SPAN, "Europe/Oslo");
    expect(news).toMatchObject({ on: "2026-03-11", families: ["basal"], changes: [{ oldValue: 500, newValue: 550 }] });
  });

  it("tells how a review stands, and not that a version was followed by the next", () => {
    const states = ["proposed", "returned", "declined", "approved", "withdrawn", "superseded", "draft"] as const;
    const told = versionNews(states.map((state, i) => facts({ number: i + 2, state, stateSince: tuesday })), SPAN, "UTC");
    expect(told.map(({ state }) => state)).toEqual(["proposed", "returned", "declined", "approved", "withdrawn"]);
  });
});

describe("versionLine", () => {
  const line = (given: Partial<VersionFacts> & { number: number }, level: "summary" | "full" = "summary") => {
    const [news] = versionNews([facts({ number: 1 }), facts({ stateSince: tuesday, ...given })], SPAN, "UTC").slice(-1);
    if (!news) throw new Error("no news");
    return versionLine(news, level, "mg/dL");
  };

  it.each([
    ["Version 2, the starting profile, went into effect on Tuesday 10 March.", { kind: "starting" as const, parentNumber: null, effectiveFrom: tuesday }],
    ["Version 2 (basal rate) waits for an educator since Tuesday 10 March.", { state: "proposed" as const, profile: profile(550) }],
    ["Version 2 (back to earlier settings: basal rate) went into effect on Tuesday 10 March.", { kind: "undo" as const, profile: profile(550), effectiveFrom: tuesday }],
    ["Version 2 (basal rate) was in effect from Tuesday 10 March to Friday 13 March.", { state: "superseded" as const, profile: profile(550), effectiveFrom: tuesday, effectiveUntil: new Date("2026-03-13T10:00:00Z") }],
    ["Version 2 was approved on Tuesday 10 March and is not in effect yet.", { state: "approved" as const }],
  ])("says %j", (text, given) => expect(line({ number: 2, ...given })).toBe(text));

  it("says old and new values at full only", () => {
    const given = { number: 2, profile: profile(550), effectiveFrom: tuesday };
    expect(line(given, "full")).toContain(": Basal: 0.50 U/h → 0.55 U/h (10% stronger).");
    expect(line(given)).not.toContain("0.5");
  });
});
