/** What `postgres.mjs` offers, for the TypeScript side of the house. */
export interface PostgresUrls {
  bin: string;
  ownerUrl: string;
  appUrl: string;
}

export interface PrivatePostgres extends PostgresUrls {
  home: string;
  wasRunning: boolean;
  stop: () => Promise<void>;
}

export function ensurePostgres(options: {
  dir: string;
  database?: string;
  isThrowaway?: boolean;
}): Promise<PrivatePostgres>;

export function createDatabase(
  urls: PostgresUrls,
  name: string,
  options?: { template?: string },
): Promise<{ ownerUrl: string; appUrl: string }>;

export function dropDatabase(urls: Pick<PostgresUrls, "bin" | "ownerUrl">, name: string): Promise<void>;
