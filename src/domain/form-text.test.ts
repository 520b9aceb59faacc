import { describe, expect, it } from "vitest";
import { z } from "zod";
import { decimal, listOf, optionalDecimal, readDecimal, tick, timeOfDay } from "./form-text";

const units = { min: 0, max: 10, unit: "U" };

describe("typed numbers", () => {
  it.each([["5,6", 5.6], [" 5.6 mmol/L", 5.6], ["0,55 U/h", 0.55], ["５．６", 5.6], ["17 g/U", 17], ["0,125", 0.125], ["60 mg/dL per U", 60]])("reads %j as %s", (typed, value) => {
    expect(readDecimal(typed)).toBe(value);
  });

  it.each(["", "many", "1,234", "1.2.3", "5 6 x 7"])("says in words why %j can’t be read", (typed) => {
    expect(typeof readDecimal(typed)).toBe("string");
  });

  it("keeps to its bounds, and says them", () => {
    expect(decimal(units).safeParse("11").error?.issues[0]?.message).toBe("Type a number between 0 and 10 U.");
  });
});

describe("what a browser leaves out", () => {
  it("takes an absent checkbox as no, an absent group as none, an absent number as none", () => {
    const form = z.object({ isTold: tick, scopes: listOf(["a", "b"]), limit: optionalDecimal(units) });
    expect(form.parse({})).toEqual({ isTold: false, scopes: [], limit: null });
    expect(form.parse({ isTold: "on", scopes: "a", limit: "" })).toEqual({ isTold: true, scopes: ["a"], limit: null });
  });
});

describe("timeOfDay", () => {
  it.each([["00:00", 0], ["6.30", 390], ["０６：３０", 390], ["23:59", 1439]])("reads %s", (typed, minute) => expect(timeOfDay.parse(typed)).toBe(minute));
  it.each(["24:00", "12:60", "noon"])("refuses %s", (typed) => expect(timeOfDay.safeParse(typed).success).toBe(false));
});
