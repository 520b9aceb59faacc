import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findAccount, findAccountByEmail } from "@/db/repositories/accounts";
import { emailTokens } from "@/db/schema/people";
import { outbox } from "@/db/schema/mail";
import { anonymousContext, contextAs, contextFor, createPerson, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { VERIFY_LINK_HOURS } from "../constants";
import { resendVerification } from "./resend-verification";
import { signUp } from "./sign-up";
import { verifyEmail } from "./verify-email";

const HOUR_MS = 3_600_000;

describe("verifying an address", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const linksTo = async (address: string) => {
    const mails = await db.select().from(outbox).where(eq(outbox.toAddress, address));
    return mails.map((mail) => /token=([\w-]{43})/.exec(mail.text)?.[1] ?? "");
  };

  async function signedUp(email: string) {
    const { userId } = await signUp(anonymousContext(db), { displayName: "Ada Invented", email, password: "three small birds sing", timeZone: "Europe/Oslo", isAdultOrHelper: "on" });
    const [token] = await linksTo(email);
    return { userId: userId ?? "", token: token ?? "" };
  }

  it("spends the mailed link once, of all who press at the same moment", async () => {
    const { userId, token } = await signedUp("once@example.org");
    const presses = await Promise.allSettled(Array.from({ length: 5 }, () => verifyEmail(anonymousContext(db), { token })));
    expect(presses.filter((p) => p.status === "fulfilled")).toEqual([{ status: "fulfilled", value: { userId } }]);
    for (const p of presses) if (p.status === "rejected") expect(p.reason).toMatchObject({ code: "INVALID_INPUT", fields: { token: [expect.any(String)] } });
    expect(await findAccountByEmail(db, "once@example.org")).toMatchObject({ id: userId, emailVerifiedAt: TEST_NOW });
  });

  it("keeps no link in the database in the clear", async () => {
    const { userId, token } = await signedUp("hashed@example.org");
    const [row] = await db.select().from(emailTokens).where(eq(emailTokens.userId, userId));
    expect(row?.tokenHash).toMatch(/^[0-9a-f]{64}$/);
    expect(JSON.stringify(row)).not.toContain(token);
  });

  it("refuses a link that has run out, an unknown one and half a one, and verifies nobody", async () => {
    const { userId, token } = await signedUp("late@example.org");
    const later = contextAs(db, { type: "anonymous" }, new Date(TEST_NOW.getTime() + VERIFY_LINK_HOURS * HOUR_MS));
    await expect(verifyEmail(later, { token })).rejects.toMatchObject({ code: "INVALID_INPUT" });
    await expect(verifyEmail(anonymousContext(db), { token: "A".repeat(43) })).rejects.toMatchObject({ code: "INVALID_INPUT" });
    await expect(verifyEmail(anonymousContext(db), { token: token.slice(1) })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["token"] })] });
    expect(await findAccount(db, userId)).toMatchObject({ emailVerifiedAt: null });
  });

  it("sends another link on asking, to the unverified only, five times an hour", async () => {
    const { userId } = await signedUp("again@example.org");
    const ctx = await contextFor(db, userId);
    for (let i = 0; i < 5; i += 1) await resendVerification(ctx);
    await expect(resendVerification(ctx)).rejects.toMatchObject({ code: "TOO_MANY" });
    const links = await linksTo("again@example.org");
    expect(new Set(links).size).toBe(6);
    expect(await verifyEmail(anonymousContext(db), { token: links.at(-1) ?? "" })).toEqual({ userId });

    const verified = await createPerson(db, { email: "already@example.org" });
    await resendVerification(await contextFor(db, verified));
    expect(await linksTo("already@example.org")).toEqual([]);
    await expect(resendVerification(anonymousContext(db))).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
  });
});
