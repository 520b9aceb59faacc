import { describe, expect, it } from "vitest";
import { answerLines } from "./answer-lines";

describe("answerLines", () => {
  it("names answers by their questions and leaves empty ones out", () => {
    expect(answerLines("about-you", { weightKg: "80", hypoProne: "no", largestMealBolusUnits: " " }, "mg/dL")).toEqual([{ label: "Weight, kg", value: "80" }, { label: "Lows often", value: "No" }]);
    expect(answerLines("gate", { steroids: "not-sure" }, "mg/dL")).toEqual([{ label: "Are you taking steroids now?", value: "Not sure" }]);
  });

  it("reads rows out with their units, half typed ones too", () => {
    expect(answerLines("basal", { blocks: [{ from: "00:00", value: "0,5" }, null, { from: "", value: "" }, { from: "04:00", value: "" }] }, "mg/dL")).toEqual([{ label: "00:00", value: "0,5 U/h" }, { label: "04:00", value: "–" }]);
    expect(answerLines("targets", { blocks: [{ from: "00:00", low: "6.7", high: "7.2" }] }, "mmol/L")).toEqual([{ label: "00:00", value: "6.7 to 7.2 mmol/L" }]);
    expect(answerLines("limits", { features: [{ label: "Quiet nights", kind: "switch", value: "on" }, { label: "", value: "" }] }, "mg/dL")).toEqual([{ label: "Quiet nights", value: "on" }]);
    expect(answerLines("fallback", { contacts: [{ name: "Bo", phone: "1" }, { name: "", phone: "" }] }, "mg/dL")).toEqual([{ label: "To call", value: "Bo 1" }]);
  });
});
