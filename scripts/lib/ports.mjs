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

/**
 * The port to use: the one asked for, or the first free one from `usual` on.
 * @throws Failure when the one asked for is taken or not allowed.
 */
export async function choosePort({ asked, usual, host = "127.0.0.1", variable }) {
  if (asked !== undefined) {
    const error = await tryPort(asked, host).then(() => undefined, (reason) => reason);
    if (!error) return asked;
    if (error.code === "EACCES") throw new Failure(`This account may not open port ${asked}: set ${variable} to a port above 1023.`);
    if (error.code === "EADDRNOTAVAIL" || error.code === "ENOTFOUND" || error.code === "EINVAL")
      throw new Failure(`${host} is not an address of this machine: set HOST to 127.0.0.1, or to 0.0.0.0 to open the site to the network.`);
    throw new Failure(`Port ${asked} is taken by another program: stop that program, or set ${variable} to another port.`);
  }
  if (usual === undefined) return freePort(host);
  for (let port = usual; port < usual + 100; port += 1) if (await isFree(port, host)) return port;
  return freePort(host);
}
