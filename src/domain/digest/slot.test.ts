import { Temporal } from "@js-temporal/polyfill";
import { describe, expect, it } from "vitest";
import { isSlotDue, latestSlot } from "./slot";

const MONDAY_AT_EIGHT = { weekday: 1, minuteOfDay: 480 };
const at = (text: string) => Temporal.Instant.from(text).epochMilliseconds;

describe("latestSlot", () => {
  it("is this Monday at eight, counted by hand in Oslo (UTC+1)", () => {
    expect(latestSlot(at("2026-03-09T07:00:00Z"), "Europe/Oslo", MONDAY_AT_EIGHT)).toEqual({
      isoWeek: "2026-W11", atMs: at("2026-03-09T07:00:00Z"), on: "2026-03-09",
    });
  });

  it("is last Monday until a minute before", () => {
    expect(latestSlot(at("2026-03-09T06:59:00Z"), "Europe/Oslo", MONDAY_AT_EIGHT)).toMatchObject({ isoWeek: "2026-W10", atMs: at("2026-03-02T07:00:00Z") });
  });

  it("keeps to the wall clock when summer time begins", () => {
    expect(latestSlot(at("2026-03-30T12:00:00Z"), "Europe/Oslo", MONDAY_AT_EIGHT).atMs).toBe(at("2026-03-30T06:00:00Z"));
  });

  it("takes the moment after a skipped hour and the first of a doubled one (New York, Sundays)", () => {
    const sunday = { weekday: 7, minuteOfDay: 150 };
    expect(latestSlot(at("2026-03-08T23:00:00Z"), "America/New_York", sunday).atMs).toBe(at("2026-03-08T07:30:00Z"));
    const doubled = { weekday: 7, minuteOfDay: 90 };
    expect(latestSlot(at("2026-11-01T23:00:00Z"), "America/New_York", doubled).atMs).toBe(at("2026-11-01T05:30:00Z"));
  });

  it("names the ISO week, not the calendar year (3 January 2027 is in 2026-W53)", () => {
    expect(latestSlot(at("2027-01-03T12:00:00Z"), "UTC", { weekday: 7, minuteOfDay: 0 }).isoWeek).toBe("2026-W53");
  });
});

describe("isSlotDue", () => {
  const now = at("2026-03-09T09:00:00Z");
  const slot = latestSlot(now, "UTC", MONDAY_AT_EIGHT);

  it("is due when nothing was sent yet", () => expect(isSlotDue(slot, now, null, 0)).toBe(true));
  it("is not due twice", () => expect(isSlotDue(slot, now, "2026-W11", 0)).toBe(false));
  it("is not due again after a move to an earlier zone", () => expect(isSlotDue(slot, now, "2026-W12", 0)).toBe(false));
  it("is not due for somebody who came after it", () => expect(isSlotDue(slot, now, null, now - 60_000)).toBe(false));
  it("is caught up with for three days, and then left out", () => {
    expect(isSlotDue(slot, slot.atMs + 72 * 3_600_000, null, 0)).toBe(true);
    expect(isSlotDue(slot, slot.atMs + 72 * 3_600_000 + 1, null, 0)).toBe(false);
  });

  it.each([
    ["Europe/Oslo", MONDAY_AT_EIGHT],
    ["America/New_York", { weekday: 7, minuteOfDay: 150 }],
    ["Australia/Lord_Howe", { weekday: 7, minuteOfDay: 120 }],
    ["America/St_Johns", { weekday: 3, minuteOfDay: 0 }],
    ["Africa/Cairo", { weekday: 5, minuteOfDay: 15 }],
    ["Pacific/Auckland", { weekday: 7, minuteOfDay: 1439 }],
  ])("serves 52 weeks in %s once each, on the chosen wall time, whatever the clock does", (zone, choice) => {
    const first = latestSlot(at("2026-01-05T00:00:00Z"), zone, choice).atMs;
    const served: string[] = [];
    let last: string | null = null;
    for (let hour = 0; hour < 52 * 7 * 24; hour += 3) {
      const nowMs = first + hour * 3_600_000;
      const due = latestSlot(nowMs, zone, choice);
      if (!isSlotDue(due, nowMs, last, 0)) continue;
      served.push(due.isoWeek);
      last = due.isoWeek;
      const wall = Temporal.Instant.fromEpochMilliseconds(due.atMs).toZonedDateTimeISO(zone);
      expect(wall.dayOfWeek).toBe(choice.weekday);
      expect(Math.abs(wall.hour * 60 + wall.minute - choice.minuteOfDay)).toBeLessThanOrEqual(60);
    }
    expect(served).toHaveLength(52);
    expect(new Set(served).size).toBe(52);
  }, 60_000);
});
