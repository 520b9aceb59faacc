import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { profileFromApi, profileToApi } from "./profile-api";
import { apiProfileSchema } from "./profile-api-schema";
import { settingsProfileSchema } from "./profile";
import { EXAMPLE_PROFILE } from "./profile.fixture";

vi.setConfig({ testTimeout: 60_000 });

const API = {
  basal: [
    { startMinute: 0, unitsPerHour: 0.5 },
    { startMinute: 240, unitsPerHour: 0.65 },
    { startMinute: 1320, unitsPerHour: 0.55 },
  ],
  carbRatio: [
    { startMinute: 0, gramsPerUnit: 17 },
    { startMinute: 300, gramsPerUnit: 15.5 },
  ],
  sensitivity: [{ startMinute: 0, mgDlPerUnit: 60 }],
  target: [{ startMinute: 0, lowMgDl: 120, highMgDl: 130 }],
  durationOfActionMinutes: 240,
  limits: { maxBasalUnitsPerHour: 1.2, maxBolusUnits: 8, maxInsulinOnBoardUnits: null },
  features: EXAMPLE_PROFILE.features,
};

function faultPaths(profile: unknown): string[] {
  const result = apiProfileSchema.safeParse(profile);
  return result.success ? [] : result.error.issues.map(({ path }) => path.join("."));
}

describe("a profile on the interface", () => {
  it("reads U/h, g/U and mg/dL into stored integers, and back", () => {
    expect(profileFromApi(apiProfileSchema.parse(API))).toEqual(EXAMPLE_PROFILE);
    expect(profileToApi(EXAMPLE_PROFILE)).toEqual(API);
  });

  it("takes limits and features that were left out as none", () => {
    const { limits: _limits, features: _features, ...rest } = API;
    const profile = profileFromApi(apiProfileSchema.parse(rest));
    expect(profile.features).toEqual([]);
    expect(Object.values(profile.limits)).toEqual([null, null, null]);
  });

  it("reads 0.1 + 0.2 as 0.3 U/h, and refuses a fourth decimal place by name", () => {
    const withRate = (unitsPerHour: number) => ({ ...API, basal: [{ startMinute: 0, unitsPerHour }] });
    expect(profileFromApi(apiProfileSchema.parse(withRate(0.1 + 0.2))).basal[0]?.milliUnitsPerHour).toBe(300);
    expect(faultPaths(withRate(0.5501))).toEqual(["basal.0.unitsPerHour"]);
  });

  it.each([
    [{ basal: [] }, "basal.0.startMinute"],
    [{ basal: [{ startMinute: 0, unitsPerHour: 36 }] }, "basal.0.unitsPerHour"],
    [{ carbRatio: [{ startMinute: 0, gramsPerUnit: 0 }] }, "carbRatio.0.gramsPerUnit"],
    [{ sensitivity: [{ startMinute: 0, mgDlPerUnit: -60 }] }, "sensitivity.0.mgDlPerUnit"],
    [{ sensitivity: [{ startMinute: 0, mgDlPerUnit: Number.NaN }] }, "sensitivity.0.mgDlPerUnit"],
    [{ target: [{ startMinute: 0, lowMgDl: 140, highMgDl: 130 }] }, "target.0.highMgDl"],
    [{ target: [{ startMinute: 0, lowMgDl: 120.5, highMgDl: 130 }] }, "target.0.lowMgDl"],
    [{ durationOfActionMinutes: 4 }, "durationOfActionMinutes"],
    [{ limits: { maxBolusUnits: 101 } }, "limits.maxBolusUnits"],
  ])("refuses %j and names the field", (parts, path) => {
    expect(faultPaths({ ...API, ...parts })).toEqual([path]);
  });

  it("loses nothing on the way out and in again", () => {
    const starts = fc
      .uniqueArray(fc.integer({ min: 1, max: 1439 }), { maxLength: 5 })
      .map((cuts) => [0, ...cuts.toSorted((a, b) => a - b)]);
    const blocks = <T extends Record<string, number>>(value: fc.Arbitrary<T>) =>
      fc.tuple(starts, fc.array(value, { minLength: 6, maxLength: 6 })).map(([cuts, values]) =>
        cuts.flatMap((startMinute, i) => {
          const block = values[i];
          return block ? [{ startMinute, ...block }] : [];
        }),
      );
    const limit = fc.option(fc.integer({ min: 0, max: 35_000 }), { nil: null });
    const stored = fc.record({
      basal: blocks(fc.record({ milliUnitsPerHour: fc.integer({ min: 0, max: 35_000 }) })),
      carbRatio: blocks(fc.record({ milligramsPerUnit: fc.integer({ min: 500, max: 1_000_000 }) })),
      sensitivity: blocks(fc.record({ microMgDlPerUnit: fc.integer({ min: 1_000_000, max: 5_000_000_000 }) })),
      target: blocks(fc.integer({ min: 60, max: 200 }).map((low) => ({ lowMgDl: low, highMgDl: low + 10 }))),
      durationOfActionMinutes: fc.integer({ min: 60, max: 720 }),
      limits: fc.record({
        maxBasalMilliUnitsPerHour: limit,
        maxBolusMilliUnits: limit,
        maxInsulinOnBoardMilliUnits: limit,
      }),
      features: fc.constant(EXAMPLE_PROFILE.features),
    });
    fc.assert(
      fc.property(stored, (profile) => {
        expect(settingsProfileSchema.parse(profile)).toEqual(profile);
        const sent: unknown = JSON.parse(JSON.stringify(profileToApi(profile)));
        expect(profileFromApi(apiProfileSchema.parse(sent))).toEqual(profile);
      }),
      { numRuns: 10_000 },
    );
  });
});
