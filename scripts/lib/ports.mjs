import { createServer } from "node:net";
import { Failure } from "./failure.mjs";

/** Opens the port for a moment: the only question whose answer counts. Port 0 asks for any. */
function tryPort(port, host) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once("error", reject);
    server.listen({ port, host, exclusive: true }, () => {
      const { port: given } = server.address();
      server.close(() => resolve(given));
    });
  });
}

export async function isFree(port, host = "127.0.0.1") {
  return tryPort(port, host).then(() => true, () => false);
}

export function freePort(host = "127.0.0.1") {
  return tryPort(0, host);
}

/** What to do about a port that could not be opened, or undefined when it is merely taken. */
function portFailure({ code }, { port, host, variable }) {
  if (code === "EACCES") return new Failure(`This account may not open port ${port}: set ${variable} to a port above 1023.`);
  if (code === "EADDRINUSE") return undefined;
  return new Failure(`${host} is not an address of this machine: set HOST to 127.0.0.1, or to 0.0.0.0 to open the site to the network.`);
}

/**
 * The port to use: the one asked for, or the first free one from `usual` on.
 * @throws Failure when the one asked for is taken or none can be opened.
 * @param {{ asked?: number, usual?: number, host?: string, variable: string }} wish
 */
export async function choosePort({ asked, usual = 0, host = "127.0.0.1", variable }) {
  const first = asked ?? usual;
  const last = asked ?? usual + 100;
  for (let port = first; port <= last; port += 1) {
    try {
      return await tryPort(port, host);
    } catch (error) {
      const failure = portFailure(error, { port, host, variable });
      if (failure) throw failure;
    }
  }
  if (asked === undefined) return freePort(host);
  throw new Failure(`Port ${asked} is taken by another program: stop that program, or set ${variable} to another port.`);
}
