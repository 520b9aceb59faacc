import { createHash } from "node:crypto";
import { createServer } from "node:net";

const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Hold the name until the server closes or the process dies, however it dies. @returns null when another holds it */
function hold(name) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", (error) => (error.code === "EADDRINUSE" ? resolve(null) : reject(error)));
    server.listen({ path: `\0notchbook-${name}` }, () => resolve(server));
  });
}

/**
 * Do something while no other command on this machine does it to the same path.
 * The lock is a socket name of the kernel's, not a file: a killed command leaves none behind.
 */
export async function withLock(path, act) {
  const name = createHash("sha256").update(path).digest("hex").slice(0, 24);
  let holder = await hold(name);
  while (!holder) {
    await pause(50);
    holder = await hold(name);
  }
  try {
    return await act();
  } finally {
    await new Promise((resolve) => holder.close(resolve));
  }
}
