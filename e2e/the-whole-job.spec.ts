import { expect, test, type Browser, type Page } from "@playwright/test";
import { glucoseFile } from "./glucose-file";
import { linkInLetter } from "./mailbox";

const PASSWORD = "seven quiet boats at dawn";
const NAME = `Nora ${String(Date.now() % 100_000)}`;
const ADDRESS = `nora-${Date.now()}@people.example`;

async function signedInAs(browser: Browser, role: "as the educator" | "as the mentor"): Promise<Page> {
  const page = await (await browser.newContext()).newPage();
  await page.goto("/");
  await page.getByRole("button", { name: role }).click();
  await page.waitForURL(/\/(review|journals)/);
  return page;
}

async function acceptInvitation(page: Page, address: string): Promise<void> {
  await page.goto(await linkInLetter(page, address, /notebook|invit/i, /invitation\?token=/));
  await page.getByRole("button", { name: /accept/i }).click();
  await page.waitForURL((url) => !url.pathname.startsWith("/invitation"));
}

async function invite(page: Page, journal: string, address: string, role: string): Promise<void> {
  await page.goto(`${journal}/circle`);
  const form = page.locator("form").filter({ has: page.getByRole("button", { name: "Send the invitation" }) });
  await form.getByLabel("E-mail address").fill(address);
  await form.getByRole("radio", { name: new RegExp(role, "i") }).check();
  await form.getByRole("button", { name: "Send the invitation" }).click();
  await expect(page.getByText(address).first()).toBeVisible();
}

async function approve(page: Page): Promise<void> {
  await page.goto("/review");
  await page.getByRole("link", { name: NAME }).first().click();
  await page.waitForURL(/review\/.+/);
  const form = page.locator("form").filter({ has: page.getByRole("button", { name: "Sign and approve" }) });
  for (const box of await form.getByRole("checkbox").all()) await box.check();
  await form.getByLabel("Next review by").fill("2099-01-15");
  await form.getByRole("button", { name: "Sign and approve" }).click();
  await page.waitForURL(/decided=approved/);
}

