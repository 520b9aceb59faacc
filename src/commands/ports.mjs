import { createServer } from "node:net";
import { PlainMessage } from "./place.mjs";

/** Listen for a moment on 127.0.0.1; port 0 lets the system choose. @returns {Promise<number>} the port */
function tryPort(port) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen({ port, host: "127.0.0.1", exclusive: true }, () => {
      const { port: given } = server.address();
      server.close(() => resolve(given));
    });
  });
}

/** A free port, the preferred one where it is free. */
export async function freePort(preferred) {
  if (preferred) {
    try {
      return await tryPort(preferred);
    } catch {
      // Taken since last time: any other will do.
    }
  }
  return tryPort(0);
}

/** @throws {PlainMessage} when something else already listens there, or this account may not */
export async function assertPortFree(port, command) {
  try {
    await tryPort(port);
  } catch (error) {
    const reason =
      error.code === "EADDRINUSE"
        ? `Port ${port} on 127.0.0.1 is already in use by another program.`
        : `This account may not listen on port ${port} (${error.code}).`;
    throw new PlainMessage(`${reason}\nStop that program, or choose another port: ${command}`);
  }
}
