import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { faultDrawer } from "./mail-faults";
import { startMailServer } from "./mail-server";

type Server = Awaited<ReturnType<typeof startMailServer>>;
const letter = { from: "a@example.org", to: "b@example.org", subject: "Hello", html: "<p>Hello</p>", text: "Hello", headers: { "X-One": "1" } };

describe("the mail fake", () => {
  const folder = mkdtempSync(join(tmpdir(), "mail-"));
  const file = join(folder, "mailbox.jsonl");
  let server: Server;
  let now: Date;

  beforeEach(async () => {
    now = new Date("2026-03-10T09:00:00Z");
    server = await startMailServer({ port: 0, file, holdMs: 50, now: () => now });
  });
  afterEach(async () => {
    await server.close();
    rmSync(file, { force: true });
  });

  const post = (body: unknown, headers: Record<string, string> = {}, query = "") =>
    fetch(`${server.url}/emails${query}`, { method: "POST", headers: { Authorization: "Bearer x", ...headers }, body: JSON.stringify(body) });
  const outcome = async (response: Response) => ({ status: response.status, ...(await response.json() as { id?: string; name?: string }) });
  const mailbox = async (query = "") => (await fetch(`${server.url}/mailbox${query}`)).json() as Promise<{ id: string; subject: string }[]>;

  it("keeps a letter and shows it, newest first, also after a restart", async () => {
    const { id } = await outcome(await post(letter));
    await post({ ...letter, subject: "Second", to: ["c@example.org"] });
    expect((await mailbox()).map(({ subject }) => subject)).toEqual(["Second", "Hello"]);
    expect(await mailbox("?to=b@example.org")).toHaveLength(1);
    await server.close();
    server = await startMailServer({ port: 0, file, now: () => now });
    expect(await (await fetch(`${server.url}/mailbox/${id}`)).json()).toMatchObject({ id, to: ["b@example.org"], text: "Hello", headers: { "X-One": "1" } });
    expect((await fetch(`${server.url}/mailbox/none`)).status).toBe(404);
  });

  it("folds the same key and letter into one, refuses the key for another, and forgets it after a day", async () => {
    const key = { "Idempotency-Key": "weekly-digest/1" };
    const first = await outcome(await post(letter, key));
    expect(await outcome(await post(letter, key))).toEqual(first);
    expect(await outcome(await post({ ...letter, subject: "Other" }, key))).toMatchObject({ status: 409, name: "invalid_idempotent_request" });
    expect(await mailbox()).toHaveLength(1);
    now = new Date(now.getTime() + 24 * 3_600_000);
    expect((await outcome(await post(letter, key))).id).not.toBe(first.id);
  });

  it("refuses what the provider refuses: no key of ours, no subject, a broken line in the subject", async () => {
    expect((await fetch(`${server.url}/emails`, { method: "POST", body: "{}" })).status).toBe(401);
    expect((await post({ ...letter, subject: undefined })).status).toBe(422);
    expect((await post({ ...letter, subject: "a\r\nBcc: x@example.org" })).status).toBe(422);
    expect((await post(letter, { "Idempotency-Key": "x".repeat(257) })).status).toBe(400);
    expect(await mailbox()).toEqual([]);
  });

  it.each([
    ["429", 429, 0], ["409", 409, 0], ["500-before", 500, 0], ["500-after", 500, 1],
    ["reset-before", null, 0], ["reset-after", null, 1], ["hang-before", null, 0], ["hang-after", null, 1], ["garbled", null, 1],
  ] as const)("goes amiss by %s when told to", async (fault, status, kept) => {
    const answered = post(letter, {}, `?fault=${fault}`).then((response) => response.status === 200 ? response.json().then(() => 200) : response.status);
    if (status === null) await expect(answered).rejects.toThrow();
    else expect(await answered).toBe(status);
    expect(await mailbox()).toHaveLength(kept);
  });

  it("draws the same faults from the same seed, about as many as planned", () => {
    const plan = { share: 0.4, seed: 7, faults: ["429", "reset-after"] as ("429" | "reset-after")[] };
    const drawn = (draw: () => string) => Array.from({ length: 1000 }, draw);
    const once = drawn(faultDrawer(plan));
    expect(drawn(faultDrawer(plan))).toEqual(once);
    expect(once.filter((fault) => fault !== "none").length).toBeGreaterThan(350);
    expect(once.filter((fault) => fault !== "none").length).toBeLessThan(450);
  });
});
