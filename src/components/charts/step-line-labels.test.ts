import { describe, expect, it } from "vitest";
import { labelPlaces } from "./step-line-labels";

const scale = { x: (minute: number) => 48 + (minute / 1440) * 600, y: (value: number) => 184 - value * 158, left: 48, right: 648, top: 20 };
const words = { current: "cautious start, 12.0 U", previous: "as it is now, 16.8 U" };

describe("labelPlaces", () => {
  it("stands over the middle of the longest block", () => {
    const { current, previous } = labelPlaces([{ startMinute: 0, value: 0.4 }, { startMinute: 240, value: 0.5 }], null, words, scale);
    expect(current).toEqual({ x: scale.x(840), y: scale.y(0.5) - 8 });
    expect(previous).toBeNull();
  });

  it("keeps words inside the drawing", () => {
    const { current } = labelPlaces([{ startMinute: 0, value: 0.4 }, { startMinute: 1, value: 0.9 }, { startMinute: 2, value: 0.4 }], null, { ...words, current: "x".repeat(80) }, scale);
    expect(current!.x).toBeLessThanOrEqual(scale.right - 276);
    const top = labelPlaces([{ startMinute: 0, value: 1.05 }], null, words, scale).current!;
    expect(top.y).toBe(scale.y(1.05) + 18);
  });

  it("parts two words that would meet", () => {
    const { current, previous } = labelPlaces([{ startMinute: 0, value: 0.5 }], [{ startMinute: 0, value: 0.55 }], words, scale);
    expect(Math.abs(current!.y - previous!.y)).toBeGreaterThanOrEqual(17);
    expect(current!.y).toBeGreaterThan(scale.y(0.5));
  });

  it("has nowhere to stand without blocks", () => expect(labelPlaces([], [], words, scale)).toEqual({ current: null, previous: null }));
});
