import { createHash } from "node:crypto";
import { describe, expect, it } from "vitest";
import { canonicalProfileText } from "./content-hash";
import type { SettingsProfile } from "./profile";
import { EXAMPLE_PROFILE, exampleProfile } from "./profile.fixture";

const hash = (profile: SettingsProfile) => createHash("sha256").update(canonicalProfileText(profile)).digest("hex");

/** The same value with the keys of every object in the opposite order. */
function turned(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(turned);
  if (value === null || typeof value !== "object") return value;
  return Object.fromEntries(
    Object.entries(value)
      .toReversed()
      .map(([key, member]) => [key, turned(member)]),
  );
}

describe("the one text of a profile", () => {
  it("sorts its keys and leaves no space", () => {
    const small = exampleProfile({
      basal: [{ startMinute: 0, milliUnitsPerHour: 500 }],
      carbRatio: [{ startMinute: 0, milligramsPerUnit: 17_000 }],
      features: [{ label: 'a "b"', kind: "switch", value: false }],
    });
    expect(canonicalProfileText(small)).toBe(
      '{"basal":[{"milliUnitsPerHour":500,"startMinute":0}],' +
        '"carbRatio":[{"milligramsPerUnit":17000,"startMinute":0}],' +
        '"durationOfActionMinutes":240,' +
        '"features":[{"kind":"switch","label":"a \\"b\\"","value":false}],' +
        '"limits":{"maxBasalMilliUnitsPerHour":1200,"maxBolusMilliUnits":8000,"maxInsulinOnBoardMilliUnits":null},' +
        '"sensitivity":[{"microMgDlPerUnit":60000000,"startMinute":0}],' +
        '"target":[{"highMgDl":130,"lowMgDl":120,"startMinute":0}]}',
    );
  });

  it("does not depend on the order of keys, nor on a way through JSON", () => {
    const other = turned(EXAMPLE_PROFILE) as SettingsProfile;
    expect(Object.keys(other)).not.toEqual(Object.keys(EXAMPLE_PROFILE));
    expect(hash(other)).toBe(hash(EXAMPLE_PROFILE));
    expect(hash(JSON.parse(JSON.stringify(EXAMPLE_PROFILE)) as SettingsProfile)).toBe(hash(EXAMPLE_PROFILE));
  });

  it.each([
    { durationOfActionMinutes: 241 },
    { basal: [{ startMinute: 0, milliUnitsPerHour: 501 }] },
    { sensitivity: [{ startMinute: 0, microMgDlPerUnit: 60_000_001 }] },
    { features: EXAMPLE_PROFILE.features.toReversed() },
    { features: [] },
  ])("is another text after %j", (parts) => {
    expect(hash(exampleProfile(parts))).not.toBe(hash(EXAMPLE_PROFILE));
  });
});
