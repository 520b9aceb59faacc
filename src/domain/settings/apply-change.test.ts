import { describe, expect, it } from "vitest";
import { applyEdit } from "./apply-change";
import { exampleProfile } from "./profile.fixture";

describe("applyEdit", () => {
  it("changes one block of the night and leaves the rest of the day", () => {
    const flat = { ...exampleProfile(), basal: [{ startMinute: 0, milliUnitsPerHour: 500 }] };
    expect(applyEdit(flat, { family: "basal", fromMinute: 0, toMinute: 240, value: 0.55 }, "mg/dL").basal).toEqual([
      { startMinute: 0, milliUnitsPerHour: 550 },
      { startMinute: 240, milliUnitsPerHour: 500 },
    ]);
  });

  it("keeps a sensitivity typed in mmol/L exact", () => {
    const edited = applyEdit(exampleProfile(), { family: "sensitivity", fromMinute: 0, toMinute: 1440, value: 3.4 }, "mmol/L");
    expect(edited.sensitivity).toEqual([{ startMinute: 0, microMgDlPerUnit: 61_253_040 }]);
  });

  it("refuses an edit that changes nothing, and an empty part of the day", () => {
    const flat = { ...exampleProfile(), carbRatio: [{ startMinute: 0, milligramsPerUnit: 15_000 }] };
    const edit = { family: "carbRatio", fromMinute: 0, toMinute: 1440, value: 15 } as const;
    expect(() => applyEdit(flat, edit, "mg/dL")).toThrow(expect.objectContaining({ code: "CONFLICT" }));
    expect(() => applyEdit(flat, { ...edit, toMinute: 0 }, "mg/dL")).toThrow(expect.objectContaining({ code: "INVALID_RANGE" }));
  });
});
