import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findAccount } from "@/db/repositories/accounts";
import { findCredential, markCredentialVerified } from "@/db/repositories/credentials";
import { can } from "@/domain/access/policy";
import { anonymousContext, contextFor, createHelper, createJournal, createPerson, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { endSession } from "./end-session";
import { signOut } from "./sign-out";
import { submitCredential } from "./submit-credential";
import { updateProfile } from "./update-profile";

const licence = { profession: "Diabetes educator", licenceNumber: "X-2", jurisdiction: "Nowhere", expiresOn: "2099-12-31" };
const profile = { displayName: "Ada the Second", timeZone: "Asia/Tokyo", glucoseUnit: "mmol/L" };

describe("one’s own account", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  it("changes the name, the zone and the unit, and nothing else that is sent along", async () => {
    const userId = await createPerson(db, { email: "own@example.org" });
    await updateProfile(await contextFor(db, userId), { ...profile, isAdministrator: true, email: "other@example.org", id: "another" });
    expect(await findAccount(db, userId)).toMatchObject({ ...profile, email: "own@example.org", isAdministrator: false });
  });

  it.each([
    ["displayName", { displayName: " " }],
    ["displayName", { displayName: "Ada\u202eadA" }],
    ["timeZone", { timeZone: "Moon/Base" }],
    ["glucoseUnit", { glucoseUnit: "stone" }],
  ])("refuses a profile whose %s is amiss, and keeps the old one", async (field, wrong) => {
    const userId = await createPerson(db);
    await expect(updateProfile(await contextFor(db, userId), { ...profile, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    expect(await findAccount(db, userId)).toMatchObject({ displayName: "Ada Invented", timeZone: "Europe/Oslo", glucoseUnit: "mg/dL" });
  });

  it("counts a licence only once it is verified, and no longer after it was handed in anew", async () => {
    const { journalId, ownerId } = await createJournal(db);
    const educatorId = await createHelper(db, { journalId, ownerId, role: "educator", isLicensed: false });
    const mayReview = async () => can((await contextFor(db, educatorId)).actor, "version.review", journalId);
    await submitCredential(await contextFor(db, educatorId), licence);
    expect([await findCredential(db, educatorId), await mayReview()]).toMatchObject([{ ...licence, verifiedAt: null }, false]);
    await markCredentialVerified(db, educatorId, ownerId, TEST_NOW);
    expect(await mayReview()).toBe(true);
    await submitCredential(await contextFor(db, educatorId), { ...licence, licenceNumber: "X-3", verifiedAt: TEST_NOW });
    expect([await findCredential(db, educatorId), await mayReview()]).toMatchObject([{ licenceNumber: "X-3", verifiedAt: null }, false]);
  });

  it("takes no licence from whoever has not verified their address, and none that is incomplete", async () => {
    const unverified = await createPerson(db, { isVerified: false });
    await expect(submitCredential(await contextFor(db, unverified), licence)).rejects.toMatchObject({ code: "FORBIDDEN" });
    const verified = await createPerson(db);
    await expect(submitCredential(await contextFor(db, verified), { ...licence, licenceNumber: "" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["licenceNumber"] })] });
    expect([await findCredential(db, unverified), await findCredential(db, verified)]).toEqual([undefined, undefined]);
  });

  it("ends only sessions of whoever asks", async () => {
    const userId = await createPerson(db);
    const ctx = await contextFor(db, userId);
    const sessionId = "a".repeat(64);
    expect(endSession(ctx, { sessionId })).toEqual({ userId, sessionId });
    expect(signOut(ctx)).toEqual({ userId });
    expect(() => endSession(ctx, { sessionId: "not one" })).toThrow(expect.objectContaining({ issues: [expect.objectContaining({ path: ["sessionId"] })] }) as Error);
  });

  it("is nobody’s while signed out", async () => {
    const ctx = anonymousContext(db);
    await expect(updateProfile(ctx, profile)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    await expect(submitCredential(ctx, licence)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    for (const leave of [() => signOut(ctx), () => endSession(ctx, { sessionId: "a".repeat(64) })]) {
      expect(leave).toThrow(expect.objectContaining({ code: "UNAUTHENTICATED" }) as Error);
    }
  });
});
