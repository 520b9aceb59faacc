import { describe, expect, it } from "vitest";
import { asideOf, isSamePage, savedCountOf, withAside, withoutAside, withPage } from "./draft-pages";

describe("pages of a draft", () => {
  it("remembers at which count each was saved", () => {
    const draft = withPage(withPage({}, "basal", { blocks: [] }, 4), "gate", {}, 5);
    expect([savedCountOf(draft, "basal"), savedCountOf(draft, "gate"), savedCountOf(draft, "margin")]).toEqual([4, 5, 0]);
    expect(draft.basal).toEqual({ blocks: [] });
  });

  it("keeps every text beside a page until a choice is made, the same one once", () => {
    const first = withAside({}, "about-you", { weightKg: "70" });
    const both = withAside(withAside(first, "about-you", { weightKg: "71" }), "about-you", { weightKg: " 70 " });
    expect(asideOf(both, "about-you")).toEqual([{ weightKg: "71" }, { weightKg: " 70 " }]);
    expect(asideOf(both, "gate")).toEqual([]);
    expect(asideOf(withoutAside(both, "about-you"), "about-you")).toEqual([]);
  });
});

describe("isSamePage", () => {
  it.each([
    [{ a: "1", b: "" }, { a: " 1 " }, true],
    [{ rows: [{ name: "", phone: "" }, { name: "Bo" }] }, { rows: [{ name: "Bo" }] }, true],
    [{ a: "1", b: "2" }, { b: "2", a: "1" }, true],
    [{ a: "1" }, { a: "2" }, false],
    [{ rows: [{ from: "00:00" }, { from: "04:00" }] }, { rows: [{ from: "04:00" }, { from: "00:00" }] }, false],
    [{}, undefined, true],
  ])("%j and %j: %j", (a, b, same) => expect(isSamePage(a, b)).toBe(same));
});
