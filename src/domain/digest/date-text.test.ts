import { describe, expect, it } from "vitest";
import { dateText, longDateText, momentText } from "./date-text";

describe("dates in words", () => {
  it("names a date without and with its year", () => {
    expect(dateText("2026-03-09")).toBe("Monday 9 March");
    expect(longDateText("2027-01-01")).toBe("1 January 2027");
  });

  it("reads an instant on the clock of its zone", () => {
    const at = new Date("2026-03-09T23:05:00Z");
    expect(momentText(at, "Europe/Oslo")).toBe("Tuesday 10 March, 00:05");
    expect(momentText(at, "UTC")).toBe("Monday 9 March, 23:05");
  });
});
