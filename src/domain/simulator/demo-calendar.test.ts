import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DEMO_DAYS, DEMO_EFFECTIVE, DEMO_FEVER, hasBegun, isDemoDayOff, momentOfSlot, slotOfMoment } from "./demo-calendar";

describe("the demo's calendar", () => {
  // Before: change day - 2 back to the day after the change before; after: from the day after, to the day before the next.
  it("leaves three days on each side of every change that the story wants compared", () => {
    const { version1, version2, version3, version4, version5 } = DEMO_EFFECTIVE;
    const before = (change: number, previous: number) => change - 2 - previous;
    const after = (change: number, next: number) => next - 1 - change;
    expect(before(version2.day, version1.day)).toBeGreaterThanOrEqual(3);
    expect(after(version2.day, version3.day)).toBeGreaterThanOrEqual(3);
    const feverDays = DEMO_FEVER.lastDay - DEMO_FEVER.firstDay + 2;
    expect(after(version3.day, version4.day) - feverDays).toBeGreaterThanOrEqual(5);
    expect(after(version4.day, version5.day)).toBeGreaterThanOrEqual(3);
  });

  it("turns moments into slots and back", () => {
    expect(slotOfMoment({ day: 1, minute: 0 })).toBe(0);
    expect(slotOfMoment({ day: 2, minute: 7 })).toBe(290);
    fc.assert(fc.property(fc.integer({ min: 0, max: DEMO_DAYS * 288 - 1 }), (slot) => slotOfMoment(momentOfSlot(slot)) === slot));
  });

  it("begins when version 1 is switched on", () => {
    expect(hasBegun(slotOfMoment(DEMO_EFFECTIVE.version1) - 1)).toBe(false);
    expect(hasBegun(slotOfMoment(DEMO_EFFECTIVE.version1))).toBe(true);
  });

  it("has two days off in seven", () => {
    expect(Array.from({ length: 28 }, (_, i) => i + 1).filter(isDemoDayOff)).toEqual([6, 7, 13, 14, 20, 21, 27, 28]);
  });
});
