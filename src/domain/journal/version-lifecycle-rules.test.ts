import { describe, expect, it } from "vitest";
import {
  assertMayRecord,
  assertMayTakeEffect,
  assertNotOwnProposal,
  assertSameContent,
  hasApprovalLapsed,
} from "./version-lifecycle-rules";

const refused = (code: string) => expect.objectContaining({ code }) as Error;
const APPROVED_AT = Date.UTC(2026, 0, 5, 9);
const DAYS_14 = 14 * 24 * 60 * 60 * 1000;

describe("who decides", () => {
  it("is never the proposer", () => {
    expect(() => assertNotOwnProposal({ authorId: "a" }, "a")).toThrow(refused("FORBIDDEN"));
    expect(() => assertNotOwnProposal({ authorId: "a" }, "b")).not.toThrow();
  });
});

describe("an approval", () => {
  const approved = { contentHash: "h1", approvedHash: "h1", approvedAtMs: APPROVED_AT };

  it("binds the content that was shown", () => {
    expect(() => assertSameContent({ contentHash: "h1" }, "h1")).not.toThrow();
    expect(() => assertSameContent({ contentHash: "h1" }, "h2")).toThrow(refused("STALE"));
  });

  it("lets that content into effect, and nothing else", () => {
    expect(() => assertMayTakeEffect(approved, APPROVED_AT + 1)).not.toThrow();
    expect(() => assertMayTakeEffect({ ...approved, contentHash: "h2" }, APPROVED_AT + 1)).toThrow(refused("STALE"));
  });

  it("is asked for before effect", () => {
    expect(() => assertMayTakeEffect({ ...approved, approvedHash: null }, APPROVED_AT)).toThrow(refused("CONFLICT"));
    expect(() => assertMayTakeEffect({ ...approved, approvedAtMs: null }, APPROVED_AT)).toThrow(refused("CONFLICT"));
  });

  it("lapses after 14 days unused, not on the very instant", () => {
    expect(hasApprovalLapsed(APPROVED_AT, APPROVED_AT + DAYS_14)).toBe(false);
    expect(hasApprovalLapsed(APPROVED_AT, APPROVED_AT + DAYS_14 + 1)).toBe(true);
    expect(() => assertMayTakeEffect(approved, APPROVED_AT + DAYS_14)).not.toThrow();
    expect(() => assertMayTakeEffect(approved, APPROVED_AT + DAYS_14 + 1)).toThrow(refused("CONFLICT"));
  });
});

describe("recording without review", () => {
  it("needs an open gate; one that was never asked is not open", () => {
    expect(() => assertMayRecord(true)).not.toThrow();
    expect(() => assertMayRecord(false)).toThrow(refused("GATE_CLOSED"));
    expect(() => assertMayRecord(null)).toThrow(refused("GATE_CLOSED"));
  });
});
