import "server-only";
import { randomUUID } from "node:crypto";
import { cookies, headers } from "next/headers";
import { cache } from "react";
import { pool } from "./pool";
import type { Context } from "./context";
import { findActor } from "./actor";
import { SESSION_COOKIE, validateSession } from "./session";

/** The context of the page or action being served; once per request. */
export const requestContext = cache(async (): Promise<Context & { sessionId: string | null }> => {
  const cookie = (await cookies()).get(SESSION_COOKIE)?.value;
  const session = cookie ? await validateSession(cookie) : null;
  const now = () => new Date();
  const actor = session ? await findActor(pool(), session.userId, now()) : ({ type: "anonymous" } as const);
  const requestId = (await headers()).get("x-request-id") ?? randomUUID();
  return { actor, db: pool(), now, requestId, sessionId: session?.id ?? null };
});
