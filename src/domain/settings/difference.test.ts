import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { changeDirection } from "./change-direction";
import { profileDifference } from "./difference";
import { SETTING_FAMILIES } from "./family";
import type { SettingsProfile } from "./profile";
import { EXAMPLE_PROFILE, exampleProfile } from "./profile.fixture";
import { isSameSchedule } from "./schedule";
import { changeSpan, splitBlock } from "./schedule-edit";

vi.setConfig({ testTimeout: 60_000 });

const to = (parts: Partial<SettingsProfile>) => profileDifference(EXAMPLE_PROFILE, exampleProfile(parts));
const whole = { fromMinute: 0, toMinute: 1440 };

describe("the difference of two profiles", () => {
  it("is nothing between a profile and itself, however its blocks are cut", () => {
    expect(to({})).toEqual({ changes: [], families: [] });
    expect(to({ basal: splitBlock(EXAMPLE_PROFILE.basal, 600) })).toEqual({ changes: [], families: [] });
  });

  it("says a ratio of 17 to 15 g/U from 05:00 to 10:00: 12 % and stronger (content.md 13)", () => {
    const before = exampleProfile({ carbRatio: [{ startMinute: 0, milligramsPerUnit: 17_000 }] });
    const carbRatio = changeSpan(before.carbRatio, 300, 600, (block) => ({ ...block, milligramsPerUnit: 15_000 }));
    const { changes, families } = profileDifference(before, { ...before, carbRatio });
    expect(families).toEqual(["carbRatio"]);
    expect(changes).toHaveLength(1);
    expect(changes[0]).toMatchObject({
      field: "milligramsPerUnit",
      fromMinute: 300,
      toMinute: 600,
      oldValue: 17_000,
      newValue: 15_000,
      direction: "stronger",
    });
    expect(changes[0]?.stepPercent).toBeCloseTo(11.76, 2);
  });

  it("says a basal rate of 0.50 to 0.55 U/h from 00:00 to 04:00: 10 % and stronger", () => {
    const basal = changeSpan(EXAMPLE_PROFILE.basal, 0, 240, (block) => ({ ...block, milliUnitsPerHour: 550 }));
    expect(to({ basal }).changes).toEqual([
      {
        family: "basal",
        field: "milliUnitsPerHour",
        label: null,
        fromMinute: 0,
        toMinute: 240,
        oldValue: 500,
        newValue: 550,
        stepPercent: 10,
        direction: "stronger",
      },
    ]);
  });

  it("joins neighbouring parts with the same old and new value, and only those", () => {
    const flat = exampleProfile({ basal: [{ startMinute: 0, milliUnitsPerHour: 500 }] });
    const cut = exampleProfile({
      basal: [
        { startMinute: 0, milliUnitsPerHour: 600 },
        { startMinute: 300, milliUnitsPerHour: 600 },
        { startMinute: 600, milliUnitsPerHour: 500 },
        { startMinute: 700, milliUnitsPerHour: 600 },
      ],
    });
    expect(profileDifference(flat, cut).changes.map(({ fromMinute, toMinute }) => [fromMinute, toMinute])).toEqual([
      [0, 600],
      [700, 1440],
    ]);
  });

  it("looks at both ends of a target on their own", () => {
    const { changes } = to({ target: [{ startMinute: 0, lowMgDl: 110, highMgDl: 140 }] });
    expect(changes.map(({ field, direction }) => [field, direction])).toEqual([
      ["lowMgDl", "stronger"],
      ["highMgDl", "weaker"],
    ]);
    expect(changeDirection({ changes, families: ["target"] })).toBe("mixed");
  });

  it.each([
    [{ durationOfActionMinutes: 180 }, { family: "durationOfAction", oldValue: 240, newValue: 180, stepPercent: 25, direction: "stronger" }],
    [{ sensitivity: [{ startMinute: 0, microMgDlPerUnit: 50_000_000 }] }, { family: "sensitivity", direction: "stronger" }],
    [{ sensitivity: [{ startMinute: 0, microMgDlPerUnit: 75_000_000 }] }, { family: "sensitivity", stepPercent: 25, direction: "weaker" }],
    [{ limits: { ...EXAMPLE_PROFILE.limits, maxBolusMilliUnits: null } }, { family: "limits", oldValue: 8000, newValue: null, stepPercent: null, direction: "stronger" }],
    [{ limits: { ...EXAMPLE_PROFILE.limits, maxInsulinOnBoardMilliUnits: 5000 } }, { family: "limits", oldValue: null, direction: "weaker" }],
    [{ limits: { ...EXAMPLE_PROFILE.limits, maxBasalMilliUnitsPerHour: 1000 } }, { family: "limits", direction: "weaker" }],
  ])("reads %j", (parts, expected) => {
    const { changes } = to(parts);
    expect(changes).toHaveLength(1);
    expect(changes[0]).toMatchObject({ ...whole, ...expected });
  });

  it("matches features by label: changed, gone, new; none has a direction", () => {
    const features: SettingsProfile["features"] = [
      { label: "strength", kind: "number", value: 1 },
      { label: "mode", kind: "text", value: "plain" },
      { label: "alarm", kind: "switch", value: false },
    ];
    const { changes, families } = to({ features });
    expect(families).toEqual(["features"]);
    expect(changes.map(({ label, oldValue, newValue, direction }) => [label, oldValue, newValue, direction])).toEqual([
      ["quiet at night", true, null, "neutral"],
      ["strength", 0.8, 1, "neutral"],
      ["alarm", null, false, "neutral"],
    ]);
    expect(changes[1]?.stepPercent).toBeCloseTo(25, 10);
  });

  it("has no percentage of zero", () => {
    const before = exampleProfile({ basal: [{ startMinute: 0, milliUnitsPerHour: 0 }] });
    const after = exampleProfile({ basal: [{ startMinute: 0, milliUnitsPerHour: 50 }] });
    expect(profileDifference(before, after).changes[0]).toMatchObject({ stepPercent: null, direction: "stronger" });
  });

  it("lists the families touched in their fixed order", () => {
    const { families } = to({
      features: [],
      durationOfActionMinutes: 300,
      basal: [{ startMinute: 0, milliUnitsPerHour: 500 }],
      limits: { ...EXAMPLE_PROFILE.limits, maxBolusMilliUnits: 7000 },
    });
    expect(families).toEqual(["basal", "durationOfAction", "limits", "features"]);
    expect(SETTING_FAMILIES.filter((family) => families.includes(family))).toEqual(families);
  });

  it("refuses a schedule with a gap", () => {
    expect(() => to({ basal: [] })).toThrow(expect.objectContaining({ code: "INVALID_INPUT" }));
  });

  const rates = fc
    .tuple(
      fc.uniqueArray(fc.integer({ min: 1, max: 1439 }), { maxLength: 6 }),
      fc.array(fc.integer({ min: 1, max: 6 }), { minLength: 7, maxLength: 7 }),
    )
    .map(([cuts, values]) =>
      [0, ...cuts.toSorted((a, b) => a - b)].map((startMinute, i) => ({
        startMinute,
        milliUnitsPerHour: (values[i] ?? 1) * 100,
      })),
    );

  it("is empty exactly when the schedules agree, turns round with its order, and rebuilds the new one", () => {
    fc.assert(
      fc.property(rates, rates, (one, other) => {
        const [before, after] = [exampleProfile({ basal: one }), exampleProfile({ basal: other })];
        const there = profileDifference(before, after);
        const back = profileDifference(after, before);
        expect(there.changes.length === 0).toBe(isSameSchedule(one, other));
        expect(back.changes.map(({ oldValue, newValue }) => [newValue, oldValue])).toEqual(
          there.changes.map(({ oldValue, newValue }) => [oldValue, newValue]),
        );
        const turned = { stronger: "weaker", weaker: "stronger", neutral: "neutral" } as const;
        expect(back.changes.map(({ direction }) => turned[direction])).toEqual(
          there.changes.map(({ direction }) => direction),
        );
        const rebuilt = there.changes.reduce(
          (basal, { fromMinute, toMinute, newValue }) =>
            changeSpan(basal, fromMinute, toMinute, (block) => ({ ...block, milliUnitsPerHour: Number(newValue) })),
          one,
        );
        expect(isSameSchedule(rebuilt, other)).toBe(true);
      }),
      { numRuns: 10_000 },
    );
  });
});

describe("changeDirection", () => {
  it("speaks of all changes, or of one family", () => {
    const difference = to({
      basal: [{ startMinute: 0, milliUnitsPerHour: 700 }],
      durationOfActionMinutes: 300,
    });
    expect(changeDirection(difference)).toBe("mixed");
    expect(changeDirection(difference, "basal")).toBe("stronger");
    expect(changeDirection(difference, "durationOfAction")).toBe("weaker");
    expect(changeDirection(difference, "target")).toBe("neutral");
  });
});
