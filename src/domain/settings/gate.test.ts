import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { estimateDailyDose } from "./daily-dose";
import { evaluateGate } from "./gate";
import { GATE_CLOSED_TEXT, GATE_QUESTIONS, type GateAnswer, type GateQuestion } from "./gate-questions";

vi.setConfig({ testTimeout: 60_000 });

const QUESTIONS = Object.keys(GATE_QUESTIONS) as GateQuestion[];
const ALL_NO = Object.fromEntries(QUESTIONS.map((question) => [question, "no"])) as Record<GateQuestion, GateAnswer>;
const PLAIN = { answers: ALL_NO, ageYears: 38, dose: null };

describe("the gate", () => {
  it("asks the twelve questions of the interface", () => {
    expect(QUESTIONS).toEqual([
      "pregnant",
      "under18",
      "recentSevereLow",
      "recentKetoacidosis",
      "impairedAwareness",
      "kidneyLiverAdrenal",
      "steroids",
      "acuteIllness",
      "eatingDisorder",
      "sglt2Inhibitor",
      "firstEverPump",
      "frailOrCognitive",
    ]);
  });

  it("is open after twelve plain noes", () => {
    expect(evaluateGate(PLAIN)).toEqual({ open: true, reasons: [] });
  });

  it.each(QUESTIONS)("closes on a yes to %s, and on not sure", (question) => {
    for (const answer of ["yes", "not-sure"] as const) {
      expect(evaluateGate({ ...PLAIN, answers: { ...ALL_NO, [question]: answer } })).toEqual({
        open: false,
        reasons: [{ code: question, text: GATE_QUESTIONS[question].reason }],
      });
    }
  });

  it.each(QUESTIONS)("closes while %s is not answered, and says that it was not", (question) => {
    for (const nothing of [null, undefined]) {
      const { open, reasons } = evaluateGate({ ...PLAIN, answers: { ...ALL_NO, [question]: nothing } });
      expect(open).toBe(false);
      expect(reasons).toEqual([{ code: question, text: `Not answered yet: ${GATE_QUESTIONS[question].reason}` }]);
    }
  });

  it("closes under 18 whatever the answer, once; at 18 it does not", () => {
    expect(evaluateGate({ ...PLAIN, ageYears: 17.9 }).reasons).toEqual([
      { code: "under18", text: GATE_QUESTIONS.under18.reason },
    ]);
    expect(evaluateGate({ ...PLAIN, ageYears: 12, answers: { ...ALL_NO, under18: "yes" } }).reasons).toHaveLength(1);
    expect(evaluateGate({ ...PLAIN, ageYears: 18 }).open).toBe(true);
    expect(evaluateGate({ ...PLAIN, ageYears: null }).open).toBe(true);
  });

  it("puts the reasons in the answers before those in the numbers", () => {
    const dose = estimateDailyDose(80, { route: "injections", dailyDoseUnits: 150 });
    const { reasons } = evaluateGate({ ...PLAIN, dose, answers: { ...ALL_NO, steroids: "yes" } });
    expect(reasons.map(({ code }) => code).slice(0, 2)).toEqual(["steroids", "totalDailyDoseOutOfRange"]);
  });

  it("has no figure in any text a person reads there", () => {
    const dose = estimateDailyDose(300, { route: "injections", dailyDoseUnits: 10 });
    const { reasons } = evaluateGate({ answers: {}, ageYears: 12, dose });
    for (const { text } of reasons) expect(text).not.toMatch(/\d/);
    expect(GATE_CLOSED_TEXT).not.toMatch(/\d/);
  });

  it("is open only if every answer is no, the age is 18 or more", () => {
    const answer = fc.constantFrom<GateAnswer | null>("yes", "no", "no", "no", "no", "not-sure", null);
    const answers = fc.array(answer, { minLength: 12, maxLength: 12 });
    fc.assert(
      fc.property(answers, fc.integer({ min: 10, max: 90 }), (given, ageYears) => {
        const byQuestion = Object.fromEntries(QUESTIONS.map((question, i) => [question, given[i]]));
        const { open, reasons } = evaluateGate({ answers: byQuestion, ageYears, dose: null });
        expect(open).toBe(given.every((each) => each === "no") && ageYears >= 18);
        expect(open).toBe(reasons.length === 0);
      }),
      { numRuns: 10_000 },
    );
  });
});
