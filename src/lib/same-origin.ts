import { AppError } from "@/domain/errors";
import { env } from "@/env";

/**
 * Refuse a mutating request that did not come from our own pages: Fetch
 * Metadata first, Origin where a browser sends none, refused when both are absent.
 *
 * @throws {AppError} FORBIDDEN
 */
export function assertSameOrigin(headers: Headers): void {
  const site = headers.get("sec-fetch-site");
  const origin = headers.get("origin");
  if (site === "same-origin" && (origin === null || origin === "null" || isOurs(origin, headers))) return;
  if (site === null && origin !== null && isOurs(origin, headers)) return;
  throw new AppError("FORBIDDEN", `cross-site request (${site ?? "no site"}, ${origin ?? "no origin"})`);
}

function isOurs(origin: string, headers: Headers): boolean {
  if (origin === env.publicOrigin) return true;
  const host = headers.get("host") ?? "";
  return env.isLoopback && /^(127\.0\.0\.1|localhost):\d+$/.test(host) && origin === `http://${host}`;
}
