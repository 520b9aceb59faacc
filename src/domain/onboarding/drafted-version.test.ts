import { describe, expect, it } from "vitest";
import { AppError } from "@/domain/errors";
import { INJECTIONS, REFERENCE_DRAFT } from "./draft.fixture";
import { draftedVersion } from "./drafted-version";

function refusalOf(work: () => unknown): AppError | null {
  try {
    work();
    return null;
  } catch (error) {
    return error instanceof AppError ? error : null;
  }
}

describe("draftedVersion", () => {
  it("holds the profile, the educator's arithmetic and the checks", () => {
    const { profile, arithmetic, checks } = draftedVersion(REFERENCE_DRAFT, INJECTIONS);
    expect(profile.basal).toEqual([{ startMinute: 0, milliUnitsPerHour: 500 }]);
    expect(arithmetic.totalDailyDose.cautious).toBe(30);
    expect(checks.map(({ code }) => code)).toContain("ketones-and-site");
  });

  it("holds the arithmetic for the educator although the gate is closed", () => {
    const closed = { ...REFERENCE_DRAFT, gate: { ...REFERENCE_DRAFT.gate, steroids: "yes" } };
    expect(draftedVersion(closed, INJECTIONS)).toMatchObject({ arithmetic: { gate: { open: false }, basal: { cautious: 0.5 } }, profile: { basal: [{ milliUnitsPerHour: 500 }] } });
  });

  it("never puts the preset in place of a page that can't be read", () => {
    const half = { ...REFERENCE_DRAFT, basal: { blocks: [{ from: "00:00", value: "0.4" }, { from: "04:00", value: "" }] } };
    expect(refusalOf(() => draftedVersion(half, INJECTIONS))?.fields).toEqual({ form: ["A field of the page “Basal” can’t be read yet."] });
  });

  it("refuses what a check blocks, in the check's own words", () => {
    const offStep = { ...REFERENCE_DRAFT, basal: { blocks: [{ from: "00:00", value: "0.43" }] } };
    expect(refusalOf(() => draftedVersion(offStep, INJECTIONS))?.fields?.form?.[0]).toContain("0.43 U/h");
  });

  it.each(["about-you", "gate"])("refuses while the page %s is missing", (page) => {
    const { [page]: _missing, ...rest } = REFERENCE_DRAFT;
    expect(refusalOf(() => draftedVersion(rest, INJECTIONS))?.code).toBe("INVALID_INPUT");
  });
});
