import { describe, expect, it } from "vitest";
import { addDays, dayNumberOf, dayStart } from "./day-start";

describe("dayStart", () => {
  it.each([
    ["2026-03-29", "Europe/Oslo", 0, "2026-03-28T23:00:00.000Z"],
    ["2026-03-29", "Europe/Oslo", 1, "2026-03-29T22:00:00.000Z"],
    ["2026-03-10", "America/St_Johns", -1, "2026-03-09T02:30:00.000Z"],
    ["2026-04-24", "Africa/Cairo", 0, "2026-04-23T22:00:00.000Z"],
  ])("%s in %s, %i days on, begins at %s", (date, zone, on, instant) => {
    expect(dayStart(date, zone, on).toISOString()).toBe(instant);
  });

  it("goes on and back over the end of a month", () => {
    expect(addDays("2026-02-27", 3)).toBe("2026-03-02");
    expect(addDays("2026-03-02", -7)).toBe("2026-02-23");
  });

  it("counts days from 1970", () => {
    expect(dayNumberOf("1970-01-02")).toBe(1);
    expect(dayNumberOf("2026-03-10")).toBe(20_522);
  });
});
