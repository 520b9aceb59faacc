import { describe, expect, it } from "vitest";
import { CHANGE_REASON_CODES, CHANGE_REASONS, needsWords } from "./change-reason";
import { profileDifference } from "./difference";
import type { GuardrailFacts } from "./guardrail-facts";
import { DEFAULT_GUARDRAIL_LIMITS } from "./guardrail-table";
import { evaluateGuardrails } from "./guardrails";
import type { SettingsProfile } from "./profile";
import { EXAMPLE_PROFILE, exampleProfile } from "./profile.fixture";

/** 0.50 to 0.55 U/h until 04:00: 10 %, one family, stronger. */
const STRONGER = { basal: EXAMPLE_PROFILE.basal.map((b, i) => (i === 0 ? { ...b, milliUnitsPerHour: 550 } : b)) };
/** 0.50 to 0.45 U/h until 04:00: 10 %, one family, weaker. */
const WEAKER = { basal: EXAMPLE_PROFILE.basal.map((b, i) => (i === 0 ? { ...b, milliUnitsPerHour: 450 } : b)) };

function findings(change: Partial<SettingsProfile>, facts: Partial<GuardrailFacts> = {}) {
  const proposed = exampleProfile(change);
  return evaluateGuardrails({
    difference: profileDifference(EXAMPLE_PROFILE, proposed),
    proposed,
    reason: "pattern-high",
    isStarting: false,
    isByEducator: false,
    lastChanged: {},
    evidenceDays: 3,
    flaggedEvidenceDays: 0,
    lowFractionOfLast3Days: 0.01,
    highestKetonesMmolOfLast24Hours: null,
    totalDailyDoseUnits: 36,
    basalStepMilliUnits: 50,
    bolusStepMilliUnits: 50,
    isGateOpen: true,
    isApproved: false,
    overrides: {},
    ...facts,
  });
}

const codes = (...args: Parameters<typeof findings>) => findings(...args).map(({ code, severity }) => `${severity} ${code}`);

