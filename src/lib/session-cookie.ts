import "server-only";
import { cookies, headers } from "next/headers";
import { createSession, SESSION_COOKIE } from "./session";

/** Sign the browser in: a new session each time, whatever cookie it came with. */
export async function startSession(userId: string, now: Date): Promise<void> {
  const agent = (await headers()).get("user-agent") ?? "";
  const cookie = await createSession(userId, agent, now);
  (await cookies()).set(cookie.name, cookie.value, cookie.attributes);
}

export async function dropSessionCookie(): Promise<void> {
  (await cookies()).delete({ name: SESSION_COOKIE, path: "/" });
}
