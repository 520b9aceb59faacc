import postgres from "postgres";
import type { TestProject } from "vitest/node";
import { migrateDatabase } from "@/db/migrate";

declare module "vitest" {
  interface ProvidedContext {
    ownerUrl: string;
    appUrl: string;
    templateName: string;
  }
}

/** One migrated template per run; each test file clones it. Needs TEST_DATABASE_URL (owner) and TEST_APP_DATABASE_URL. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const ownerUrl = process.env.TEST_DATABASE_URL;
  const appUrl = process.env.TEST_APP_DATABASE_URL;
  if (!ownerUrl || !appUrl) throw new Error("Database tests run through `npm test` or `npm run unit`, which start PostgreSQL.");
  const templateName = `template_${process.pid}_${Date.now()}`;
  const maintenance = postgres(ownerUrl, { max: 1 });
  await maintenance.unsafe(`create database "${templateName}"`);
  await migrateDatabase(withDatabase(ownerUrl, templateName), decodeURIComponent(new URL(appUrl).username));
  project.provide("ownerUrl", ownerUrl);
  project.provide("appUrl", appUrl);
  project.provide("templateName", templateName);
  return async () => {
    const clones = await maintenance<{ datname: string }[]>`
      select datname from pg_database where datname like ${`${templateName}%`}`;
    for (const { datname } of clones) await maintenance.unsafe(`drop database if exists "${datname}" with (force)`);
    await maintenance.end();
  };
}

export function withDatabase(url: string, name: string): string {
  const changed = new URL(url);
  changed.pathname = `/${name}`;
  return changed.toString();
}
