import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { STATE } from "./model";
import { NOMINAL_PARAMETERS as P } from "./parameters";
import { referenceRun, type RunEvent } from "./reference-run";

const DAY = { startMmol: 6, untilMinute: 1440, everyMinutes: 5 };
const B = 0.38571841287831665;

/** The inputs of the reference run of comparison.md 5. */
const REFERENCE: RunEvent[] = [
  ...([[0, B], [180, 0.8 * B], [300, B], [1080, 1.2 * B], [1200, B]] as const).map(([minute, value]) => ({ kind: "basal" as const, minute, value })),
  ...([[480, 3], [780, 3.2], [1140, 3.6], [1320, 0.4]] as const).map(([minute, value]) => ({ kind: "bolus" as const, minute, value })),
  ...([[480, 60], [780, 70], [960, 15], [1140, 80]] as const).map(([minute, value]) => ({ kind: "meal" as const, minute, value })),
];

const glucoseAt = (rows: ReturnType<typeof referenceRun>, minute: number) => rows.find((row) => row.minute === minute)!.glucoseMmol;

describe("referenceRun", () => {
  // comparison.md 5: scipy 1.10 DOP853, rtol 1e-10, atol 1e-12, of the published equations.
  it.each([[300, 6.1531532], [480, 6.68406842], [540, 11.2092912], [600, 8.26996561], [840, 8.56055156], [1080, 4.83573564], [1440, 2.74089599]])(
    "agrees with an outside solver at minute %s", (minute, glucose) => {
      expect(Math.abs(glucoseAt(referenceRun(P, REFERENCE, DAY), minute) - glucose)).toBeLessThan(1e-5);
    },
  );

  it("stays where it is when nothing is given", () => {
    const rows = referenceRun(P, [], DAY);
    expect(rows).toHaveLength(289);
    for (const { glucoseMmol } of rows) expect(glucoseMmol).toBeCloseTo(6, 9);
  });

  it("shows at the time of an input the state after it", () => {
    const rows = referenceRun(P, [{ kind: "bolus", minute: 10, value: 2 }, { kind: "meal", minute: 10, value: 20 }], { ...DAY, untilMinute: 10 });
    expect(rows[2]!.state[STATE.depot1]! - rows[1]!.state[STATE.depot1]!).toBeCloseTo(2000, 6);
    expect(rows[2]!.state[STATE.meal1]).toBeCloseTo(88.81, 2);
    expect(rows[2]!.glucoseMmol).toBeCloseTo(6, 9);
  });

  it("takes inputs between two rows, in any order of the list", () => {
    const events: RunEvent[] = [{ kind: "meal", minute: 482.3, value: 40 }, { kind: "bolus", minute: 477, value: 2 }, { kind: "basal", minute: 61, value: 0.2 }];
    const coarse = referenceRun(P, events, { ...DAY, everyMinutes: 60 });
    const fine = referenceRun(P, events.toReversed(), { ...DAY, everyMinutes: 1 });
    for (const { minute, glucoseMmol } of coarse) expect(Math.abs(glucoseAt(fine, minute) - glucoseMmol)).toBeLessThan(1e-5);
  });

  it("gives lower glucose for more insulin and higher for more food, whatever the amounts", () => {
    const amount = fc.double({ min: 0.1, max: 3, noNaN: true });
    fc.assert(
      fc.property(amount, amount, fc.integer({ min: 0, max: 600 }), (units, more, minute) => {
        const end = (events: RunEvent[]) => referenceRun(P, events, { ...DAY, untilMinute: 720, everyMinutes: 720 })[1]!.glucoseMmol;
        const base: RunEvent[] = [{ kind: "bolus", minute, value: units }, { kind: "meal", minute, value: 20 * units }];
        expect(end([...base, { kind: "bolus", minute, value: more }])).toBeLessThan(end(base));
        expect(end([...base, { kind: "meal", minute, value: 10 * more }])).toBeGreaterThan(end(base));
      }),
      { numRuns: 20 },
    );
  });

  it.each([{ kind: "meal", minute: -1, value: 5 }, { kind: "basal", minute: 0, value: -0.1 }, { kind: "bolus", minute: Number.NaN, value: 1 }, { kind: "bolus", minute: 5, value: Number.POSITIVE_INFINITY }] as RunEvent[])(
    "refuses %j", (event) => expect(() => referenceRun(P, [event], DAY)).toThrow(expect.objectContaining({ code: "INVALID_RANGE" })),
  );
});
