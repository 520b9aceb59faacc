import { describe, expect, it } from "vitest";
import { COMMONLY_FOUND, commonlyFound, dateOfDay, FOLLOW_UPS, PLAN, PLAN_VARIANTS, REVIEWED_EACH_TIME } from "./plan";

/** Words the product never uses as its own (content.md 8). */
const NEVER = /\b(best|worst|wrong|failed|good|bad|control|controlled|compliant|cheat|safe|should|increase|reduce|take|give|try|recommended)\b|!/i;

describe("the plan", () => {
  it("runs from three weeks before to three months after without a gap", () => {
    expect(PLAN.map(({ name }) => name)).toEqual(["Prepare", "Start day", "Watch", "First changes", "Settle", "Steady"]);
    for (const [i, phase] of PLAN.entries()) {
      const before = PLAN[i - 1];
      if (before && phase.name !== "Watch") expect(phase.firstDay).toBe(before.lastDay + 1);
      expect(phase.tasks.length).toBeGreaterThan(0);
      for (const { source } of phase.tasks) expect(source).not.toBe("");
    }
  });

  // Follow-ups at +1 or +2 days (here +1), +6, +14, +28 and +90: composite of settings.md 3.5. Dates counted on a calendar.
  it("puts the follow-ups on the calendar, over a month's end and a leap day", () => {
    expect(FOLLOW_UPS.map(({ dayOfJournal }) => dateOfDay("2028-02-20", dayOfJournal))).toEqual(["2028-02-21", "2028-02-26", "2028-03-05", "2028-03-19", "2028-05-20"]);
    expect(dateOfDay("2026-03-01", 1)).toBe("2026-03-01");
    expect(dateOfDay("2026-03-01", 0)).toBe("2026-02-28");
  });

  it("has something to say from day 1 on and nothing before", () => {
    expect(commonlyFound(0)).toBeNull();
    expect(commonlyFound(1)).toBe(COMMONLY_FOUND[0]?.text);
    expect(commonlyFound(5)).toBe(commonlyFound(4));
    expect(commonlyFound(400)).toBe(COMMONLY_FOUND.at(-1)?.text);
  });

  it("keeps to the product's words", () => {
    const sentences = [...PLAN.flatMap(({ tasks }) => tasks.map(({ what }) => what)), ...COMMONLY_FOUND.map(({ text }) => text), ...Object.values(PLAN_VARIANTS), ...REVIEWED_EACH_TIME];
    for (const sentence of sentences) expect(sentence).not.toMatch(NEVER);
  });
});
