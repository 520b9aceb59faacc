import { readinessOf } from "@/lib/readiness";

/** Ready to serve: the database answers in time and has the schema this build expects. */
export async function GET(): Promise<Response> {
  const why = await readinessOf();
  return new Response(why === null ? "ready\n" : `not ready: ${why}\n`, {
    status: why === null ? 200 : 503,
    headers: { "Content-Type": "text/plain; charset=utf-8", "Cache-Control": "no-store", ...(why === null ? {} : { "Retry-After": "5" }) },
  });
}
