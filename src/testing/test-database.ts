import { randomBytes } from "node:crypto";
import postgres from "postgres";
import { afterAll, inject } from "vitest";
import { openPool, type Pool } from "@/db/client";
import { withDatabase } from "./database";

/** A fresh database of this test file's own, as the application's role sees it. Closed after the file. */
export async function createTestDb(): Promise<Pool> {
  const { app } = await createTestDatabase();
  return app;
}

/** The same with the owner's view beside it, for what the application itself may not do. */
export async function createTestDatabase(): Promise<{ app: Pool; owner: Pool; appUrl: string; ownerUrl: string }> {
  const template = inject("templateName");
  const name = `${template}_${randomBytes(5).toString("hex")}`;
  const maintenance = postgres(inject("ownerUrl"), { max: 1 });
  await cloneWithRetry(maintenance, name, template);
  await maintenance.end();
  const ownerUrl = withDatabase(inject("ownerUrl"), name);
  const appUrl = withDatabase(inject("appUrl"), name);
  const app = openPool(appUrl, 10);
  const owner = openPool(ownerUrl, 2);
  afterAll(async () => {
    await app.$client.end();
    await owner.$client.end();
  });
  return { app, owner, appUrl, ownerUrl };
}

/** Two files that clone at the same moment meet "source database is being accessed": wait and ask again. */
async function cloneWithRetry(sql: postgres.Sql, name: string, template: string): Promise<void> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      await sql.unsafe(`create database "${name}" template "${template}"`);
      return;
    } catch (error) {
      if (attempt === 20 || (error as { code?: string }).code !== "55006") throw error;
      await new Promise((resolve) => setTimeout(resolve, 100 * attempt));
    }
  }
}
