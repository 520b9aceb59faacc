import { describe, expect, it } from "vitest";
import { settingsProfileSchema } from "./profile";
import { MAX_BLOCKS } from "./profile-bounds";
import { EXAMPLE_PROFILE, exampleProfile } from "./profile.fixture";

function faultPaths(profile: unknown): string[] {
  const result = settingsProfileSchema.safeParse(profile);
  return result.success ? [] : result.error.issues.map(({ path }) => path.join("."));
}

describe("the stored profile", () => {
  it("takes the example as it is", () => {
    expect(settingsProfileSchema.parse(EXAMPLE_PROFILE)).toEqual(EXAMPLE_PROFILE);
  });

  it("ignores what does not belong to it", () => {
    expect(settingsProfileSchema.parse({ ...EXAMPLE_PROFILE, approvedBy: "somebody" })).toEqual(EXAMPLE_PROFILE);
  });

  it.each([
    ["no block", [], "basal.0.startMinute"],
    ["a first block that is late", [{ startMinute: 60, milliUnitsPerHour: 500 }], "basal.0.startMinute"],
    [
      "a block twice",
      [
        { startMinute: 0, milliUnitsPerHour: 500 },
        { startMinute: 60, milliUnitsPerHour: 500 },
        { startMinute: 60, milliUnitsPerHour: 550 },
      ],
      "basal.2.startMinute",
    ],
    [
      "blocks out of order",
      [
        { startMinute: 0, milliUnitsPerHour: 500 },
        { startMinute: 600, milliUnitsPerHour: 500 },
        { startMinute: 60, milliUnitsPerHour: 550 },
      ],
      "basal.2.startMinute",
    ],
    ["a start at midnight again", [{ startMinute: 0, milliUnitsPerHour: 1 }, { startMinute: 1440, milliUnitsPerHour: 1 }], "basal.1.startMinute"],
    ["a rate below zero", [{ startMinute: 0, milliUnitsPerHour: -1 }], "basal.0.milliUnitsPerHour"],
    ["a rate that is not whole", [{ startMinute: 0, milliUnitsPerHour: 0.5 }], "basal.0.milliUnitsPerHour"],
    ["a rate beyond any pump", [{ startMinute: 0, milliUnitsPerHour: 35_001 }], "basal.0.milliUnitsPerHour"],
  ])("refuses %s and names the place", (_what, basal, path) => {
    expect(faultPaths(exampleProfile({ basal }))).toContain(path);
  });

  it("takes 48 blocks and no more", () => {
    const blocks = (count: number) =>
      Array.from({ length: count }, (_, i) => ({ startMinute: i * 20, milliUnitsPerHour: 500 }));
    expect(faultPaths(exampleProfile({ basal: blocks(MAX_BLOCKS) }))).toEqual([]);
    expect(faultPaths(exampleProfile({ basal: blocks(MAX_BLOCKS + 1) }))).toEqual(["basal"]);
  });

  it("takes a rate of zero, and a target that is one number", () => {
    expect(faultPaths(exampleProfile({ basal: [{ startMinute: 0, milliUnitsPerHour: 0 }] }))).toEqual([]);
    expect(faultPaths(exampleProfile({ target: [{ startMinute: 0, lowMgDl: 120, highMgDl: 120 }] }))).toEqual([]);
  });

  it.each([
    [{ target: [{ startMinute: 0, lowMgDl: 131, highMgDl: 130 }] }, "target.0.highMgDl"],
    [{ target: [{ startMinute: 0, lowMgDl: 59, highMgDl: 130 }] }, "target.0.lowMgDl"],
    [{ carbRatio: [{ startMinute: 0, milligramsPerUnit: 0 }] }, "carbRatio.0.milligramsPerUnit"],
    [{ sensitivity: [{ startMinute: 0, microMgDlPerUnit: 0 }] }, "sensitivity.0.microMgDlPerUnit"],
    [{ durationOfActionMinutes: 59 }, "durationOfActionMinutes"],
    [{ durationOfActionMinutes: 721 }, "durationOfActionMinutes"],
    [
      { limits: { maxBasalMilliUnitsPerHour: -1, maxBolusMilliUnits: null, maxInsulinOnBoardMilliUnits: null } },
      "limits.maxBasalMilliUnitsPerHour",
    ],
  ])("refuses %j", (parts, path) => {
    expect(faultPaths(exampleProfile(parts))).toEqual([path]);
  });

  it("refuses a label that is used twice, an empty one, and a value of another kind", () => {
    const twice = [
      { label: "mode", kind: "switch" as const, value: true },
      { label: "mode", kind: "text" as const, value: "plain" },
    ];
    expect(faultPaths(exampleProfile({ features: twice }))).toEqual(["features.1.label"]);
    expect(faultPaths({ ...EXAMPLE_PROFILE, features: [{ label: " ", kind: "text", value: "" }] })).toEqual([
      "features.0.label",
    ]);
    expect(faultPaths({ ...EXAMPLE_PROFILE, features: [{ label: "mode", kind: "switch", value: 1 }] })).toEqual([
      "features.0.value",
    ]);
  });
});
