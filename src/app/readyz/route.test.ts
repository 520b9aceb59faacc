import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Pool } from "@/db/client";
import { createTestDb } from "@/testing/test-database";
import { GET as healthz } from "../healthz/route";
import { GET as readyz } from "./route";

let current: unknown;
vi.mock("@/lib/pool", () => ({ pool: () => current }));

const answering = (execute: () => Promise<unknown>) => ({ execute });

describe("whether the service lives and is ready", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });
  beforeEach(() => {
    current = db;
  });

  it("is ready on a database with every migration of this build", async () => {
    const answer = await readyz();
    expect([answer.status, await answer.text(), answer.headers.get("cache-control")]).toEqual([200, "ready\n", "no-store"]);
  });

  it.each([
    ["a schema of another build", answering(() => Promise.resolve([{ count: 0 }])), /schema/],
    ["a database that refuses", answering(() => Promise.reject(new Error("password of notchbook_app refused"))), /does not answer\n$/],
    ["a database that is silent", answering(() => new Promise(() => undefined)), /in time/],
  ])("is not ready with %s, and says so within a second", async (_what, pool, why) => {
    current = pool;
    const start = performance.now();
    const answer = await readyz();
    expect(performance.now() - start).toBeLessThan(1000);
    expect([answer.status, answer.headers.get("retry-after")]).toEqual([503, "5"]);
    expect(await answer.text()).toMatch(why);
  });

  it("lives whatever the database does", async () => {
    current = answering(() => Promise.reject(new Error("gone")));
    const answer = healthz();
    expect([answer.status, await answer.text()]).toEqual([200, "ok\n"]);
  });
});
