import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { findSettingNumber } from "./setting-number";

describe("findSettingNumber", () => {
  it.each([
    "Mine is 0.55 U/h at night.",
    "I would go to 0,6 u/h.",
    "4 U did it for me.",
    "Use 2 units.",
    "half a unit was enough",
    "two units with lunch",
    "12 g/U at breakfast",
    "15 g per unit",
    "12 grams of carbs per unit",
    "50 mg/dL per U in the afternoon",
    "3.2 mmol/L per unit",
    "Change the ratio to 12.",
    "a target of 110 was fine",
    "Put the basal rate up by 10%.",
    "ten percent more basal",
    "Make the ratio 1:15.",
    "０.５ Ｕ/ｈ",
    "0.5\u200bU",
  ])("stops %j", (text) => expect(findSettingNumber(text)).not.toBeNull());

  it.each([
    "What was different on day 5?",
    "You were 70% in range with the new basal rate.",
    "12% of the day was low after the basal change.",
    "How many days have you waited, 2 or 3?",
    "Was the dose 15 minutes before the meal?",
    "Did it happen at 03:00 on both nights?",
    "Is version 3 the one with the new ratio?",
    "I had 2 understanding friends and 3 uncles.",
    "80% of people I met felt tired in week 1.",
    "Glucose was 180 mg/dL (10.0 mmol/L) at noon.",
    "",
  ])("lets %j through", (text) => expect(findSettingNumber(text)).toBeNull());

  it("stops any number with an insulin unit, however it is spaced and cased", () => {
    const unit = fc.constantFrom("U", "u", "units", "Unit", "U/h", "g/U", "g / U", "mg/dL per U", "mmol/L per unit");
    const gap = fc.constantFrom("", " ", "\u00a0", "\n");
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 999 }), fc.nat(99), unit, gap, fc.boolean(), (whole, part, u, space, isDecimal) => {
        const number = isDecimal ? `${whole}.${part}` : String(whole);
        expect(findSettingNumber(`I had ${number}${space}${u} then.`)).not.toBeNull();
      }),
    );
  });
});
