import { existsSync, readdirSync } from "node:fs";
import { PlainMessage, say } from "./place.mjs";
import { run } from "./processes.mjs";

const LISTS = "/var/lib/apt/lists";
/** Wait for another apt to finish, ask nothing, and leave a settings file that is already there as it is. */
const OPTIONS =
  "-qq -o DPkg::Lock::Timeout=300 -o Dpkg::Use-Pty=0 -o Dpkg::Options::=--force-confdef -o Dpkg::Options::=--force-confold";

/** How to act as root: directly, through a sudo that asks nothing, or not at all. */
async function rootPrefix() {
  if (process.getuid?.() === 0) return [];
  const sudo = await run("sudo", ["-n", "true"], { stdio: "capture" });
  return sudo.code === 0 ? ["sudo", "-n"] : null;
}

/**
 * Install Debian packages.
 *
 * @param {string[]} packages
 * @param {{ purpose: string, before?: string }} options `before` is a shell line run as root first
 * @throws {PlainMessage} with the line to type when this account may not, or when apt could not
 */
export async function installPackages(packages, { purpose, before }) {
  const byHand = `apt-get update && apt-get install -y --no-install-recommends ${packages.join(" ")}`;
  if (!existsSync("/usr/bin/apt-get")) {
    throw new PlainMessage(`${purpose} is not on this machine, and this is not Debian. Install it, then start again.`);
  }
  const prefix = await rootPrefix();
  if (prefix === null) {
    throw new PlainMessage(
      `${purpose} is not on this machine, and only root may install it. As root, type:\n  ${byHand}\nThen start again.`,
    );
  }
  say(`Installing ${purpose} (${packages.join(", ")}). This takes a minute or two.`);
  const [command, ...first] = [...prefix, "sh", "-c"];
  const asRoot = (line) => run(command, [...first, line], { stdio: "capture" });
  const apt = (rest) => asRoot(`DEBIAN_FRONTEND=noninteractive apt-get ${OPTIONS} ${rest}`);
  if (before) await asRoot(before);
  const install = `install -y --no-install-recommends ${packages.join(" ")}`;
  const hasLists = existsSync(LISTS) && readdirSync(LISTS).some((name) => /_Packages(\.|$)/.test(name));
  if (hasLists && (await apt(install)).code === 0) return;
  const updated = await apt("update");
  const installed = await apt(install);
  if (installed.code === 0) return;
  throw new PlainMessage(
    `apt could not install ${purpose}. It said:\n${updated.stderr}${installed.stderr}By hand, as root:\n  ${byHand}`,
  );
}
