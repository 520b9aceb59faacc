import { RateLimiterPostgres } from "rate-limiter-flexible";
import type { Pool } from "@/db/client";
import { AppError } from "@/domain/errors";

/** Attempts allowed per key within a stretch of seconds. */
const LIMITS = {
  "sign-in": { points: 10, seconds: 15 * 60 },
  "sign-in-address": { points: 50, seconds: 15 * 60 },
  "sign-up": { points: 20, seconds: 60 * 60 },
  "reset-password": { points: 5, seconds: 60 * 60 },
  invite: { points: 30, seconds: 60 * 60 },
  import: { points: 60, seconds: 60 * 60 },
  digest: { points: 6, seconds: 60 * 60 },
  comment: { points: 60, seconds: 60 * 60 },
  export: { points: 30, seconds: 60 * 60 },
} as const;

export type LimitName = keyof typeof LIMITS;

function limiter(db: Pool, name: LimitName): RateLimiterPostgres {
  const { points, seconds } = LIMITS[name];
  const sql = db.$client;
  return new RateLimiterPostgres({
    storeClient: { query: async (q: { text: string; values: string[] }) => ({ rows: await sql.unsafe(q.text, q.values) }) },
    storeType: "client",
    tableName: "rate_limits",
    tableCreated: true,
    clearExpiredByTimeout: false,
    keyPrefix: name,
    points,
    duration: seconds,
  });
}

/**
 * Count one attempt.
 *
 * @throws {AppError} TOO_MANY beyond the limit; other faults of the store are thrown as they are
 */
export async function countAttempt(db: Pool, name: LimitName, key: string): Promise<void> {
  try {
    await limiter(db, name).consume(key);
  } catch (error) {
    if (error instanceof Error) throw error;
    throw new AppError("TOO_MANY", `${name} limit`);
  }
}

/** Forget the attempts of a key, after one that was right. */
export async function forgetAttempts(db: Pool, name: LimitName, key: string): Promise<void> {
  await limiter(db, name).delete(key);
}
