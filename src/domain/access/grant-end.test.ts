import { describe, expect, it } from "vitest";
import { grantEnd } from "./grant-end";

describe("grantEnd", () => {
  const now = new Date("2026-03-10T22:30:00Z");

  it("lasts to the end of the last day on the journal's clock", () => {
    expect(grantEnd("2026-03-28", "Europe/Oslo", now)).toEqual(new Date("2026-03-28T23:00:00Z"));
    expect(grantEnd("2026-03-29", "Europe/Oslo", now)).toEqual(new Date("2026-03-29T22:00:00Z"));
  });

  it("has no end where none is given", () => expect(grantEnd(null, "UTC", now)).toBeNull());

  it("takes today and refuses yesterday, by the journal's clock", () => {
    expect(grantEnd("2026-03-10", "Europe/Oslo", now)).toEqual(new Date("2026-03-10T23:00:00Z"));
    expect(() => grantEnd("2026-03-10", "Pacific/Auckland", now)).toThrow(expect.objectContaining({ code: "INVALID_INPUT", fields: { until: [expect.any(String)] } }));
  });
});
