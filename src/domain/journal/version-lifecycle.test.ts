import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { assertEdge, nextState, VERSION_EDGES, VERSION_STATES, type VersionEvent, type VersionState } from "./version-lifecycle";

vi.setConfig({ testTimeout: 60_000 });

const EVENTS: VersionEvent[] = [
  "propose",
  "propose-again",
  "return",
  "decline",
  "withdraw",
  "approve",
  "record",
  "effect",
  "lapse",
  "supersede",
];

/** Written out by hand, so that a slip in the table is seen here. */
const LEGAL: [VersionState, VersionEvent, VersionState][] = [
  ["draft", "propose", "proposed"],
  ["draft", "record", "in-effect"],
  ["draft", "withdraw", "withdrawn"],
  ["proposed", "return", "returned"],
  ["proposed", "decline", "declined"],
  ["proposed", "approve", "approved"],
  ["proposed", "withdraw", "withdrawn"],
  ["returned", "propose-again", "proposed"],
  ["returned", "withdraw", "withdrawn"],
  ["approved", "effect", "in-effect"],
  ["approved", "lapse", "returned"],
  ["approved", "withdraw", "withdrawn"],
  ["in-effect", "supersede", "superseded"],
];

const ILLEGAL = VERSION_STATES.flatMap((state) =>
  EVENTS.filter((event) => !LEGAL.some(([from, by]) => from === state && by === event)).map((event) => ({ state, event })),
);

describe("the life of a version", () => {
  it("has eight states, ten events, thirteen edges", () => {
    expect(VERSION_STATES).toHaveLength(8);
    expect(LEGAL).toHaveLength(13);
    expect(ILLEGAL).toHaveLength(8 * 10 - 13);
    expect(Object.values(VERSION_EDGES).flatMap((edges) => Object.keys(edges))).toHaveLength(13);
  });

  it.each(LEGAL)("%s: %s leads to %s", (state, event, expected) => {
    expect(nextState(state, event)).toBe(expected);
    expect(assertEdge(state, event)).toBe(expected);
  });

  it.each(ILLEGAL)("$state: $event is refused", ({ state, event }) => {
    expect(nextState(state, event)).toBeNull();
    expect(() => assertEdge(state, event)).toThrow(expect.objectContaining({ code: "CONFLICT" }));
  });

  it.each(["declined", "superseded", "withdrawn"] as const)("%s is an end", (state) => {
    expect(EVENTS.map((event) => nextState(state, event))).toEqual(EVENTS.map(() => null));
  });

  it("knows nothing of events from outside the list", () => {
    for (const event of ["toString", "constructor", "__proto__"]) {
      expect(() => assertEdge("draft", event as VersionEvent)).toThrow(expect.objectContaining({ code: "CONFLICT" }));
    }
  });

  it("walks only along its edges, and comes into effect only by record or after approve", () => {
    fc.assert(
      fc.property(fc.array(fc.constantFrom(...EVENTS), { maxLength: 40 }), (events) => {
        let state: VersionState = "draft";
        const taken: VersionEvent[] = [];
        for (const event of events) {
          const next = nextState(state, event);
          if (next === null) continue;
          expect(LEGAL).toContainEqual([state, event, next]);
          state = next;
          taken.push(event);
        }
        expect(VERSION_STATES).toContain(state);
        if (state === "in-effect" || state === "superseded") {
          const entered = taken.findIndex((event) => event === "record" || event === "effect");
          if (taken[entered] === "record") expect(entered).toBe(0);
          else expect(taken[entered - 1]).toBe("approve");
        }
        expect(taken.filter((event) => event === "record" || event === "effect").length).toBeLessThanOrEqual(1);
        expect(taken.filter((event) => event === "propose").length).toBeLessThanOrEqual(1);
      }),
      { numRuns: 10_000 },
    );
  });
});
