import { describe, expect, it } from "vitest";
import { readiness, type ReadinessFacts } from "./readiness";

const ready: ReadinessFacts = {
  isGateOpen: true, startingState: "approved", hasPreviousSetup: true, hasBackUpDose: false, hasContact: true,
  hasKetoneStrips: true, hasFastCarbohydrate: true, daysOfGlucose: 14, hasMentor: true, flagsOnStartDay: [],
};
const codes = (facts: Partial<ReadinessFacts>) => {
  const { blocks, warns } = readiness({ ...ready, ...facts });
  return { blocks: blocks.map(({ code }) => code), warns: warns.map(({ code }) => code) };
};

describe("readiness", () => {
  it("opens the start day when everything is there", () => expect(codes({})).toEqual({ blocks: [], warns: [] }));

  // The list of content.md 3 (common practice, no source), one by one.
  it.each([
    [{ hasPreviousSetup: false }, "no-fallback"],
    [{ isGateOpen: false }, "no-back-up-dose"],
    [{ isGateOpen: null }, "no-back-up-dose"],
    [{ startingState: "proposed" as const }, "not-agreed"],
    [{ startingState: null }, "not-agreed"],
    [{ hasContact: false }, "no-contact"],
    [{ hasKetoneStrips: false }, "no-ketone-strips"],
    [{ hasFastCarbohydrate: false }, "no-fast-carbohydrate"],
  ])("stays closed with %j", (facts, code) => expect(codes(facts).blocks).toEqual([code]));

  it("accepts a written back-up dose where the gate is closed, and a knowingly recorded profile", () => {
    expect(codes({ isGateOpen: false, hasBackUpDose: true }).blocks).toEqual([]);
    expect(codes({ startingState: "in-effect" }).blocks).toEqual([]);
  });

  it("only says what is thin", () => {
    expect(codes({ daysOfGlucose: 9, hasMentor: false, flagsOnStartDay: ["Feverish illness"] })).toEqual({ blocks: [], warns: ["little-glucose", "no-mentor", "flagged-day"] });
    expect(codes({ daysOfGlucose: 10 }).warns).toEqual([]);
  });
});
