import type { Actor } from "@/domain/access/policy";
import type { Pool } from "@/db/client";

/** Everything a use-case may lean on, built once per request, job or test. */
export type Context = Readonly<{
  actor: Actor;
  db: Pool;
  now: () => Date;
  requestId: string;
}>;
