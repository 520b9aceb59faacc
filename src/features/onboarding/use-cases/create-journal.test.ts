import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { listEvents } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { findDraft } from "@/db/repositories/wizard-drafts";
import { journals } from "@/db/schema/journals";
import { can } from "@/domain/access/policy";
import { anonymousContext, contextFor, createPerson, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import type { CreateJournalInput } from "../schema";
import { createJournal } from "./create-journal";

const form: CreateJournalInput = {
  name: "  My notebook ", glucoseUnit: "mmol/L", timeZone: "Europe/Oslo", therapy: "pump", plannedStartOn: "", pump: "a pump", sensor: "", controller: "", insulin: "",
};

describe("createJournal", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const countJournals = () => db.$count(journals);

  it("opens a notebook that only its person can see, with an empty draft and no gate yet", async () => {
    const userId = await createPerson(db);
    const { journalId } = await createJournal(await contextFor(db, userId), form);
    expect(await findJournal(db, journalId)).toMatchObject({ name: "My notebook", ownerId: userId, plannedStartOn: null, startedOn: null, gateReasons: null, createdAt: TEST_NOW });
    expect(await findDraft(db, journalId)).toMatchObject({ answers: {}, updatedBy: userId });
    expect((await listEvents(db, journalId, 9)).map((e) => e.action)).toEqual(["journal.create"]);
    expect(can((await contextFor(db, userId)).actor, "draft.save", journalId)).toBe(true);
    expect(can((await strangerContext(db)).actor, "journal.read", journalId)).toBe(false);
  });

  it("keeps the device’s steps in whole milli-units, and the usual ones where none were told", async () => {
    const ctx = await strangerContext(db);
    const told = await createJournal(ctx, { ...form, basalStepUnits: "0,025 U/h", bolusStepUnits: "0.1" });
    expect((await findJournal(db, told.journalId))?.setup).toMatchObject({ basalStepMilliUnits: 25, bolusStepMilliUnits: 100 });
    const untold = await createJournal(ctx, form);
    expect((await findJournal(db, untold.journalId))?.setup).toMatchObject({ basalStepMilliUnits: 50, bolusStepMilliUnits: 50 });
  });

  it.each([
    ["basalStepUnits", { basalStepUnits: "none" }],
    ["name", { name: " " }],
    ["timeZone", { timeZone: "Moon/Base" }],
    ["plannedStartOn", { plannedStartOn: "soon" }],
  ])("refuses a form whose %s is amiss, and opens nothing", async (field, wrong) => {
    const before = await countJournals();
    await expect(createJournal(await strangerContext(db), { ...form, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    expect(await countJournals()).toBe(before);
  });

  it("refuses whoever is signed out or has not verified their address", async () => {
    const before = await countJournals();
    await expect(createJournal(anonymousContext(db), form)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    const unverified = await contextFor(db, await createPerson(db, { isVerified: false }));
    await expect(createJournal(unverified, form)).rejects.toMatchObject({ code: "FORBIDDEN" });
    expect(await countJournals()).toBe(before);
  });
});
