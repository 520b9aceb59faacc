import { describe, expect, it } from "vitest";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import { draftStanding } from "./draft-standing";

const version = (state: VersionState, number = 1, kind = "starting") => ({ number, revision: 1, kind, state });

describe("draftStanding", () => {
  it.each(["proposed", "approved", "in-effect", "superseded"] as const)("is sent while version 1 is %s", (state) => {
    expect(draftStanding([version(state)])).toEqual({ is: "sent", version: version(state) });
  });
  it.each(["declined", "withdrawn"] as const)("is open again after an end: %s", (state) => expect(draftStanding([version(state)])).toEqual({ is: "open", returned: null }));
  it("is open for mending after a return, under the same number", () => expect(draftStanding([version("returned")])).toEqual({ is: "open", returned: version("returned") }));
  it("is open before there is a version", () => expect(draftStanding([])).toEqual({ is: "open", returned: null }));
  it("points at the starting profile, not at a later change", () => {
    expect(draftStanding([version("proposed", 2, "change"), version("in-effect", 1)])).toEqual({ is: "sent", version: version("in-effect", 1) });
  });
});
