import { test } from "@playwright/test";

const ROLES = ["as the person", "as the mentor", "as the educator", "as the administrator"] as const;
const PUBLIC = ["/", "/about", "/how-it-compares", "/help", "/sign-in", "/sign-up", "/reset-password"];
const JOURNAL = ["today", "days", "changes", "changes/3", "changes/new", "compare/2", "compare/3", "compare/4", "compare/3/how", "plan", "circle", "circle/access-log", "data", "fallback", "more"];
const OF_ROLE: Record<(typeof ROLES)[number], (journal: string) => string[]> = {
  "as the person": (j) => ["/journals", "/journals/new", "/account", ...JOURNAL.map((page) => `/j/${j}/${page}`)],
  "as the mentor": (j) => ["/journals", `/j/${j}/changes`, `/j/${j}/compare/3`],
  "as the educator": (j) => ["/review", `/review/${j}/6`, `/j/${j}/changes`],
  "as the administrator": () => ["/administration"],
};

test("public pages", async ({ page }, info) => {
  for (const path of PUBLIC) {
    await page.goto(path);
    await page.screenshot({ path: `.gallery/public${path.replaceAll("/", "-")}-${info.project.name}.png`, fullPage: true });
  }
});

for (const role of ROLES) {
  test(role, async ({ page }, info) => {
    await page.goto("/");
    await page.getByRole("button", { name: role }).click();
    await page.waitForURL((url) => url.pathname !== "/");
    await page.goto("/journals");
    const href = await page.locator('main a[href^="/j/"]').first().getAttribute("href", { timeout: 2000 }).catch(() => null);
    for (const path of OF_ROLE[role](href?.split("/")[2] ?? "")) {
      await page.goto(path);
      await page.waitForLoadState("networkidle");
      const name = path.replace(/[0-9a-f-]{36}/, "j").replaceAll("/", "-");
      await page.screenshot({ path: `.gallery/${role.replace("as the ", "")}${name}-${info.project.name}.png`, fullPage: true });
    }
  });
}
