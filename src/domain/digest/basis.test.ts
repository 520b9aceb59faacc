import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { SCOPES, type Scope } from "@/domain/access/permissions";
import { DIGEST_LEVELS, doesBasisHold, type DigestBasis } from "./basis";

const grant = (journalId: string, scopes: Scope[], role: "mentor" | "educator" = "mentor") => ({ journalId, role, scopes });
const basis: DigestBasis = { level: "summary", grants: [grant("a", ["settings", "glucose"]), grant("b", ["settings"])] };

describe("doesBasisHold", () => {
  it.each<[string, DigestBasis, boolean]>([
    ["as it was", basis, true],
    ["more is shared, and more wanted", { level: "full", grants: [grant("a", [...SCOPES]), grant("b", [...SCOPES]), grant("c", [])] }, true],
    ["switched off", { ...basis, level: "off" }, false],
    ["less wanted", { ...basis, level: "links" }, false],
    ["one journal withdrawn", { ...basis, grants: basis.grants.slice(0, 1) }, false],
    ["one scope withdrawn", { ...basis, grants: [grant("a", ["settings"]), grant("b", ["settings"])] }, false],
    ["another role", { ...basis, grants: [grant("a", ["settings", "glucose"], "educator"), grant("b", ["settings"])] }, false],
  ])("%s: %s", (_name, now, holds) => expect(doesBasisHold(basis, now)).toBe(holds));

  it("never holds under less than it was written under", () => {
    const scopes = fc.subarray([...SCOPES]);
    const any = fc.record({ level: fc.constantFrom(...DIGEST_LEVELS), grants: fc.array(fc.record({ journalId: fc.constantFrom("a", "b"), role: fc.constant("mentor" as const), scopes }), { maxLength: 2 }) });
    fc.assert(
      fc.property(any, fc.nat(3), (written, drop) => {
        const fewer = { ...written, grants: written.grants.filter((_, i) => i !== drop) };
        if (fewer.grants.length < new Set(written.grants.map((g) => g.journalId)).size) expect(doesBasisHold(written, fewer)).toBe(false);
        expect(doesBasisHold(written, { ...written, level: "off" })).toBe(false);
      }),
    );
  });
});
