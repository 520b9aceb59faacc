import { describe, expect, it } from "vitest";
import { fieldsOf, missingWorkingSettings, unreadablePages } from "./page-schema";

describe("fieldsOf", () => {
  it("drops what is no field of the page", () => {
    expect(fieldsOf("basal", { blocks: [], journalId: "x", edit: "add", rowVersion: "3" })).toEqual({ blocks: [] });
    expect(fieldsOf("margin", { anything: "1" })).toEqual({});
  });
});

describe("unreadablePages", () => {
  it("names the pages that were saved half typed, and no page that was never saved", () => {
    const answers = { basal: { blocks: [{ from: "00:00", value: "0.4" }, { from: "05:00", value: "" }] }, "carb-ratio": { blocks: [] }, saved: { basal: 3 } };
    expect(unreadablePages(answers, "mg/dL")).toEqual(["basal"]);
    expect(unreadablePages({}, "mg/dL")).toEqual([]);
  });
});

describe("missingWorkingSettings", () => {
  it("asks a pump for its three settings and injections for none", () => {
    expect(Object.keys(missingWorkingSettings({ workingBasal: "00:00 1", workingCarbRatio: " " }, "closed-loop"))).toEqual(["workingCarbRatio", "workingSensitivity"]);
    expect(missingWorkingSettings({}, "injections")).toEqual({});
  });
});