describe("guardrails", () => {
  it("are silent for one small step with a pattern and a rest behind it", () => {
    expect(codes(STRONGER, { lastChanged: { basal: { versionNumber: 2, hours: 72 } } })).toEqual([]);
    expect(codes(WEAKER)).toEqual([]);
  });

  it("one-family: asks about a second family, but not when going back", () => {
    const two = { ...STRONGER, durationOfActionMinutes: 230 };
    expect(findings(two)[0]).toEqual({
      code: "one-family",
      severity: "asks",
      text: "Two settings at once can be compared only as a pair. Which one matters most today?",
      tellsEducator: false,
    });
    expect(codes(two, { reason: "undo" })).toEqual([]);
    expect(codes(two, { reason: "typing-error" })).toEqual([]);
  });

  it("too-soon: asks under 72 hours since this family changed, when it strengthens", () => {
    const after = (hours: number) => ({ lastChanged: { basal: { versionNumber: 2, hours } } });
    expect(findings(STRONGER, after(50.9))[0]).toMatchObject({
      code: "too-soon",
      severity: "asks",
      text: "Version 2 has been in effect for 50 hours. Three full days show more than one.",
    });
    expect(codes(STRONGER, after(71.99))).toEqual(["asks too-soon"]);
    expect(codes(STRONGER, after(72))).toEqual([]);
    expect(codes(WEAKER, after(1))).toEqual([]);
    expect(codes(STRONGER, { lastChanged: { carbRatio: { versionNumber: 2, hours: 1 } } })).toEqual([]);
  });

  it("too-soon: is broken by an educator, not by a mentor", () => {
    const lastChanged = { basal: { versionNumber: 2, hours: 5 } };
    expect(codes(STRONGER, { lastChanged, isByEducator: true })).toEqual([]);
    expect(codes(STRONGER, { lastChanged, reason: "educator-said" })).toEqual([]);
    expect(codes(STRONGER, { lastChanged, reason: "talked-with-mentor" })).toEqual(["asks too-soon"]);
  });

  it("too-soon: speaks of a family that goes both ways", () => {
    const both = {
      basal: [
        { startMinute: 0, milliUnitsPerHour: 550 },
        { startMinute: 240, milliUnitsPerHour: 600 },
        { startMinute: 1320, milliUnitsPerHour: 550 },
      ],
    };
    expect(codes(both, { lastChanged: { basal: { versionNumber: 4, hours: 5 } } })).toEqual(["asks too-soon"]);
  });

  it("too-big: above 20 % asks, above 10 % of a basal rate informs, the border does neither", () => {
    const ratio = (milligramsPerUnit: number) => ({
      carbRatio: [{ startMinute: 0, milligramsPerUnit }, ...EXAMPLE_PROFILE.carbRatio.slice(1)],
    });
    const rate = (milliUnitsPerHour: number) => ({
      basal: [{ startMinute: 0, milliUnitsPerHour }, ...EXAMPLE_PROFILE.basal.slice(1)],
    });
    expect(codes(ratio(13_600))).toEqual([]);
    expect(codes(ratio(13_500))).toEqual(["asks too-big"]);
    expect(codes(rate(550))).toEqual([]);
    expect(codes(rate(600))).toEqual(["informs too-big"]);
    expect(findings(rate(650))[0]).toMatchObject({
      severity: "asks",
      text: "This is a 30% step. Published advice moves in steps of 10 to 20%.",
    });
    expect(codes(rate(350))).toEqual(["asks too-big"]);
  });

  it("too-big: says nothing about a device's own numbers, whose scale nobody knows", () => {
    const features = [{ label: "strength", kind: "number" as const, value: 8 }];
    expect(codes({ features })).toEqual([]);
  });

  it("no-pattern: needs 3 days, 2 where the pattern is lows", () => {
    expect(codes(STRONGER, { evidenceDays: 2 })).toEqual(["asks no-pattern"]);
    expect(codes(WEAKER, { evidenceDays: 2 })).toEqual([]);
    expect(codes(WEAKER, { evidenceDays: 1 })).toEqual(["asks no-pattern"]);
    expect(codes(STRONGER, { evidenceDays: 0, reason: "test-result" })).toEqual(["asks no-pattern"]);
    for (const reason of ["undo", "typing-error", "educator-said", "device-update", "illness-plan"] as const) {
      expect(codes(STRONGER, { evidenceDays: 0, reason })).toEqual([]);
    }
  });

  it("flagged-days: informs and counts them", () => {
    expect(findings(STRONGER, { flaggedEvidenceDays: 2 })).toEqual([
      {
        code: "flagged-days",
        severity: "informs",
        text: "2 of these days are flagged. They may not be ordinary.",
        tellsEducator: false,
      },
    ]);
  });

  it("stronger-after-lows: asks from 4 % below 70 on, and the educator is told", () => {
    expect(codes(STRONGER, { lowFractionOfLast3Days: 0.0399 })).toEqual([]);
    expect(findings(STRONGER, { lowFractionOfLast3Days: 0.04 })).toEqual([
      {
        code: "stronger-after-lows",
        severity: "asks",
        text: "There were lows on these days. Talk to your educator before more insulin.",
        tellsEducator: true,
      },
    ]);
    expect(codes(STRONGER, { lowFractionOfLast3Days: null })).toEqual([]);
    expect(codes(STRONGER, { lowFractionOfLast3Days: 0.05, reason: "undo" })).toEqual(["asks stronger-after-lows"]);
  });

  it("weaker-and-ketones: asks from 0.6 on", () => {
    expect(codes(WEAKER, { highestKetonesMmolOfLast24Hours: 0.5 })).toEqual([]);
    expect(codes(WEAKER, { highestKetonesMmolOfLast24Hours: 0.6 })).toEqual(["asks weaker-and-ketones"]);
    expect(codes(STRONGER, { highestKetonesMmolOfLast24Hours: 2 })).toEqual([]);
  });

  it("basal-share: informs outside 30 to 60 %", () => {
    // 4 x 0.55 + 18 x 0.65 + 2 x 0.55 = 15.0 U.
    expect(codes(STRONGER, { totalDailyDoseUnits: 50 })).toEqual([]);
    expect(codes(STRONGER, { totalDailyDoseUnits: 25 })).toEqual([]);
    expect(codes(STRONGER, { totalDailyDoseUnits: 24.9 })).toEqual(["informs basal-share"]);
    expect(findings(STRONGER, { totalDailyDoseUnits: 60 })[0]?.text).toBe(
      "Basal would be 25% of your day's insulin. Published shares run from 30 to 60%.",
    );
    expect(codes(STRONGER, { totalDailyDoseUnits: null })).toEqual([]);
  });

  it("outside-step: blocks a changed value the device cannot hold and names both neighbours", () => {
    const basal = [{ startMinute: 0, milliUnitsPerHour: 530 }, ...EXAMPLE_PROFILE.basal.slice(1)];
    expect(findings({ basal })[0]).toMatchObject({
      code: "outside-step",
      severity: "blocks",
      text: "Your device moves in steps of 0.05 U/h. Choose 0.5 U/h or 0.55 U/h.",
    });
    const limits = { ...EXAMPLE_PROFILE.limits, maxBolusMilliUnits: 7990 };
    expect(findings({ limits })[0]?.text).toBe("Your device moves in steps of 0.05 U. Choose 7.95 U or 8 U.");
  });

  it("outside-step: leaves a value alone that was off the step before, except in a first version", () => {
    const facts = { basalStepMilliUnits: 200 };
    const limits = { ...EXAMPLE_PROFILE.limits, maxBolusMilliUnits: 7500 };
    expect(codes({ limits }, facts)).toEqual([]);
    expect(codes({}, { ...facts, isStarting: true })).toEqual([
      "blocks outside-step",
      "blocks outside-step",
      "blocks outside-step",
    ]);
  });

  it("gate: blocks while closed, until approved", () => {
    expect(findings(STRONGER, { isGateOpen: false })).toEqual([
      {
        code: "gate",
        severity: "blocks",
        text: "This needs your educator first. You can write it down and send it now.",
        tellsEducator: false,
      },
    ]);
    expect(codes(STRONGER, { isGateOpen: false, isApproved: true })).toEqual([]);
  });

  it("puts what blocks first, then what asks, then what informs", () => {
    const basal = [{ startMinute: 0, milliUnitsPerHour: 730 }, ...EXAMPLE_PROFILE.basal.slice(1)];
    const facts = { isGateOpen: false, flaggedEvidenceDays: 1, evidenceDays: 1 };
    expect(findings({ basal }, facts).map(({ severity }) => severity)).toEqual([
      "blocks",
      "blocks",
      "asks",
      "asks",
      "informs",
    ]);
  });

  it("look at a first version only for gate, steps and basal share", () => {
    const facts = { isStarting: true, evidenceDays: 0, totalDailyDoseUnits: 60, lowFractionOfLast3Days: 0.2 };
    expect(codes({ ...STRONGER, durationOfActionMinutes: 60 }, facts)).toEqual(["informs basal-share"]);
  });
});

