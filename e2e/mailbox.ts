import { expect, type Page } from "@playwright/test";

/**
 * Open the newest letter to an address in the local mailbox page, as a reader
 * of the demo would, and give the link in it.
 */
export async function linkInLetter(page: Page, to: string, subject: RegExp, link: RegExp): Promise<string> {
  const letter = page.getByRole("link").filter({ hasText: subject }).filter({ hasText: to }).first();
  await expect(async () => {
    await page.goto("/developer/mailbox");
    await expect(letter).toBeVisible({ timeout: 500 });
  }).toPass({ timeout: 30_000 });
  await letter.click();
  await page.waitForURL(/letter=/);
  const href = await page.locator("main a[href]").evaluateAll((all, pattern) => all.map((a) => (a as HTMLAnchorElement).href).find((h) => new RegExp(pattern).test(h)), link.source);
  if (!href) throw new Error(`no link like ${link.source} in the letter to ${to}`);
  return href;
}
