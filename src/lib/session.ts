import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { DrizzlePostgreSQLAdapter } from "@lucia-auth/adapter-drizzle";
import { and, eq, ne } from "drizzle-orm";
import { Lucia, TimeSpan, type Adapter } from "lucia";
import { sessions, users } from "@/db/schema/people";
import { env } from "@/env";
import { pool } from "./pool";

declare module "lucia" {
  interface Register {
    Lucia: Lucia<{ createdAt: Date; userAgent: string }>;
    DatabaseSessionAttributes: { createdAt: Date; userAgent: string };
  }
}

/** Sliding life of a session; past half of it, use renews it. */
const SESSION_DAYS = 14;
/** A session ends after this many days, however much it is used. */
const SESSION_DAYS_AT_MOST = 30;

export const SESSION_COOKIE = env.isCookieSecure ? "__Host-notchbook" : "notchbook";

export type Session = Readonly<{ id: string; userId: string; expiresAt: Date; createdAt: Date; userAgent: string }>;

export type SessionCookie = Readonly<{
  name: string;
  value: string;
  attributes: { httpOnly: true; secure: boolean; sameSite: "lax"; path: "/"; expires: Date };
}>;

/** The database's name for a session: no row of a dumped database can serve as a cookie. */
function sessionIdOf(secret: string): string {
  return createHash("sha256").update(secret).digest("hex");
}

/** Lucia knows the secret; what it hands to the adapter is hashed on the way in and put back on the way out. */
function hashingAdapter(adapter: Adapter): Adapter {
  return {
    ...adapter,
    deleteSession: (secret) => adapter.deleteSession(sessionIdOf(secret)),
    deleteUserSessions: (userId) => adapter.deleteUserSessions(userId),
    deleteExpiredSessions: () => adapter.deleteExpiredSessions(),
    getUserSessions: (userId) => adapter.getUserSessions(userId),
    setSession: (session) => adapter.setSession({ ...session, id: sessionIdOf(session.id) }),
    updateSessionExpiration: (secret, expiresAt) => adapter.updateSessionExpiration(sessionIdOf(secret), expiresAt),
    getSessionAndUser: async (secret) => {
      const [session, user] = await adapter.getSessionAndUser(sessionIdOf(secret));
      return session ? [{ ...session, id: secret }, user] : [session, user];
    },
  };
}

function lucia(): Lucia<{ createdAt: Date; userAgent: string }> {
  return new Lucia(hashingAdapter(new DrizzlePostgreSQLAdapter(pool(), sessions, users)), {
    sessionExpiresIn: new TimeSpan(SESSION_DAYS, "d"),
    getSessionAttributes: ({ createdAt, userAgent }) => ({ createdAt, userAgent }),
  });
}

/** Open a session. @returns the cookie to set, whose value is the only copy of the secret */
export async function createSession(userId: string, userAgent: string, now: Date): Promise<SessionCookie> {
  const secret = randomBytes(32).toString("base64url");
  const session = await lucia().createSession(userId, { createdAt: now, userAgent: userAgent.slice(0, 300) }, { sessionId: secret });
  return {
    name: SESSION_COOKIE,
    value: secret,
    attributes: { httpOnly: true, secure: env.isCookieSecure, sameSite: "lax", path: "/", expires: session.expiresAt },
  };
}

/** The live session behind a cookie's value, renewed by use, or null. `id` is the hashed one. */
export async function validateSession(secret: string, now: Date = new Date()): Promise<Session | null> {
  if (!/^[A-Za-z0-9_-]{43}$/.test(secret)) return null;
  const { session } = await lucia().validateSession(secret);
  if (!session) return null;
  const ageDays = (now.getTime() - session.createdAt.getTime()) / 86_400_000;
  if (ageDays > SESSION_DAYS_AT_MOST) {
    await lucia().invalidateSession(secret);
    return null;
  }
  const { userId, expiresAt, createdAt, userAgent } = session;
  return { id: sessionIdOf(secret), userId, expiresAt, createdAt, userAgent };
}

/** End one session by the database's id, if it belongs to this account. */
export async function revokeSession(userId: string, sessionId: string): Promise<void> {
  await pool().delete(sessions).where(and(eq(sessions.id, sessionId), eq(sessions.userId, userId)));
}

/** End every session of an account, but for the one given. */
export async function revokeAllSessions(userId: string, exceptSessionId?: string): Promise<void> {
  if (!exceptSessionId) return lucia().invalidateUserSessions(userId);
  await pool().delete(sessions).where(and(eq(sessions.userId, userId), ne(sessions.id, exceptSessionId)));
}

/** The live sessions of an account, newest first. */
export async function listSessions(userId: string): Promise<Session[]> {
  const rows = await lucia().getUserSessions(userId);
  return rows
    .map(({ id, expiresAt, createdAt, userAgent }) => ({ id, userId, expiresAt, createdAt, userAgent }))
    .sort((a, b) => b.createdAt.getTime() - a.createdAt.getTime());
}
