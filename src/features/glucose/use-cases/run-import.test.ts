import { fork } from "node:child_process";
import { and, eq, sql } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findImport, listRefusals } from "@/db/repositories/imports";
import { listRollups } from "@/db/repositories/rollups";
import { dailyRollups, glucoseReadings } from "@/db/schema/glucose";
import { rollUp } from "@/domain/glucose/daily-rollup";
import { contextFor, createHelper, createJournal, strangerContext } from "@/testing/factories";
import { createTestDatabase } from "@/testing/test-database";
import { runImport } from "./run-import";
import { undoImport } from "./undo-import";
import { uploadFile } from "./upload-file";

const settled = {
  encoding: "utf-8", delimiter: ",", headerRow: 0, timeColumn: 0, dateColumn: null, glucoseColumn: 1, subjectColumn: null, subject: null,
  dateOrder: "day-first", unit: "mg/dL", timeZone: "UTC", shiftMinutes: 0,
} as const;

const trace = (days: number) =>
  ["time,glucose mg/dL", ...Array.from({ length: days * 288 }, (_, i) => `${new Date(Date.UTC(2026, 1, 1) + i * 300_000).toISOString()},${90 + (i % 90)}`)].join("\n");

describe("runImport", () => {
  let db: Pool;
  let appUrl: string;
  beforeAll(async () => {
    ({ app: db, appUrl } = await createTestDatabase());
  });

  async function uploaded(text: string) {
    const { journalId, ownerId } = await createJournal(db, { timeZone: "UTC" });
    const ctx = await contextFor(db, ownerId);
    const { importId } = await uploadFile(ctx, { journalId, fileName: "a.csv", bytes: new TextEncoder().encode(text) });
    return { journalId, ownerId, ctx, importId, text };
  }

  const countReadings = async (journalId: string) => {
    const [row] = await db.select({ n: sql<number>`count(*)::int` }).from(glucoseReadings).where(eq(glucoseReadings.journalId, journalId));
    return row?.n ?? 0;
  };

  it("stores every row once; the same file again adds nothing; undo takes it out whole", async () => {
    const { journalId, ctx, importId, text } = await uploaded(trace(2));
    expect(await runImport(ctx, { journalId, importId, ...settled })).toMatchObject({ rows: 576, accepted: 576, duplicates: 0, refused: 0 });
    const again = await uploadFile(ctx, { journalId, fileName: "a.csv", bytes: new TextEncoder().encode(text) });
    expect(await runImport(ctx, { journalId, importId: again.importId, ...settled })).toMatchObject({ accepted: 0, duplicates: 576 });
    expect(await countReadings(journalId)).toBe(576);
    expect(await undoImport(ctx, { journalId, importId })).toEqual({ removed: 576 });
    expect(await countReadings(journalId)).toBe(0);
    expect(await db.select().from(dailyRollups).where(eq(dailyRollups.journalId, journalId))).toEqual([]);
  });

  it("names refused rows by line, in words, and takes the rest", async () => {
    const { journalId, ctx, importId } = await uploaded("time,glucose mg/dL\n2026-02-01T00:00:00Z,100\nyesterday,100\n2026-02-01T00:05:00Z,NaN\n2026-02-01T00:10:00Z,110\n2026-02-01T00:10:00Z,120\n");
    expect(await runImport(ctx, { journalId, importId, ...settled })).toMatchObject({ rows: 5, accepted: 2, refused: 3 });
    expect((await listRefusals(db, journalId, importId, 10)).map((r) => [r.line, r.reason])).toEqual([[3, "time-not-read"], [4, "value-not-read"], [6, "second-value"]]);
  });

  it("keeps roll-ups equal to the raw readings", async () => {
    const { journalId, ctx, importId } = await uploaded(trace(3));
    await runImport(ctx, { journalId, importId, ...settled });
    const raw = await db.select().from(glucoseReadings).where(eq(glucoseReadings.journalId, journalId)).orderBy(glucoseReadings.at);
    const expected = rollUp(raw.map((r) => ({ atMs: r.at.getTime(), glucoseMgDl: r.glucoseMgDl, band: r.band })), "UTC");
    const stored = await listRollups(db, journalId, "day", 0, 100_000);
    expect(stored.map(({ journalId: _j, ...row }) => row)).toEqual(expected.filter((r) => r.part === "day"));
  });

  it("refuses a mentor, hides from a stranger, and names the field that is amiss", async () => {
    const { journalId, ownerId, ctx, importId } = await uploaded(trace(1));
    const input = { journalId, importId, ...settled };
    const mentor = await contextFor(db, await createHelper(db, { journalId, ownerId, role: "mentor" }));
    await expect(runImport(mentor, input)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(runImport(await strangerContext(db), input)).rejects.toMatchObject({ code: "NOT_FOUND" });
    await expect(runImport(ctx, { ...input, timeZone: "Moon/Base" })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: ["timeZone"] })] });
    await expect(uploadFile(ctx, { journalId, fileName: "p.csv", bytes: new Uint8Array([0x89, 0x50, 0x4e, 0x47]) })).rejects.toMatchObject({ fields: { file: [expect.stringContaining("picture")] } });
    expect(await countReadings(journalId)).toBe(0);
  });

  it("runs once, however often it is pressed", async () => {
    const { journalId, ctx, importId } = await uploaded(trace(1));
    const outcomes = await Promise.allSettled([1, 2, 3].map(() => runImport(ctx, { journalId, importId, ...settled })));
    expect(outcomes.filter((o) => o.status === "fulfilled")).toHaveLength(1);
    expect(await countReadings(journalId)).toBe(288);
  });

  it("leaves all or nothing when its process is killed, and can be run again", async () => {
    const rows = 120 * 288;
    const { journalId, ownerId, ctx, importId } = await uploaded(trace(120));
    for (const delayMs of [50, 300, 600, 900]) {
      const child = fork("src/testing/import-child.ts", [ownerId, journalId, importId], {
        execArgv: ["--import", "tsx", "--import", "./src/commands/server-only.mjs"], env: { ...process.env, APP_DATABASE_URL: appUrl }, stdio: ["ignore", "ignore", "inherit", "ipc"],
      });
      await new Promise((resolve) => child.once("message", resolve));
      await new Promise((resolve) => setTimeout(resolve, delayMs));
      child.kill("SIGKILL");
      await new Promise((resolve) => child.once("exit", resolve));
      const found = await findImport(db, journalId, importId);
      expect([0, rows]).toContain(await countReadings(journalId));
      if (found?.status === "done") break;
      await db.execute(sql`update imports set heartbeat_at = now() - interval '1 hour' where id = ${importId}`);
    }
    const found = await findImport(db, journalId, importId);
    if (found?.status !== "done") await runImport({ ...ctx, now: () => new Date(Date.now() + 3_600_000) }, { journalId, importId, ...settled });
    expect(await countReadings(journalId)).toBe(rows);
    const days = await db.select({ n: sql<number>`sum(${dailyRollups.readings})::int` }).from(dailyRollups).where(and(eq(dailyRollups.journalId, journalId), eq(dailyRollups.part, "day")));
    expect(days[0]?.n).toBe(rows);
  }, 60_000);
});
