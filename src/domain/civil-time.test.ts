import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { civilOf } from "./civil-time";
import { dayNumberOf } from "./day-start";
import { localOfInstant } from "./local-time";

describe("civilOf", () => {
  it("knows the hour that Oslo shows twice", () => {
    expect(civilOf(Date.parse("2026-10-25T00:30:00Z"), "Europe/Oslo").minuteOfDay).toBe(150);
    expect(civilOf(Date.parse("2026-10-25T01:30:00Z"), "Europe/Oslo").minuteOfDay).toBe(150);
  });

  it("agrees with the calendar package in zones of whole, half and odd offsets", () => {
    const zones = ["Europe/Oslo", "America/St_Johns", "Australia/Lord_Howe", "Asia/Kathmandu", "UTC"];
    fc.assert(
      fc.property(fc.integer({ min: Date.UTC(2015, 0, 1), max: Date.UTC(2035, 0, 1) }), fc.constantFrom(...zones), (ms, zone) => {
        const local = localOfInstant(new Date(ms), zone);
        expect(civilOf(ms, zone)).toEqual({
          dayNumber: dayNumberOf(local.slice(0, 10)),
          minuteOfDay: Number(local.slice(11, 13)) * 60 + Number(local.slice(14, 16)),
        });
      }),
      { numRuns: 2000 },
    );
  });
});
