import { readdirSync } from "node:fs";
import { expect, test, type APIRequestContext, type Browser } from "@playwright/test";

const APP = "src/app";

/** Every page and route handler there is, as an address with the journal and sample parts filled in. */
function addresses(journal: string): { path: string; isApi: boolean }[] {
  return readdirSync(APP, { recursive: true, encoding: "utf8" })
    .filter((file) => /(page\.tsx|route\.ts)$/.test(file))
    .map((file) => {
      const path = `/${file}`
        .replace(/\/(page\.tsx|route\.ts)$/, "")
        .replace(/\/\([^/]+\)/g, "")
        .replace("[journalId]", journal)
        .replace("[number]", "3")
        .replace("[date]", "2026-01-01")
        .replace("[importId]", "00000000-0000-4000-8000-000000000001")
        .replace("[step]", "basal")
        .replace("[token]", "x");
      return { path: path || "/", isApi: file.endsWith("route.ts") };
    });
}

async function as(browser: Browser, role: string): Promise<{ request: APIRequestContext; url: string }> {
  const page = await (await browser.newContext()).newPage();
  await page.goto("/");
  await page.getByRole("button", { name: role }).click();
  await page.waitForURL((url) => url.pathname !== "/");
  return { request: page.context().request, url: page.url() };
}

/** Pages of a journal that only its person may open. */
const PERSON_ONLY = /\/(start\/|changes\/new|data|circle(\/access-log)?$|circle$)/;

test("every page and route of a journal is shut to whoever has no business there", async ({ browser, request }) => {
  test.setTimeout(120_000);
  const person = await as(browser, "as the person");
  const journal = /\/j\/([^/]+)/.exec(person.url)?.[1] ?? "";
  const inJournal = addresses(journal).filter(({ path }) => path.includes(journal) && !path.includes("/upload"));
  expect(inJournal.length).toBeGreaterThan(15);
  const administrator = await as(browser, "as the administrator");
  const mentor = await as(browser, "as the mentor");
  const family = await as(browser, "as the family helper");

  for (const { path, isApi } of inJournal) {
    const nobody = await request.get(path, { maxRedirects: 0 });
    expect([isApi ? 401 : 307], `signed out, ${path}`).toContain(nobody.status());
    expect((await administrator.request.get(path, { maxRedirects: 0 })).status(), `no grant, ${path}`).toBe(404);
    if (PERSON_ONLY.test(path) && !path.includes("comments")) {
      for (const helper of [mentor, family]) expect((await helper.request.get(path, { maxRedirects: 0 })).status(), `weak role, ${path}`).toBe(403);
    }
  }
  expect((await mentor.request.get("/administration", { maxRedirects: 0 })).status()).toBe(403);
});

test("an upload or an undo from another site is refused, and so is a body that is none", async ({ browser }) => {
  const person = await as(browser, "as the person");
  const journal = /\/j\/([^/]+)/.exec(person.url)?.[1] ?? "";
  const upload = await person.request.post(`/j/${journal}/data/upload`, { headers: { origin: "https://elsewhere.example", "sec-fetch-site": "cross-site" }, multipart: { file: { name: "a.csv", mimeType: "text/csv", buffer: Buffer.from("x") } } });
  expect(upload.status()).toBe(403);
  const undo = await person.request.delete(`/api/v1/journals/${journal}/imports/not-an-id`, { headers: { "sec-fetch-site": "same-origin" } });
  expect(undo.status()).toBe(400);
  expect(undo.headers()["content-type"]).toContain("application/problem+json");
  expect(((await undo.json()) as { errors: unknown[] }).errors.length).toBeGreaterThan(0);
});

test("every answer carries the headers that protect it", async ({ request }) => {
  for (const path of ["/", "/sign-in", "/nowhere", "/healthz", "/api/v1/me"]) {
    const headers = (await request.get(path)).headers();
    expect(headers["x-content-type-options"], path).toBe("nosniff");
    expect(headers["content-security-policy"], path).toContain("frame-ancestors 'none'");
    expect(headers["x-powered-by"], path).toBeUndefined();
  }
});
