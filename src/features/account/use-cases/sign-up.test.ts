import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { outbox } from "@/db/schema/mail";
import { users } from "@/db/schema/people";
import { anonymousContext } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { signUp } from "./sign-up";

const form = { displayName: "Ada Invented", email: "Ada@Example.org", password: "three small birds sing", timeZone: "Europe/Oslo", isAdultOrHelper: "on" as const };

describe("signUp", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const mailsTo = (address: string) => db.select().from(outbox).where(eq(outbox.toAddress, address));

  it("makes an unverified account and one mail whose link is not in the database in the clear", async () => {
    await signUp(anonymousContext(db), form);
    const [account] = await db.select().from(users).where(eq(users.email, "ada@example.org"));
    expect(account).toMatchObject({ displayName: "Ada Invented", emailVerifiedAt: null });
    expect(account?.passwordHash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    const [mail] = await mailsTo("ada@example.org");
    expect(mail).toMatchObject({ kind: "verify-email", state: "waiting" });
    expect(mail?.text).toContain("/verify-email?token=");
  });

  it("answers alike for a taken address, keeps the account, and tells its owner by mail", async () => {
    const again = { ...form, email: "twice@example.org" };
    const first = await signUp(anonymousContext(db), again);
    const second = await signUp(anonymousContext(db), { ...again, displayName: "Somebody Else" });
    expect(second.email).toBe(first.email);
    expect(await db.select().from(users).where(eq(users.email, "twice@example.org"))).toHaveLength(1);
    expect((await mailsTo("twice@example.org")).map((m) => m.kind).sort()).toEqual(["account-exists", "verify-email"]);
  });

  it.each([
    ["email", { email: "nobody" }],
    ["password", { password: "short" }],
    ["password", { password: "passwordpassword" }],
    ["timeZone", { timeZone: "Moon/Base" }],
    ["isAdultOrHelper", { isAdultOrHelper: undefined }],
  ])("refuses a form whose %s is amiss, and writes nothing", async (field, wrong) => {
    const email = `refused-${field}@example.org`;
    await expect(signUp(anonymousContext(db), { ...form, email, ...wrong })).rejects.toMatchObject({
      issues: [expect.objectContaining({ path: [field] })],
    });
    expect(await db.select().from(users).where(eq(users.email, email))).toEqual([]);
  });
});
