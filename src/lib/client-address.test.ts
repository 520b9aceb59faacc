import { describe, expect, it } from "vitest";
import { clientAddress } from "./client-address";

const seen = (value?: string) => clientAddress(new Headers(value === undefined ? {} : { "x-forwarded-for": value }));

describe("clientAddress", () => {
  it("believes the last hand that wrote, not what the sender made up", () => {
    expect(seen("192.0.2.1")).toBe("192.0.2.1");
    expect(seen("10.0.0.1, 203.0.113.9 ,192.0.2.1 ")).toBe("192.0.2.1");
    expect(seen("2001:db8::1")).toBe("2001:db8::1");
  });

  it("is empty where nothing is noted, and never long", () => {
    expect(seen()).toBe("");
    expect(seen("x".repeat(500))).toHaveLength(64);
  });
});
