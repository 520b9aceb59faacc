/**
 * The network address a request came from, for counting attempts only. It is
 * the last one noted on the way: the proxy in front writes it, and everything
 * before it is the sender's word. With no proxy in front a sender can write it
 * too, so it only ever adds a limit to the one per account. Empty when none is noted.
 */
export function clientAddress(headers: Headers): string {
  return headers.get("x-forwarded-for")?.split(",").at(-1)?.trim().slice(0, 64) ?? "";
}
