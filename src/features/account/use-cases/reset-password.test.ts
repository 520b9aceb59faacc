import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { outbox } from "@/db/schema/mail";
import { anonymousContext, contextAs, contextFor, createPerson, TEST_NOW, TEST_PASSWORD } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { RESET_LINK_MINUTES } from "../constants";
import { changePassword } from "./change-password";
import { requestReset } from "./request-reset";
import { resetPassword } from "./reset-password";
import { signIn } from "./sign-in";
import { verifyEmail } from "./verify-email";

const NEW_PASSWORD = "seven quiet boats at dawn";

describe("a new password", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const mailsTo = (address: string) => db.select().from(outbox).where(eq(outbox.toAddress, address));
  const enters = (email: string, password: string) => signIn(anonymousContext(db), { email, password }).then(() => true, () => false);

  async function forgetful(email: string) {
    const userId = await createPerson(db, { email });
    await requestReset(anonymousContext(db), { email });
    const [mail] = await mailsTo(email);
    return { userId, token: /token=([\w-]{43})/.exec(mail?.text ?? "")?.[1] ?? "" };
  }

  it("answers alike for an unknown address, and mails nobody", async () => {
    await createPerson(db, { email: "known@example.org" });
    expect(await requestReset(anonymousContext(db), { email: "known@example.org" })).toEqual(await requestReset(anonymousContext(db), { email: "unknown@example.org" }));
    expect(await mailsTo("known@example.org")).toMatchObject([{ kind: "reset-password" }]);
    expect(await mailsTo("unknown@example.org")).toEqual([]);
  });

  it("stops after five requests an hour for one address", async () => {
    for (let i = 0; i < 5; i += 1) await requestReset(anonymousContext(db), { email: "many@example.org" });
    await expect(requestReset(anonymousContext(db), { email: "many@example.org" })).rejects.toMatchObject({ code: "TOO_MANY" });
  });

  it("spends the mailed link once, and tells the owner", async () => {
    const email = "once@example.org";
    const { userId, token } = await forgetful(email);
    const presses = await Promise.allSettled([0, 1, 2].map((n) => resetPassword(anonymousContext(db), { token, password: `${NEW_PASSWORD} ${n}` })));
    const won = presses.findIndex((p) => p.status === "fulfilled");
    expect(presses.filter((p) => p.status === "fulfilled")).toEqual([{ status: "fulfilled", value: { userId } }]);
    for (const p of presses) if (p.status === "rejected") expect(p.reason).toMatchObject({ code: "INVALID_INPUT", fields: { token: [expect.any(String)] } });
    expect(await enters(email, TEST_PASSWORD)).toBe(false);
    expect(await enters(email, `${NEW_PASSWORD} ${won}`)).toBe(true);
    expect((await mailsTo(email)).map((m) => m.kind).sort()).toEqual(["password-changed", "reset-password"]);
  });

  it("refuses a link that has run out or is for something else, and a weak password, and keeps the old one", async () => {
    const email = "late@example.org";
    const { token } = await forgetful(email);
    const later = contextAs(db, { type: "anonymous" }, new Date(TEST_NOW.getTime() + RESET_LINK_MINUTES * 60_000));
    await expect(resetPassword(later, { token, password: NEW_PASSWORD })).rejects.toMatchObject({ code: "INVALID_INPUT" });
    await expect(verifyEmail(anonymousContext(db), { token })).rejects.toMatchObject({ code: "INVALID_INPUT" });
    await expect(resetPassword(anonymousContext(db), { token, password: "short" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["password"] })] });
    expect(await enters(email, TEST_PASSWORD)).toBe(true);
    await resetPassword(anonymousContext(db), { token, password: NEW_PASSWORD });
    expect(await enters(email, NEW_PASSWORD)).toBe(true);
  });

  it("is changed by whoever knows the present one, and by nobody else", async () => {
    const email = "change@example.org";
    const ctx = await contextFor(db, await createPerson(db, { email }));
    await expect(changePassword(ctx, { currentPassword: "a guess of some kind", password: NEW_PASSWORD })).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { currentPassword: [expect.any(String)] } });
    await expect(changePassword(ctx, { currentPassword: TEST_PASSWORD, password: "short" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["password"] })] });
    await expect(changePassword(anonymousContext(db), { currentPassword: TEST_PASSWORD, password: NEW_PASSWORD })).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    expect(await enters(email, TEST_PASSWORD)).toBe(true);
    await changePassword(ctx, { currentPassword: TEST_PASSWORD, password: NEW_PASSWORD });
    expect([await enters(email, TEST_PASSWORD), await enters(email, NEW_PASSWORD)]).toEqual([false, true]);
    expect((await mailsTo(email)).map((m) => m.kind)).toEqual(["password-changed"]);
  });
});
