import { describe, expect, it } from "vitest";
import { GATE_QUESTIONS } from "./gate-questions";
import { profileToApi } from "./profile-api";
import { EXAMPLE_PROFILE } from "./profile.fixture";
import { startingProfileRequestSchema } from "./starting-profile-request";
import { OPEN_GATE, REFERENCE_REQUEST } from "./starting-profile.fixture";

const REQUEST = {
  weightKg: 80,
  ageYears: 40,
  injectionsTotalDailyDoseUnits: 40,
  hypoProne: false,
  gate: Object.fromEntries(Object.keys(GATE_QUESTIONS).map((question) => [question, false])),
};

function faultPaths(request: unknown): string[] {
  const result = startingProfileRequestSchema.safeParse(request);
  return result.success ? [] : result.error.issues.map(({ path }) => path.join("."));
}

describe("a starting-profile request", () => {
  it("reads booleans as yes and no, with a step of 0.05 U, mg/dL and no review unless said", () => {
    expect(startingProfileRequestSchema.parse(REQUEST)).toEqual(REFERENCE_REQUEST);
    const { gate } = startingProfileRequestSchema.parse({ ...REQUEST, gate: { ...REQUEST.gate, steroids: true } });
    expect(gate.steroids).toBe("yes");
  });

  it("knows every question of the gate, and keeps not sure", () => {
    const gate = Object.fromEntries(Object.keys(GATE_QUESTIONS).map((question) => [question, "not-sure"]));
    expect(startingProfileRequestSchema.parse({ ...REQUEST, gate }).gate).toEqual(gate);
    expect(Object.keys(OPEN_GATE)).toEqual(Object.keys(GATE_QUESTIONS));
  });

  it.each([
    ["weightKg", { weightKg: undefined }],
    ["weightKg", { weightKg: "80" }],
    ["weightKg", { weightKg: 0 }],
    ["weightKg", { weightKg: 401 }],
    ["weightKg", { weightKg: null }],
    ["ageYears", { ageYears: -1 }],
    ["ageYears", { ageYears: undefined }],
    ["injectionsTotalDailyDoseUnits", { injectionsTotalDailyDoseUnits: -40 }],
    ["injectionsTotalDailyDoseUnits", { injectionsTotalDailyDoseUnits: 0 }],
    ["injectionsTotalDailyDoseUnits", { injectionsTotalDailyDoseUnits: undefined }],
    ["hypoProne", { hypoProne: undefined }],
    ["hypoProne", { hypoProne: "no" }],
    ["insulinStepUnits", { insulinStepUnits: 0 }],
    ["insulinStepUnits", { insulinStepUnits: 0.0125 }],
    ["insulinStepUnits", { insulinStepUnits: 1 }],
    ["gate", { gate: undefined }],
    ["gate.steroids", { gate: { ...REQUEST.gate, steroids: "maybe" } }],
    ["gate.steroids", { gate: { ...REQUEST.gate, steroids: 0 } }],
    ["glucoseUnit", { glucoseUnit: "mg" }],
    ["forReview", { forReview: "yes" }],
    ["largestRecentBolusUnits", { largestRecentBolusUnits: 0 }],
  ])("names %s when the request has %j", (field, parts) => {
    expect(faultPaths({ ...REQUEST, ...parts })).toEqual([field]);
  });

  it("takes injections or a pump, and not both", () => {
    const pump = { ...profileToApi(EXAMPLE_PROFILE), totalDailyDoseUnits: 36 };
    expect(faultPaths({ ...REQUEST, injectionsTotalDailyDoseUnits: undefined, pump })).toEqual([]);
    expect(faultPaths({ ...REQUEST, injectionsTotalDailyDoseUnits: null, pump })).toEqual([]);
    expect(faultPaths({ ...REQUEST, pump: null })).toEqual([]);
    expect(faultPaths({ ...REQUEST, pump })).toEqual(["injectionsTotalDailyDoseUnits"]);
  });

  it("names the field of a pump's profile", () => {
    const pump = { ...profileToApi(EXAMPLE_PROFILE), totalDailyDoseUnits: 36, basal: [] };
    expect(faultPaths({ ...REQUEST, injectionsTotalDailyDoseUnits: undefined, pump })).toEqual([
      "pump.basal.0.startMinute",
    ]);
  });
});
