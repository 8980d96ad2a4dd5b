import { createServer } from "node:net";
import { LaunchError } from "./LaunchError.mjs";

/**
 * Whether nobody listens on a port of this machine.
 * @param {number} port 0 finds a free one
 * @param {string} [host]
 * @returns {Promise<number | null>} the port, or null if it is taken
 */
export function probePort(port, host = "127.0.0.1") {
  return new Promise((done) => {
    const server = createServer();
    server.once("error", () => done(null));
    server.listen(port, host, () => {
      const address = server.address();
      const found = typeof address === "object" && address ? address.port : port;
      server.close(() => done(found));
    });
  });
}

/** A port that nobody listens on. */
export async function freePort() {
  const port = await probePort(0);
  if (port === null) throw new LaunchError("This machine has no free port on 127.0.0.1.");
  return port;
}

/**
 * The port to serve on: the asked one, or from 3000 up the first that is free.
 *
 * Errors: LaunchError where the asked one is taken or is no port.
 *
 * @param {string | undefined} asked as PORT has it
 * @param {string} [host]
 */
export async function choosePort(asked, host) {
  if (asked) {
    const port = Number(asked);
    if (!Number.isInteger(port) || port < 0 || port > 65_535) {
      throw new LaunchError(`PORT must be a number from 0 to 65535; it is "${asked}".`);
    }
    const found = await probePort(port, host);
    if (found === null) throw new LaunchError(`Port ${port} is taken. Stop what listens there, or set another PORT.`);
    return found;
  }
  for (let port = 3000; port < 3100; port++) {
    const found = await probePort(port, host);
    if (found !== null) return found;
  }
  throw new LaunchError("The ports from 3000 to 3099 are all taken. Set PORT to a free one.");
}
