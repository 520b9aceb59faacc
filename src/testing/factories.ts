import { randomUUID } from "node:crypto";
import type { Pool } from "@/db/client";
import { insertAccount } from "@/db/repositories/accounts";
import { upsertCredential } from "@/db/repositories/credentials";
import { upsertGrant } from "@/db/repositories/grants";
import { insertJournal } from "@/db/repositories/journals";
import { SCOPES } from "@/domain/access/permissions";
import type { Actor, JournalRole, Scope } from "@/domain/access/policy";
import { findActor } from "@/lib/actor";
import type { Context } from "@/lib/context";
import { hashPassword } from "@/lib/passwords";

/** The moment at which tests happen unless they say otherwise. */
export const TEST_NOW = new Date("2026-03-10T09:00:00Z");

export const TEST_PASSWORD = "three small birds sing";
let passwordHash: Promise<string> | undefined;

/** A verified account with a fresh address. @returns its id */
export async function createPerson(
  db: Pool,
  given: Partial<{ displayName: string; email: string; timeZone: string; isAdministrator: boolean; isVerified: boolean; at: Date }> = {},
): Promise<string> {
  passwordHash ??= hashPassword(TEST_PASSWORD);
  const at = given.at ?? TEST_NOW;
  const id = await insertAccount(db, {
    email: given.email ?? `${randomUUID()}@example.org`,
    displayName: given.displayName ?? "Ada Invented",
    passwordHash: await passwordHash,
    timeZone: given.timeZone ?? "Europe/Oslo",
    glucoseUnit: "mg/dL",
    createdAt: at,
    ...(given.isVerified === false ? {} : { emailVerifiedAt: at }),
    isAdministrator: given.isAdministrator ?? false,
  });
  if (!id) throw new Error("the address has an account already");
  return id;
}

/** A journal of its own fresh person. */
export async function createJournal(
  db: Pool,
  given: Partial<{ ownerId: string; timeZone: string; gateReasons: string[] | null; startedOn: string; at: Date; name: string }> = {},
): Promise<{ journalId: string; ownerId: string }> {
  const ownerId = given.ownerId ?? (await createPerson(db));
  const at = given.at ?? TEST_NOW;
  const journalId = await insertJournal(db, {
    ownerId,
    name: given.name ?? "A notebook",
    timeZone: given.timeZone ?? "Europe/Oslo",
    glucoseUnit: "mg/dL",
    plannedStartOn: "2026-03-01",
    startedOn: given.startedOn ?? null,
    therapy: "injections",
    setup: { pump: "pump", sensor: "sensor", controller: "loop", insulin: "rapid", basalStepMilliUnits: 50, bolusStepMilliUnits: 50 },
    gateReasons: given.gateReasons === undefined ? [] : given.gateReasons,
    createdAt: at,
  });
  await grantRole(db, { journalId, userId: ownerId, role: "person", grantedBy: ownerId, at });
  return { journalId, ownerId };
}

export async function grantRole(
  db: Pool,
  given: { journalId: string; userId: string; role: JournalRole; grantedBy: string; scopes?: Scope[]; at?: Date; expiresAt?: Date },
): Promise<void> {
  await upsertGrant(db, {
    journalId: given.journalId,
    userId: given.userId,
    role: given.role,
    scopes: given.scopes ?? [...SCOPES],
    grantedAt: given.at ?? TEST_NOW,
    grantedBy: given.grantedBy,
    expiresAt: given.expiresAt ?? null,
  });
}

/** A fresh helper of a journal; an educator comes with a verified licence unless told otherwise. */
export async function createHelper(
  db: Pool,
  given: { journalId: string; ownerId: string; role: Exclude<JournalRole, "person">; scopes?: Scope[]; isLicensed?: boolean },
): Promise<string> {
  const userId = await createPerson(db, { displayName: `A ${given.role}` });
  if (given.role === "educator" && given.isLicensed !== false) await giveLicence(db, userId);
  await grantRole(db, { ...given, userId, grantedBy: given.ownerId });
  return userId;
}

export async function giveLicence(db: Pool, userId: string, at: Date = TEST_NOW): Promise<void> {
  await upsertCredential(db, {
    userId, profession: "Diabetes educator", licenceNumber: "X-1", jurisdiction: "Nowhere", expiresOn: "2099-12-31", submittedAt: at, verifiedAt: at, verifiedBy: userId,
  });
}

/** A context as the edge would build it, at a moment of the test's choice. */
export async function contextFor(db: Pool, userId: string, now: Date = TEST_NOW): Promise<Context> {
  return contextAs(db, await findActor(db, userId, now), now);
}

export function contextAs(db: Pool, actor: Actor, now: Date = TEST_NOW): Context {
  return { actor, db, now: () => now, requestId: "test" };
}

export async function strangerContext(db: Pool): Promise<Context> {
  return contextFor(db, await createPerson(db));
}

export function anonymousContext(db: Pool): Context {
  return contextAs(db, { type: "anonymous" });
}
