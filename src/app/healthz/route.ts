/** The process lives. Asks nothing of the database. */
export function GET(): Response {
  return new Response("ok\n", { headers: { "Content-Type": "text/plain; charset=utf-8", "Cache-Control": "no-store" } });
}
