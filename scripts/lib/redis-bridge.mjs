import { mkdirSync } from "node:fs";
import { connect } from "node:net";
import path from "node:path";
import { findProgram } from "./apt.mjs";
import { freePort } from "./ports.mjs";
import { startService, untilReady } from "./processes.mjs";
import { root } from "./settings.mjs";
import { socketFolder } from "./mariadb.mjs";

const opens = (address) =>
  new Promise((resolve) => {
    const socket = connect(address);
    const done = (answer) => (socket.destroy(), resolve(answer));
    socket.once("connect", () => done(true));
    socket.once("error", () => done(false));
  });

/** Debian's Redis on a socket only we can reach: nothing kept on disk, nothing on the network. */
export async function startRedis({ dataDir, runDir, logDir }) {
  const folder = path.join(dataDir, "redis");
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const sockets = socketFolder(dataDir, "redis");
  const socket = path.join(sockets, "redis.sock");
  const service = startService({
    name: "redis",
    command: findProgram("redis-server"),
    args: ["--port", "0", "--unixsocket", socket, "--unixsocketperm", "600", "--save", "", "--appendonly", "no", "--dir", folder, "--maxmemory", "64mb", "--maxmemory-policy", "volatile-ttl"],
    runDir,
    logDir,
    leftovers: [sockets],
  });
  try {
    await untilReady(service, () => opens({ path: socket }), { seconds: 20 });
  } catch (error) {
    await service.stop();
    throw error;
  }
  const again = () => startRedis({ dataDir, runDir, logDir });
  return { service, stop: service.stop, again, socket };
}

/** The stand-in for Upstash in front of it, on a free loopback port. */
export async function startBridge({ runDir, logDir, socket, token, port: asked }) {
  const port = asked ?? (await freePort());
  const service = startService({
    name: "bridge",
    command: process.execPath,
    args: [path.join(root, "scripts", "stand-ins", "redis-bridge.mjs"), String(port), socket],
    env: { PATH: process.env.PATH, UPSTASH_REDIS_REST_TOKEN: token },
    runDir,
    logDir,
  });
  try {
    await untilReady(service, () => opens({ port, host: "127.0.0.1" }), { seconds: 20 });
  } catch (error) {
    await service.stop();
    throw error;
  }
  const again = () => startBridge({ runDir, logDir, socket, token, port });
  return { service, stop: service.stop, again, port, url: `http://127.0.0.1:${port}`, note: `127.0.0.1:${port}` };
}
