import { existsSync } from "node:fs";
import { installPackages } from "./apt.mjs";
import { PlainMessage, say } from "./place.mjs";
import { run } from "./processes.mjs";

const DEBIAN = "/usr/bin/chromium";

/** Chromium's path: CHROMIUM when set, else Debian's, installed when missing. @throws {PlainMessage} */
export async function findChromium() {
  const chosen = process.env.CHROMIUM;
  if (chosen && !existsSync(chosen)) throw new PlainMessage(`CHROMIUM names ${chosen}, which is not there.`);
  if (chosen) return chosen;
  if (!existsSync(DEBIAN)) {
    await installPackages(["chromium", "chromium-sandbox", "fonts-liberation"], { purpose: "Chromium" });
  }
  return DEBIAN;
}

/** Chromium shuts each page into a sandbox, which it cannot as root, nor in a container that forbids it. */
export async function canSandbox(chromium) {
  if (process.getuid?.() === 0) return false;
  const probe = ["--headless", "--disable-gpu", "--dump-dom", "about:blank"];
  const { code } = await run("timeout", ["30", chromium, ...probe], { stdio: "capture" });
  if (code !== 0) say("Chromium's sandbox does not work on this machine: the stories run without it.");
  return code === 0;
}
