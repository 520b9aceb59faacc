import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { listEvents } from "@/db/repositories/journal-events";
import { contextFor, createHelper, createJournal, strangerContext } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { fallbackCard } from "../queries/fallback-card";
import { saveCard } from "./save-card";
import { writeDoses } from "./write-doses";

const card = { previousSetup: "Pens.", longActingUnits: "18,5", rapidUnits: "", emergencyNumber: "112", contacts: [{ name: "Bo", phone: "1" }] };

describe("the fallback card", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function circle() {
    const { journalId, ownerId } = await createJournal(db);
    const educatorId = await createHelper(db, { journalId, ownerId, role: "educator" });
    return { journalId, ownerId, ctx: await contextFor(db, ownerId), educator: await contextFor(db, educatorId) };
  }

  it("is written anew by the person", async () => {
    const { journalId, ctx } = await circle();
    await saveCard(ctx, { journalId, ...card });
    await saveCard(ctx, { journalId, ...card, previousSetup: "One pen." });
    expect(await findFallbackCard(db, journalId)).toMatchObject({ previousSetup: "One pen.", longActingMilliUnits: 18_500, rapidMilliUnits: null, contacts: [{ name: "Bo", phone: "1" }] });
    expect((await fallbackCard(ctx, { journalId })).writtenBy).toBeNull();
  });

  it("carries the educator’s doses under their name for as long as they stand", async () => {
    const { journalId, ctx, educator } = await circle();
    await saveCard(ctx, { journalId, ...card });
    await writeDoses(educator, { journalId, longActingUnits: "14", rapidUnits: "5" });
    expect(await findFallbackCard(db, journalId)).toMatchObject({ previousSetup: "Pens.", longActingMilliUnits: 14_000, rapidMilliUnits: 5000 });
    expect((await fallbackCard(ctx, { journalId })).writtenBy).toMatchObject({ name: "A educator" });
    await saveCard(ctx, { journalId, ...card, longActingUnits: "14", rapidUnits: "5", emergencyNumber: "911" });
    expect((await fallbackCard(ctx, { journalId })).writtenBy).not.toBeNull();
    await saveCard(ctx, { journalId, ...card, longActingUnits: "15", rapidUnits: "5" });
    expect((await fallbackCard(ctx, { journalId })).writtenBy).toBeNull();
  });

  it("begins with the doses where nothing else is written yet", async () => {
    const { journalId, educator } = await circle();
    await writeDoses(educator, { journalId, longActingUnits: "14", rapidUnits: "" });
    expect(await findFallbackCard(db, journalId)).toMatchObject({ previousSetup: "", contacts: [], longActingMilliUnits: 14_000, rapidMilliUnits: null });
  });

  it.each([
    ["previousSetup", { previousSetup: " " }], ["emergencyNumber", { emergencyNumber: "" }], ["longActingUnits", { longActingUnits: "lots" }],
  ])("refuses a card whose %s is amiss, and writes nothing", async (field, wrong) => {
    const { journalId, ctx } = await circle();
    await expect(saveCard(ctx, { journalId, ...card, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    expect(await findFallbackCard(db, journalId)).toBeUndefined();
    expect(await listEvents(db, journalId, 9)).toEqual([]);
  });

  it("refuses no dose at all", async () => {
    const { journalId, educator } = await circle();
    await expect(writeDoses(educator, { journalId, longActingUnits: "", rapidUnits: "" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["longActingUnits"] })] });
    expect(await findFallbackCard(db, journalId)).toBeUndefined();
  });

  it("leaves doses to a licensed educator, and the card to the person", async () => {
    const { journalId, ownerId, ctx, educator } = await circle();
    const doses = { journalId, longActingUnits: "14", rapidUnits: "" };
    const unlicensed = await contextFor(db, await createHelper(db, { journalId, ownerId, role: "educator", isLicensed: false }));
    const mentor = await contextFor(db, await createHelper(db, { journalId, ownerId, role: "mentor" }));
    const family = await contextFor(db, await createHelper(db, { journalId, ownerId, role: "family" }));
    for (const weak of [ctx, unlicensed, mentor, family]) await expect(writeDoses(weak, doses)).rejects.toMatchObject({ code: "FORBIDDEN" });
    for (const weak of [educator, mentor, family]) await expect(saveCard(weak, { journalId, ...card })).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(writeDoses(await strangerContext(db), doses)).rejects.toMatchObject({ code: "NOT_FOUND" });
    await expect(saveCard(await strangerContext(db), { journalId, ...card })).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await findFallbackCard(db, journalId)).toBeUndefined();
  });
});
