import "server-only";
import { openPool, type Pool } from "@/db/client";
import { env } from "@/env";

const holder = globalThis as typeof globalThis & { notchbookPool?: Pool };

/** The process's one pool, opened at first use and kept across hot reloads. */
export function pool(): Pool {
  holder.notchbookPool ??= openPool(env.databaseUrl);
  return holder.notchbookPool;
}
