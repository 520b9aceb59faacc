import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { buildDigest } from "./build-digest";
import type { Digest, DigestData, JournalWeek } from "./week";

const FINDING = "Nights were more often in range after version 3. In the 9 clean nights after, 74% of readings were in range, 62% in the 13 before.";

const week = (given: Partial<JournalWeek> = {}): JournalWeek => ({
  journalId: "j1", name: "My notebook", ownerName: "Ilka Brandvold", role: "person", lookedOn: null,
  versions: [{
    number: 3, kind: "change", state: "in-effect", families: ["basal"], on: "2026-03-09", until: null,
    changes: [{
      family: "basal", field: "milliUnitsPerHour", label: null, fromMinute: 0, toMinute: 240,
      oldValue: 500, newValue: 550, stepPercent: 10, direction: "stronger",
    }],
  }],
  findings: [{ versionNumber: 3, text: FINDING }],
  glucoseDays: 6, loggedDays: 5,
  week: { days: 7, inRangeFraction: 0.684, belowFraction: 0.021, coveredFraction: 0.9 },
  fortnight: { days: 14, inRangeFraction: 0.66, belowFraction: 0.043, coveredFraction: 0.95 },
  questions: [{ askedBy: "Tobias Okafor-Lind", about: "version 3" }],
  waiting: [{ versionNumber: 6, since: "2026-03-10" }],
  followUps: [{ on: "2026-03-18", kind: "review", versionNumber: 3 }],
  ...given,
});

const data = (level: DigestData["level"], ...journals: JournalWeek[]): DigestData => ({
  level, unit: "mg/dL", from: "2026-03-09", to: "2026-03-15", today: "2026-03-16", journals,
});

const build = (level: DigestData["level"], ...journals: JournalWeek[]): Digest => {
  const digest = buildDigest(data(level, ...journals));
  if (!digest) throw new Error("nothing was built");
  return digest;
};

const outline = (digest: Digest) => digest.sections.flatMap(({ parts }) => parts.map(({ title }) => title));
const linesOf = (digest: Digest) => digest.sections.flatMap(({ parts }) => parts.flatMap(({ lines }) => lines));

