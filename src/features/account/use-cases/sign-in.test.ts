import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { anonymousContext, createPerson, TEST_PASSWORD } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { localPath, signIn } from "./sign-in";

describe("signIn", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const refusedWith = async (email: string, password: string): Promise<unknown> => {
    const error: unknown = await signIn(anonymousContext(db), { email, password }).then(() => null, (reason: unknown) => reason);
    return error && typeof error === "object" && "fields" in error ? error.fields : error;
  };

  it("knows an address however it is written, and says whether it is verified", async () => {
    const userId = await createPerson(db, { email: "ada@example.org" });
    const unverified = await createPerson(db, { email: "new@example.org", isVerified: false });
    expect(await signIn(anonymousContext(db), { email: " Ada@Example.ORG ", password: TEST_PASSWORD })).toEqual({ userId, isEmailVerified: true, next: "/journals" });
    expect(await signIn(anonymousContext(db), { email: "new@example.org", password: TEST_PASSWORD, next: "/account" })).toEqual({ userId: unverified, isEmailVerified: false, next: "/account" });
  });

  it("says the same words for an unknown address and for a password that does not match", async () => {
    await createPerson(db, { email: "same@example.org" });
    const mismatch = await refusedWith("same@example.org", "another password entirely");
    expect(mismatch).toEqual({ password: [expect.stringContaining("do not belong together")] });
    expect(await refusedWith("nobody@example.org", TEST_PASSWORD)).toEqual(mismatch);
  });

  it("stops after ten attempts on one address, known or not, and forgets them after one that was right", async () => {
    await createPerson(db, { email: "forgotten@example.org" });
    for (let i = 0; i < 9; i += 1) await refusedWith("forgotten@example.org", "x");
    await signIn(anonymousContext(db), { email: "forgotten@example.org", password: TEST_PASSWORD });
    for (const email of ["forgotten@example.org", "unknown@example.org"]) {
      for (let i = 0; i < 10; i += 1) expect(await refusedWith(email, "x")).toHaveProperty("password");
      await expect(signIn(anonymousContext(db), { email, password: TEST_PASSWORD })).rejects.toMatchObject({ code: "TOO_MANY" });
    }
  });

  it("stops one network address that goes through the accounts, and no other", async () => {
    const enter = (n: number, from: string) => signIn(anonymousContext(db), { email: `guess-${n}@example.org`, password: "x" }, from);
    const spent = await Promise.allSettled(Array.from({ length: 50 }, (_, n) => enter(n, "192.0.2.1")));
    expect(spent.every((one) => one.status === "rejected" && (one.reason as { code?: string }).code === "INVALID_INPUT")).toBe(true);
    await expect(enter(50, "192.0.2.1")).rejects.toMatchObject({ code: "TOO_MANY" });
    await expect(enter(50, "192.0.2.2")).rejects.toMatchObject({ code: "INVALID_INPUT" });
  });

  it.each([
    ["/j/1/today?x=1#part", "/j/1/today?x=1#part"],
    ["//elsewhere.example", "/journals"],
    ["/\\elsewhere.example", "/journals"],
    ["https://elsewhere.example", "/journals"],
    ["javascript:alert(1)", "/journals"],
    ["", "/journals"],
    [undefined, "/journals"],
  ])("goes on from %s to %s", (next, path) => {
    expect(localPath(next)).toBe(path);
  });

  it.each([["email", { email: "none" }], ["password", { password: "" }]])("refuses a form whose %s is amiss", async (field, wrong) => {
    const form = { email: "ada@example.org", password: TEST_PASSWORD, ...wrong };
    await expect(signIn(anonymousContext(db), form)).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
  });
});
