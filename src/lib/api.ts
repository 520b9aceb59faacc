import "server-only";
import { randomUUID } from "node:crypto";
import { z } from "zod";
import { AppError, type ErrorCode } from "@/domain/errors";
import { findTokenOwner } from "@/db/repositories/api-tokens";
import type { Context } from "./context";
import { findActor } from "./actor";
import { errorFields, logEvent } from "./log";
import { pool } from "./pool";
import { assertSameOrigin } from "./same-origin";
import { hashSecret } from "./secrets";
import { SESSION_COOKIE, validateSession } from "./session";

const STATUS: Record<ErrorCode, number> = {
  INVALID_INPUT: 400, INVALID_RANGE: 400, INVALID_READING: 400, UNAUTHENTICATED: 401, FORBIDDEN: 403, NOT_FOUND: 404,
  CONFLICT: 409, STALE: 412, GATE_CLOSED: 409, TOO_LARGE: 413, TOO_MANY: 429, UNAVAILABLE: 503,
};

type RouteParams = { params: Promise<Record<string, string>> };

/** `isLinkEnough`: the address itself is the proof, so neither cookie nor origin is looked at and nobody is signed in. */
type RouteOptions = Readonly<{ isLinkEnough?: boolean }>;

/**
 * A route handler: same lock as every other door. Bearer token or session
 * cookie (the latter with the same-origin check), RFC 9457 problems for every
 * refusal, `no-store` on every answer.
 */
export function apiRoute(
  work: (ctx: Context, request: Request, params: Record<string, string>) => Promise<Response>,
  { isLinkEnough = false }: RouteOptions = {},
) {
  return async (request: Request, { params }: RouteParams): Promise<Response> => {
    const requestId = request.headers.get("x-request-id") ?? randomUUID();
    let response: Response;
    try {
      const ctx = isLinkEnough ? anonymousContext(requestId) : await contextOf(request, requestId);
      response = await work(ctx, request, await params);
    } catch (error) {
      response = problem(error, requestId);
    }
    response.headers.set("Cache-Control", "no-store");
    response.headers.set("X-Content-Type-Options", "nosniff");
    response.headers.set("X-Request-Id", requestId);
    return response;
  };
}

function anonymousContext(requestId: string): Context {
  return { actor: { type: "anonymous" }, db: pool(), now: () => new Date(), requestId };
}

async function contextOf(request: Request, requestId: string): Promise<Context> {
  const now = () => new Date();
  const base = { db: pool(), now, requestId };
  const isRead = request.method === "GET" || request.method === "HEAD";
  const bearer = /^Bearer (.+)$/.exec(request.headers.get("authorization") ?? "")?.[1];
  if (bearer) {
    const token = await findTokenOwner(pool(), hashSecret(bearer), now());
    if (!token) throw new AppError("UNAUTHENTICATED", "token not known or ended");
    if (token.scope === "read" && !isRead) throw new AppError("FORBIDDEN", "this token only reads");
    return { ...base, actor: await findActor(pool(), token.userId, now()) };
  }
  if (!isRead) assertSameOrigin(request.headers);
  const cookie = new RegExp(`(?:^|; )${SESSION_COOKIE}=([^;]+)`).exec(request.headers.get("cookie") ?? "")?.[1];
  const session = cookie ? await validateSession(cookie) : null;
  return { ...base, actor: session ? await findActor(pool(), session.userId, now()) : { type: "anonymous" } };
}

/** JSON with its type and charset said. */
export function json(body: unknown, status = 200): Response {
  return new Response(JSON.stringify(body), { status, headers: { "Content-Type": "application/json; charset=utf-8" } });
}

/** The body of a request as JSON. @throws {AppError} INVALID_INPUT when it is none */
export async function jsonBody(request: Request): Promise<unknown> {
  try {
    return await request.json();
  } catch {
    throw new AppError("INVALID_INPUT", "the body is not JSON", { body: ["The body is not JSON."] });
  }
}

function problem(error: unknown, requestId: string): Response {
  const refused = error instanceof z.ZodError
    ? { code: "INVALID_INPUT" as const, errors: error.issues.map((i) => ({ pointer: `/${i.path.join("/")}`, detail: i.message })) }
    : error instanceof AppError
      ? { code: error.code, errors: Object.entries(error.fields ?? {}).flatMap(([field, all]) => all.map((detail) => ({ pointer: `/${field}`, detail }))) }
      : null;
  const status = refused ? STATUS[refused.code] : 500;
  if (!refused) logEvent("error", "api.failed", { requestId, ...errorFields(error) });
  const headers = new Headers({ "Content-Type": "application/problem+json; charset=utf-8" });
  if (status === 429 || status === 503) headers.set("Retry-After", "60");
  const body = {
    type: "about:blank", status, title: refused?.code ?? "INTERNAL", instance: `urn:request:${requestId}`,
    ...(refused && refused.errors.length > 0 ? { errors: refused.errors } : {}),
  };
  return new Response(JSON.stringify(body), { status, headers });
}
