import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findDraft, insertDraft } from "@/db/repositories/wizard-drafts";
import { asideOf } from "@/domain/onboarding/draft-pages";
import { contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { editBlocks } from "./edit-blocks";

describe("editBlocks", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  async function drafting() {
    const { journalId, ownerId } = await createJournal(db);
    await insertDraft(db, { journalId, updatedAt: TEST_NOW, updatedBy: ownerId });
    const answersOf = async () => (await findDraft(db, journalId))!.answers;
    const input = { journalId, step: "basal", rowVersion: "1", edit: "split.0", blocks: [{ from: "00:00", value: "0,5" }, { from: "08:00", value: "half" }] };
    return { journalId, ownerId, ctx: await contextFor(db, ownerId), input, answersOf };
  }

  it("cuts a block and keeps the rest as typed, readable or not", async () => {
    const { ctx, input, answersOf } = await drafting();
    expect(await editBlocks(ctx, input)).toEqual({ step: "basal" });
    expect((await answersOf()).basal).toEqual({ blocks: [{ from: "00:00", value: "0,5" }, { from: "04:00", value: "0,5" }, { from: "08:00", value: "half" }] });
  });

  it("adds and removes, in the fields of the page", async () => {
    const { ctx, input, answersOf } = await drafting();
    await editBlocks(ctx, { ...input, step: "targets", edit: "add", blocks: [{ from: "00:00", low: "120", high: "130", value: "9" }] });
    expect((await answersOf()).targets).toEqual({ blocks: [{ from: "00:00", low: "120", high: "130" }, { from: "", low: "", high: "" }] });
    await editBlocks(ctx, { ...input, step: "targets", rowVersion: "2", edit: "remove.1", blocks: [{ from: "00:00", low: "120", high: "130" }, { from: "", low: "", high: "" }] });
    expect((await answersOf()).targets).toEqual({ blocks: [{ from: "00:00", low: "120", high: "130" }] });
  });

  it("keeps the rows beside a page that another device saved meanwhile", async () => {
    const { ctx, input, answersOf } = await drafting();
    await editBlocks(ctx, input);
    await editBlocks(ctx, { ...input, edit: "add" });
    expect((await answersOf()).basal).toMatchObject({ blocks: { length: 3 } });
    expect(asideOf(await answersOf(), "basal")).toHaveLength(1);
  });

  it.each([["step", { step: "gate" }], ["edit", { edit: "x".repeat(40) }], ["rowVersion", { rowVersion: "x" }]])("refuses a press whose %s is amiss", async (field, wrong) => {
    const { ctx, input, answersOf } = await drafting();
    await expect(editBlocks(ctx, { ...input, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    expect(await answersOf()).toEqual({});
  });

  it("survives rows that are no rows", async () => {
    const { ctx, input, answersOf } = await drafting();
    await editBlocks(ctx, { ...input, edit: "add", blocks: ["x", null, { from: { deep: 1 }, value: "1".repeat(100) }] });
    expect((await answersOf()).basal).toEqual({ blocks: [{ from: "", value: "" }, { from: "", value: "" }, { from: "", value: "" }, { from: "", value: "" }] });
    await editBlocks(ctx, { ...input, rowVersion: "2", edit: "add", blocks: "nothing" });
    expect((await answersOf()).basal).toEqual({ blocks: [{ from: "00:00", value: "" }] });
  });

  it.each(["mentor", "educator", "family"] as const)("refuses a %s, and hides from a stranger", async (role) => {
    const { journalId, ownerId, input, answersOf } = await drafting();
    await expect(editBlocks(await contextFor(db, await createHelper(db, { journalId, ownerId, role })), input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(editBlocks(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await answersOf()).toEqual({});
  });
});
