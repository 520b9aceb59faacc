import { describe, expect, it } from "vitest";
import { instantsOfLocal } from "./local-times";

describe("instantsOfLocal", () => {
  // The five local times that the project's format notes verified with plain Intl.
  it.each([
    ["2024-10-27T03:30Z", "Europe/Helsinki", 2],
    ["2024-03-31T03:30Z", "Europe/Helsinki", 0],
    ["2024-11-03T01:30Z", "America/New_York", 2],
    ["2024-04-07T01:45Z", "Australia/Lord_Howe", 2],
    ["2024-06-01T12:00Z", "America/St_Johns", 1],
  ])("%s in %s happens %s times", (local, zone, times) => {
    expect(instantsOfLocal(Date.parse(local), zone)).toHaveLength(times);
  });

  it("has the two passes of Lord Howe thirty minutes apart", () => {
    const [first = 0, second = 0] = instantsOfLocal(Date.parse("2024-04-07T01:45Z"), "Australia/Lord_Howe");
    expect(second - first).toBe(30 * 60_000);
  });
});
