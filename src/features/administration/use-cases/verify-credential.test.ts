import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findCredential, upsertCredential } from "@/db/repositories/credentials";
import { can } from "@/domain/access/policy";
import { anonymousContext, contextFor, createHelper, createJournal, createPerson, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { serviceHealth } from "../queries/health";
import { verifyCredential } from "./verify-credential";

const licence = { profession: "Diabetes educator", licenceNumber: "X-2", jurisdiction: "Nowhere", expiresOn: "2099-12-31", submittedAt: TEST_NOW };

describe("what an administrator does", () => {
  let db: Pool;
  let administratorId: string;
  let journal: { journalId: string; ownerId: string };
  beforeAll(async () => {
    db = await createTestDb();
    administratorId = await createPerson(db, { isAdministrator: true });
    journal = await createJournal(db, { name: "A notebook of nobody’s business" });
  });

  async function educator() {
    const userId = await createHelper(db, { ...journal, role: "educator", isLicensed: false });
    await upsertCredential(db, { ...licence, userId });
    return userId;
  }

  it("makes an educator’s approvals count, and notes who looked", async () => {
    const userId = await educator();
    await verifyCredential(await contextFor(db, administratorId), { userId });
    expect(await findCredential(db, userId)).toMatchObject({ verifiedAt: TEST_NOW, verifiedBy: administratorId });
    expect(can((await contextFor(db, userId)).actor, "version.review", journal.journalId)).toBe(true);
  });

  it("verifies nobody without a licence, and not the own one", async () => {
    const ctx = await contextFor(db, administratorId);
    await expect(verifyCredential(ctx, { userId: await createPerson(db) })).rejects.toMatchObject({ code: "NOT_FOUND" });
    await upsertCredential(db, { ...licence, userId: administratorId });
    await expect(verifyCredential(ctx, { userId: administratorId })).rejects.toMatchObject({ code: "FORBIDDEN" });
    expect(await findCredential(db, administratorId)).toMatchObject({ verifiedAt: null });
    await expect(verifyCredential(ctx, { userId: "x" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["userId"] })] });
  });

  it("is refused to everybody else, an educator among them", async () => {
    const userId = await educator();
    for (const ctx of [await strangerContext(db), await contextFor(db, userId), await contextFor(db, journal.ownerId)]) {
      await expect(verifyCredential(ctx, { userId })).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expect(serviceHealth(ctx)).rejects.toMatchObject({ code: "FORBIDDEN" });
    }
    await expect(verifyCredential(anonymousContext(db), { userId })).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    await expect(serviceHealth(anonymousContext(db))).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    expect(await findCredential(db, userId)).toMatchObject({ verifiedAt: null });
  });

  it("sees counts and waiting licences, and no journal", async () => {
    const waiting = await educator();
    const health = await serviceHealth(await contextFor(db, administratorId));
    expect(health.credentials.map((c) => c.userId)).toContain(waiting);
    expect(health.accounts.all).toBeGreaterThan(1);
    expect(health.accounts.verified).toBe(health.accounts.all);
    expect(JSON.stringify(health)).not.toMatch(/nobody’s business|@example/);
    expect(can((await contextFor(db, administratorId)).actor, "journal.read", journal.journalId)).toBe(false);
  });
});
