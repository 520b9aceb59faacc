import { describe, expect, it } from "vitest";
import { CHANGE_REASONS } from "./change-reason";
import { CHECK_TEXTS } from "./check-texts";
import { EXPECTED_DIRECTIONS, EXPECTED_OUTCOMES, EXPECTED_WINDOWS } from "./expectation";
import { backUpDoses } from "./fallback";
import { FAMILY_FACTS } from "./family";
import { estimateDailyDose } from "./daily-dose";
import { gateDoseReasons } from "./gate-dose";
import { GATE_CLOSED_TEXT, GATE_QUESTIONS } from "./gate-questions";
import { GUARDRAILS } from "./guardrail-table";
import { METHODS } from "./methods";
import { PUBLISHED_TARGETS, STARTING_TARGET } from "./starting-target";

/** Words the product never uses as its own (content.md 8). */
const NEVER =
  /\b(best|worst|wrong|failed|good|bad|control|controlled|compliant|cheat|safe|should|increase|reduce|take|give|try|recommended)\b|!/i;

/** The question on tablets is quoted from content.md 7, where a person is asked what they take. */
const QUESTIONS = Object.entries(GATE_QUESTIONS).filter(([code]) => code !== "sglt2Inhibitor");

const SENTENCES: string[] = [
  ...Object.values(CHECK_TEXTS),
  ...Object.values(GUARDRAILS).map(({ text }) => text),
  ...Object.values(CHANGE_REASONS),
  ...[EXPECTED_DIRECTIONS, EXPECTED_OUTCOMES, EXPECTED_WINDOWS].flatMap((list) => Object.values(list)),
  ...Object.values(FAMILY_FACTS).map(({ label }) => label),
  ...QUESTIONS.flatMap(([, { question, reason }]) => [question, reason]),
  GATE_QUESTIONS.sglt2Inhibitor.reason,
  GATE_CLOSED_TEXT,
  ...gateDoseReasons(estimateDailyDose(40, { route: "injections", dailyDoseUnits: 120 })).map(({ text }) => text),
  ...backUpDoses([{ startMinute: 0, milliUnitsPerHour: 750 }], 40).map(({ label }) => label),
  ...METHODS.map(({ label }) => label),
  ...PUBLISHED_TARGETS.map(({ label }) => label),
  STARTING_TARGET.label,
];

describe("words about settings", () => {
  it("finds such a word when there is one", () => {
    expect("You should take 4 units!").toMatch(NEVER);
    expect("A safety check of a controller").not.toMatch(NEVER);
  });

  it.each([...new Set(SENTENCES)])("%s", (sentence) => {
    expect(sentence).not.toMatch(NEVER);
    expect(sentence.trim()).toBe(sentence);
    expect(sentence).not.toBe("");
  });
});