describe("a weakening after a low or on an educator's word", () => {
  const big = {
    basal: [{ startMinute: 0, milliUnitsPerHour: 300 }, ...EXAMPLE_PROFILE.basal.slice(1)],
    durationOfActionMinutes: 300,
  };
  const asked = { evidenceDays: 0, lastChanged: { basal: { versionNumber: 3, hours: 2 } } };

  it("would be asked to wait for any other reason", () => {
    expect(codes(big, asked)).toEqual(["asks one-family", "asks no-pattern", "asks too-big"]);
  });

  it.each([
    { reason: "pattern-low" },
    { reason: "severe-low" },
    { reason: "educator-said" },
    { isByEducator: true },
    { lowFractionOfLast3Days: 0.04 },
  ] as const)("never waits: %j", (facts) => {
    const found = findings(big, { ...asked, ...facts });
    expect(found.filter(({ severity }) => severity !== "informs")).toEqual([]);
    expect(found.map(({ code }) => code)).toEqual(["too-big"]);
  });

  it("still hears of ketones, a closed gate and the device's step", () => {
    const facts = { reason: "severe-low", highestKetonesMmolOfLast24Hours: 1, isGateOpen: false } as const;
    expect(codes(WEAKER, facts)).toEqual(["blocks gate", "asks weaker-and-ketones"]);
  });

  it("is not meant for a change that also strengthens", () => {
    const both = { ...WEAKER, durationOfActionMinutes: 200 };
    expect(codes(both, { reason: "severe-low" })).toContain("asks one-family");
  });
});

describe("numbers an educator sets for one person", () => {
  it("replace those of the table, one by one", () => {
    const lastChanged = { basal: { versionNumber: 2, hours: 100 } };
    expect(codes(STRONGER, { lastChanged, overrides: { restHours: 168 } })).toEqual(["asks too-soon"]);
    expect(codes(STRONGER, { overrides: { evidenceDays: 5 } })).toEqual(["asks no-pattern"]);
    expect(codes(STRONGER, { overrides: { askStepPercent: 5 } })).toEqual(["asks too-big"]);
    expect(codes(STRONGER, { overrides: { lowFraction: 0.01 } })).toEqual(["asks stronger-after-lows"]);
    expect(codes(WEAKER, { overrides: { ketonesMmol: 1 }, highestKetonesMmolOfLast24Hours: 0.8 })).toEqual([]);
    expect(codes(STRONGER, { overrides: { basalShareLowPercent: 45 } })).toEqual(["informs basal-share"]);
  });

  it("are otherwise those of content.md 6", () => {
    expect(DEFAULT_GUARDRAIL_LIMITS).toEqual({
      restHours: 72,
      askStepPercent: 20,
      informBasalStepPercent: 10,
      evidenceDays: 3,
      evidenceDaysForLows: 2,
      lowFraction: 0.04,
      ketonesMmol: 0.6,
      basalShareLowPercent: 30,
      basalShareHighPercent: 60,
    });
  });
});

describe("reasons for a change", () => {
  it("are the list of content.md 5, and only other needs words", () => {
    expect(CHANGE_REASON_CODES).toEqual([
      "pattern-low",
      "pattern-high",
      "severe-low",
      "test-result",
      "illness-plan",
      "educator-said",
      "talked-with-mentor",
      "device-update",
      "typing-error",
      "undo",
      "other",
    ]);
    expect(CHANGE_REASON_CODES.filter(needsWords)).toEqual(["other"]);
    expect(Object.values(CHANGE_REASONS)).not.toContain("");
  });
});