test("a person starts, changes one thing, and sees what followed", async ({ page, browser }) => {
  test.setTimeout(240_000);
  const faults: string[] = [];
  page.on("console", (message) => message.type() === "error" && faults.push(message.text()));
  page.on("pageerror", (error) => faults.push(error.message));

  await test.step("sign up and verify by the mail received", async () => {
    await page.goto("/sign-up");
    await page.getByRole("button", { name: "Make an account" }).click();
    await expect(page.getByRole("heading", { name: "There is a problem" })).toBeVisible();
    await page.getByLabel("Name that others see").fill(NAME);
    await page.getByLabel("E-mail address").fill(ADDRESS);
    await page.getByLabel("Password").fill(PASSWORD);
    await page.getByLabel("Time zone").selectOption("UTC");
    await page.getByRole("checkbox").check();
    await page.getByRole("button", { name: "Make an account" }).click();
    await page.waitForURL("/check-your-mail");
    await page.goto(await linkInLetter(page, ADDRESS, /Verify/, /verify-email\?token=/));
    await page.getByRole("button", { name: "Verify this address" }).click();
    await page.waitForURL("/journals");
  });

  const journal = await test.step("start a journal", async () => {
    await page.getByRole("link", { name: "Start a journal" }).click();
    await page.getByLabel("Name of the notebook").fill("Nora’s notebook");
    await page.getByRole("radio", { name: "mg/dL" }).check();
    await page.getByLabel("Time zone of the notebook").selectOption("UTC");
    await page.getByRole("radio", { name: "Injections" }).check();
    await page.getByRole("button", { name: "Start the journal" }).click();
    await page.waitForURL(/start\/about-you/);
    return new URL(page.url()).pathname.replace("/start/about-you", "");
  });

  await test.step("go through the starting profile, leave and come back", async () => {
    await page.getByLabel("Weight, kg").fill("80");
    await page.getByLabel("Age, years").fill("41");
    await page.getByLabel("All insulin of a usual day, U").fill("40,0 U");
    await page.getByRole("radio", { name: "No", exact: true }).check();
    await page.getByRole("button", { name: "Questions next" }).click();
    await page.waitForURL(/start\/gate/);
    for (const no of await page.getByRole("radio", { name: "No", exact: true }).all()) await no.check();
    await page.getByRole("button", { name: "Insulin and device next" }).click();
    await page.waitForURL(/start\/device/);
    await page.goto(`${journal}/start/about-you`);
    await expect(page.getByLabel("Weight, kg")).toHaveValue("80");
    await page.goto(`${journal}/start/device`);
    await page.getByRole("button", { name: "Basal next" }).click();
    await page.waitForURL(/start\/basal/);
    await expect(page.getByLabel("Value 1, U/h")).toHaveValue("0.50");
    await page.getByRole("button", { name: "Carb ratio next" }).click();
    await page.waitForURL(/start\/carb-ratio/);
    await expect(page.getByLabel("Value 1, g/U")).toHaveValue("17");
    await page.getByRole("button", { name: "Sensitivity next" }).click();
    await page.waitForURL(/start\/sensitivity/);
    await expect(page.getByLabel("Value 1, mg/dL per U")).toHaveValue("60");
    await page.getByRole("button", { name: "Targets next" }).click();
    await page.waitForURL(/start\/targets/);
    await page.getByRole("button", { name: "Limits next" }).click();
    await page.waitForURL(/start\/limits/);
    await page.getByRole("button", { name: "Margin next" }).click();
    await page.waitForURL(/start\/margin/);
    await page.getByRole("button", { name: "Way back next" }).click();
    await page.waitForURL(/start\/fallback/);
    await page.getByLabel("What you would go back to").fill("Long-acting 20 U at night, rapid by the table.");
    await page.getByLabel("Emergency number where you live").fill("112");
    await page.getByLabel("Name 1").fill("Pal");
    await page.getByLabel("Phone 1").fill("+1 555 0100");
    await page.getByRole("button", { name: "Review next" }).click();
    await page.waitForURL(/start\/review/);
  });

  await test.step("invite an educator and a mentor, and ask", async () => {
    await invite(page, journal, "marguerite@demo.example", "educator");
    await invite(page, journal, "tobias@demo.example", "mentor");
    await page.goto(`${journal}/start/review`);
    await page.getByRole("button", { name: "Ask the educator" }).click();
    await page.waitForURL(/changes\/1$/);
    await expect(page.getByText("Sent to your educator.")).toBeVisible();
  });

  const educator = await signedInAs(browser, "as the educator");
  await acceptInvitation(educator, "marguerite@demo.example");
  await test.step("the educator signs exactly this version", () => approve(educator));

  await test.step("put it into effect and bring in a real file", async () => {
    await page.goto(`${journal}/changes/1`);
    await page.getByLabel("On the device since").fill("2015-06-07T07:00");
    await page.getByRole("button", { name: "It is on my device" }).click();
    await expect(page.getByText(/In effect since/)).toBeVisible();

    const file = glucoseFile();
    for (const expected of ["first", "again"] as const) {
      await page.goto(`${journal}/data`);
      await page.getByLabel("A file of glucose readings").setInputFiles({ name: file.name, mimeType: "text/csv", buffer: Buffer.from(file.text) });
      await page.getByRole("button", { name: "Look at the file" }).click();
      await page.waitForURL(/data\/[0-9a-f-]{36}$/);
      await page.getByLabel("Whose rows are yours?").selectOption("Subject_1");
      await page.getByRole("radio", { name: "mg/dL" }).check();
      await page.getByRole("radio", { name: "the day comes first" }).check();
      await page.getByRole("button", { name: "Store the valid rows" }).click();
      await expect(page.getByRole("heading", { name: /stored\./ })).toBeVisible({ timeout: 60_000 });
      const added = Number(await page.getByRole("row", { name: /New readings/ }).getByRole("cell").last().textContent());
      if (expected === "first") expect(added).toBe(file.isOpenData ? 2915 : 13 * 288);
      else expect(added).toBe(0);
    }
  });

  await test.step("log a change and have it approved", async () => {
    await page.goto(`${journal}/changes`);
    await page.getByRole("link", { name: "Propose a change" }).click();
    await page.getByRole("radio", { name: /Basal rate/ }).check();
    await page.getByLabel("Until").fill("04:00");
    await page.getByLabel(/New value/).fill("0,55 U/h");
    await page.getByLabel("Why?").selectOption("pattern-high");
    await page.getByLabel("What do you hope to see move?").selectOption("mean-glucose");
    await page.getByLabel("In which part of the day?").selectOption("night");
    await page.getByLabel("Which way?").selectOption("fall");
    await page.getByRole("button", { name: "Ask my educator" }).click();
    const asked = page.getByLabel("Before this goes on, say in a few words").first();
    await expect(asked).toBeVisible();
    for (const box of await page.getByLabel("Before this goes on, say in a few words").all()) await box.fill("Seen on many nights before the file begins.");
    await page.getByRole("button", { name: "Ask my educator" }).click();
    await page.waitForURL(/changes\/2$/);
    await approve(educator);
    await page.reload();
    await page.getByLabel("On the device since").fill("2015-06-12T22:00");
    await page.getByRole("button", { name: "It is on my device" }).click();
    await expect(page.getByText(/In effect since/)).toBeVisible();
  });

  await test.step("see what followed, in words, as a drawing and as a table", async () => {
    await page.getByRole("link", { name: "See what followed" }).click();
    await page.waitForURL(/compare\/2$/);
    await expect(page.getByRole("heading", { level: 1 })).toContainText("version 2");
    await expect(page.getByText(/clean nights after/).first()).toBeVisible();
    await expect(page.getByText(/likely between/).first()).toBeVisible();
    await expect(page.locator("canvas")).toBeVisible();
    await page.getByText("The same as a table").first().click();
    await expect(page.getByRole("cell", { name: /to/ }).first()).toBeVisible();
    await page.getByRole("link", { name: "How this is worked out" }).click();
    await expect(page.getByRole("heading", { name: "5. The error bar" })).toBeVisible();
  });

  await test.step("the mentor reads and comments", async () => {
    const mentor = await signedInAs(browser, "as the mentor");
    await acceptInvitation(mentor, "tobias@demo.example");
    await mentor.goto(`${journal}/compare/2`);
    await mentor.getByLabel("Comment or question").fill("What was different on the night that stands out?");
    await mentor.getByRole("button", { name: "Send as a question" }).click();
    await expect(mentor.getByText("What was different on the night that stands out?")).toBeVisible();
    await page.goto(`${journal}/compare/2`);
    await expect(page.getByText("What was different on the night that stands out?")).toBeVisible();
  });

  await test.step("a digest is received", async () => {
    await page.goto("/account");
    await page.getByRole("button", { name: /now/i }).click();
    await linkInLetter(page, ADDRESS, /Your week in Notchbook/, /unsubscribe|journal|\/j\//);
    await expect(page.locator("main")).toContainText(/week/i);
  });

  expect(faults).toEqual([]);
});