describe("buildDigest", () => {
  it("tells a person changes, what followed, days with data, open questions, follow-ups, in this order", () => {
    expect(outline(build("full", week()))).toEqual(["What changed", "What followed", "Days with data", "Open questions", "Follow-ups"]);
  });

  it("holds counts only at links", () => {
    expect(linesOf(build("links", week()))).toEqual([
      "1 change or proposal.",
      "Glucose on 6 of 7 days.",
      "Something logged on 5 of 7 days.",
      "1 question waits for an answer.",
      "1 follow-up in the days to come.",
    ]);
  });

  it("adds versions and the first sentence of what followed at summary", () => {
    expect(linesOf(build("summary", week()))).toEqual([
      "Version 3 (basal rate) went into effect on Monday 9 March.",
      "Nights were more often in range after version 3.",
      "Glucose on 6 of 7 days.",
      "Something logged on 5 of 7 days.",
      "Tobias Okafor-Lind asks about version 3.",
      "Wednesday 18 March: next review of version 3.",
    ]);
  });

  it("adds values and figures at full", () => {
    const lines = linesOf(build("full", week()));
    expect(lines).toContain("Version 3 (basal rate) went into effect on Monday 9 March: Basal 00:00–04:00: 0.50 U/h → 0.55 U/h (10% stronger).");
    expect(lines).toContain(FINDING);
    expect(lines).toContain("In these 7 days 68% of readings were in range, 70 (3.9) to 180 (10.0) mg/dL, and 2.1% below 70 (3.9).");
  });

  it("says no figure that too few readings carry", () => {
    const thin = week({ week: { days: 7, inRangeFraction: 0.9, belowFraction: 0, coveredFraction: 0.69 } });
    expect(linesOf(build("full", thin))).toContain("Readings cover 69% of these 7 days, too little to say figures.");
  });

  it("calls a quiet week a way to learn", () => {
    expect(linesOf(build("links", week({ versions: [], questions: [], followUps: [] })))[0]).toBe("No changes this week. That is a good way to learn something.");
  });

  it("tells a mentor what changed since their own look, and the questions, and neither data nor follow-ups", () => {
    const digest = build("summary", week({ role: "mentor", lookedOn: "2026-03-08" }));
    expect(outline(digest)).toEqual(["What changed since you looked", "What followed", "Open questions"]);
    expect(linesOf(digest)[0]).toBe("You looked last on Sunday 8 March.");
    expect(linesOf(build("summary", week({ role: "mentor", lookedOn: "2026-03-08", versions: [] })))).toContain("Nothing has changed since.");
  });

  it("leaves out what is not shared", () => {
    const digest = build("full", week({ role: "family", versions: null, findings: [], glucoseDays: null, week: null, questions: [] }));
    expect(linesOf(digest)).toEqual([]);
  });

  it("tells an educator proposals, lows above the aim, follow-ups and questions over all people", () => {
    const two = week({ role: "educator", journalId: "j2", ownerName: "Nils Berg", waiting: [], followUps: [], questions: [], fortnight: { days: 14, inRangeFraction: 0.7, belowFraction: 0.04, coveredFraction: 0.9 } });
    const three = week({ role: "educator", journalId: "j3", ownerName: "Runa Vik", waiting: [], followUps: [], questions: [], fortnight: { days: 14, inRangeFraction: 0.7, belowFraction: 0.2, coveredFraction: 0.5 } });
    const digest = build("full", week({ role: "educator" }), two, three);
    expect(digest.sections).toHaveLength(1);
    expect(linesOf(digest)).toEqual([
      "Ilka Brandvold: version 6 waits since Tuesday 10 March.",
      "Ilka Brandvold: 4.3% of 14 days was below 70 (3.9). The usual aim is under 4%.",
      "Runa Vik: too little data in 14 days to say.",
      "Ilka Brandvold, Wednesday 18 March: next review of version 3.",
      "Ilka Brandvold: Tobias Okafor-Lind asks about version 3.",
    ]);
    expect(linesOf(build("links", week({ role: "educator" }), two))).toEqual([
      "1 proposal waits for you.", "1 follow-up is due this week.", "1 question waits for an answer.",
    ]);
  });

  it("names somebody else's notebook in the subject only when there is no other", () => {
    const mentor = week({ role: "mentor" });
    expect(build("full", mentor).subject).toBe("A week in Ilka Brandvold’s notebook");
    expect(build("full", week()).subject).toBe("Your week in Notchbook");
    expect(build("full", week(), mentor).subject).toBe("Your week in Notchbook");
  });

  it("is nothing without a notebook", () => expect(buildDigest(data("full"))).toBeNull());

  it("puts own notebooks first and an educator's people last", () => {
    const headings = build("links", week({ role: "educator" }), week({ role: "mentor" }), week()).sections.map(({ heading }) => heading);
    expect(headings).toEqual(["Your notebook", "Ilka Brandvold’s notebook", "People you review for"]);
  });

  it("never says more at a lower level: no value, share or name of a setting at links, no value or share at summary", () => {
    const fraction = fc.double({ min: 0, max: 1, noNaN: true });
    const shares = fc.record({ days: fc.constantFrom(7, 14), inRangeFraction: fraction, belowFraction: fraction, coveredFraction: fraction });
    const role = fc.constantFrom("person" as const, "mentor" as const, "educator" as const, "family" as const);
    fc.assert(
      fc.property(shares, shares, role, (inWeek, inFortnight, as) => {
        const given = week({ role: as, week: inWeek, fortnight: inFortnight });
        expect(linesOf(build("links", given)).join(" ")).not.toMatch(/%|U\/h|→|basal|in range|below|night/i);
        expect(linesOf(build("summary", given)).join(" ")).not.toMatch(/%|U\/h|→/);
      }),
    );
  });
});
