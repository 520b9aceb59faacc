import { describe, expect, it } from "vitest";
import { followUpsOf } from "./follow-ups";

const version = (reviewOn: string | null, lookAgainOn: string | null, state: "in-effect" | "approved" | "superseded" = "in-effect") => ({
  number: 3, state, reviewOn, lookAgainOn,
});
const TODAY = "2026-03-16";
const dates = (...versions: ReturnType<typeof version>[]) => followUpsOf(versions, TODAY).map(({ on, kind }) => `${kind} ${on}`);

describe("followUpsOf", () => {
  it("takes the coming seven days and the last 28", () => {
    const all = ["2026-02-15", "2026-02-16", "2026-03-16", "2026-03-22", "2026-03-23"].map((on) => version(on, null));
    expect(dates(...all)).toEqual(["review 2026-02-16", "review 2026-03-16", "review 2026-03-22"]);
  });

  it("tells reviews and planned looks, earliest first, of versions that are in force", () => {
    expect(dates(version("2026-03-20", "2026-03-17"), version("2026-03-19", null, "superseded"), version(null, "2026-03-18", "approved"))).toEqual([
      "look 2026-03-17", "look 2026-03-18", "review 2026-03-20",
    ]);
  });
});
