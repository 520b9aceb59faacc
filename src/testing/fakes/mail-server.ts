import { createServer, type IncomingMessage, type ServerResponse } from "node:http";
import type { AddressInfo } from "node:net";
import { faultDrawer, faultPlanSchema, faultSchema, type MailFault } from "./mail-faults";
import { MailLedger } from "./mail-ledger";

const BYTES_AT_MOST = 5_000_000;

type Options = Readonly<{ port: number; file: string | null; holdMs?: number; now?: () => Date }>;

/**
 * The mail provider's interface on this machine: it takes letters as the real
 * one does, keeps them, shows them, and can be told to go amiss.
 *
 * POST /emails with an Idempotency-Key; GET /mailbox (`?to=` for one recipient)
 * and GET /mailbox/ID; PUT /faults with a plan, or `?fault=` or an X-Fault header
 * for one request.
 *
 * @param options.file where letters are kept, line by line; null for memory only
 * @param options.holdMs how long a request hangs before its connection is cut
 */
export async function startMailServer({ port, file, holdMs = 60_000, now = () => new Date() }: Options) {
  const ledger = new MailLedger(file);
  const inHand = new Set<string>();
  let draw: () => MailFault = () => "none";

  const server = createServer((request, response) => {
    void answer(request, response).catch(() => response.destroy());
  });

  async function answer(request: IncomingMessage, response: ServerResponse): Promise<void> {
    const url = new URL(request.url ?? "/", "http://127.0.0.1");
    const [, room, id] = url.pathname.split("/");
    if (request.method === "GET" && room === "mailbox") {
      if (!id) return send(response, 200, ledger.list(url.searchParams.get("to")));
      const mail = ledger.find(id);
      return mail ? send(response, 200, mail) : refuse(response, 404, "not_found", "no such letter");
    }
    if (request.method === "GET" && url.pathname === "/") return send(response, 200, { letters: "/mailbox" });
    const body = await bodyOf(request);
    if (body === null) return refuse(response, 413, "validation_error", "the letter is too large");
    if (request.method === "PUT" && url.pathname === "/faults") {
      const plan = faultPlanSchema.safeParse(JSON.parse(body));
      if (!plan.success) return refuse(response, 422, "validation_error", "not a plan of faults");
      draw = faultDrawer(plan.data);
      return send(response, 200, plan.data);
    }
    if (request.method !== "POST" || url.pathname !== "/emails") return refuse(response, 404, "not_found", "no such address");
    if (!/^Bearer .+/.test(request.headers.authorization ?? "")) return refuse(response, 401, "missing_api_key", "a key is needed");
    const asked = faultSchema.safeParse(url.searchParams.get("fault") ?? request.headers["x-fault"]);
    return takeLetter(request, response, body, asked.success ? asked.data : draw());
  }

  async function takeLetter(request: IncomingMessage, response: ServerResponse, body: string, fault: MailFault): Promise<void> {
    const key = [request.headers["idempotency-key"] ?? null].flat()[0] ?? null;
    if (key !== null && (key.length === 0 || key.length > 256)) return refuse(response, 400, "invalid_idempotency_key", "a key has 1 to 256 characters");
    if (fault === "429") return refuse(response, 429, "rate_limit_exceeded", "too many requests");
    if (fault === "500-before") return refuse(response, 500, "internal_server_error", "something went amiss");
    if (fault === "reset-before") return void response.destroy();
    if (fault === "hang-before") return hang(response);
    if (fault === "409" || (key !== null && inHand.has(key))) {
      return refuse(response, 409, "concurrent_idempotent_requests", "a request with this key is in hand");
    }
    if (key !== null) inHand.add(key);
    try {
      const taken = ledger.take(body, key, now());
      if (taken.kind === "invalid") return refuse(response, 422, "validation_error", taken.message);
      if (taken.kind === "other-body") return refuse(response, 409, "invalid_idempotent_request", "this key brought another letter");
      if (fault === "500-after") return refuse(response, 500, "internal_server_error", "something went amiss");
      if (fault === "reset-after") return void response.destroy();
      if (fault === "hang-after") return await hang(response);
      if (fault === "garbled") return void response.writeHead(200, { "Content-Type": "application/json" }).end("{\"id\":");
      return send(response, 200, { id: taken.id });
    } finally {
      if (key !== null) inHand.delete(key);
    }
  }

  /** Say nothing until the caller gives up or the hold is over, then cut the connection. */
  async function hang(response: ServerResponse): Promise<void> {
    await new Promise<void>((resolve) => {
      const timer = setTimeout(resolve, holdMs);
      response.once("close", () => {
        clearTimeout(timer);
        resolve();
      });
    });
    response.destroy();
  }

  await new Promise<void>((resolve, reject) => {
    server.once("error", reject);
    server.listen(port, "127.0.0.1", resolve);
  });
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const close = async () => {
    server.closeAllConnections();
    await new Promise((resolve) => server.close(resolve));
  };
  return { url, ledger, close };
}

function send(response: ServerResponse, status: number, body: unknown): void {
  response.writeHead(status, { "Content-Type": "application/json; charset=utf-8" }).end(JSON.stringify(body));
}

function refuse(response: ServerResponse, statusCode: number, name: string, message: string): void {
  send(response, statusCode, { statusCode, name, message });
}

async function bodyOf(request: IncomingMessage): Promise<string | null> {
  const chunks: Buffer[] = [];
  let bytes = 0;
  for await (const chunk of request as AsyncIterable<Buffer>) {
    bytes += chunk.length;
    if (bytes > BYTES_AT_MOST) return null;
    chunks.push(chunk);
  }
  return Buffer.concat(chunks).toString("utf8");
}

async function main(): Promise<void> {
  const { url, close } = await startMailServer({
    port: Number(process.env.MAIL_FAKE_PORT ?? 0),
    file: process.env.MAIL_FAKE_FILE ?? ".data/mailbox.jsonl",
    holdMs: Number(process.env.MAIL_FAKE_HOLD_MS ?? 60_000),
  });
  process.stdout.write(`${JSON.stringify({ at: new Date().toISOString(), level: "info", event: "mail.ready", url })}\n`);
  for (const signal of ["SIGTERM", "SIGINT"] as const) process.once(signal, () => void close().then(() => process.exit(0)));
}

if (process.argv[1]?.endsWith("mail-server.ts")) await main();
