import { timingSafeEqual } from "node:crypto";
import { createServer } from "node:http";
import { pathToFileURL } from "node:url";
import { RedisConnection, RedisError } from "./resp.mjs";

const MOST_BYTES = 1024 * 1024;

/** Upstash's scripts begin with a line of flags that Redis 7.0 refuses; the rest of the script is what it means. */
const withoutFlags = (script) => String(script).replace(/^#!lua[^\n]*\n/, "");

function asSent(command) {
  const [name, script, ...rest] = command;
  const upper = String(name).toUpperCase();
  if (upper === "EVAL") return [name, withoutFlags(script), ...rest];
  if (upper === "SCRIPT" && String(script).toUpperCase() === "LOAD") return [name, script, withoutFlags(rest[0]), ...rest.slice(1)];
  return command;
}

/** Redis's answer as Upstash writes it; with `base64`, every string but a status is encoded as its clients ask by default. */
function asAnswered(value, base64) {
  if (value instanceof RedisError) return { error: value.message };
  const plain = (item) => {
    if (item instanceof RedisError) return item.message;
    if (Array.isArray(item)) return item.map(plain);
    if (item !== null && typeof item === "object") return item.status;
    return base64 && typeof item === "string" ? Buffer.from(item).toString("base64") : item;
  };
  return { result: plain(value) };
}

async function readBody(request) {
  const chunks = [];
  let size = 0;
  for await (const chunk of request) {
    size += chunk.length;
    if (size > MOST_BYTES) throw new RedisError("ERR max request size exceeded");
    chunks.push(chunk);
  }
  return JSON.parse(Buffer.concat(chunks).toString("utf8"));
}

const isCommand = (value) => Array.isArray(value) && value.length > 0 && value.every((part) => ["string", "number", "boolean"].includes(typeof part));
const isCommands = (value) => Array.isArray(value) && value.length > 0 && value.every(isCommand);

/** Answers one request: [status, body]. */
async function answer(redis, path, body, base64) {
  if (path === "/") {
    if (!isCommand(body)) return [400, { error: "ERR the body must be one command as an array" }];
    const [value] = await redis.send([asSent(body)]);
    return [value instanceof RedisError ? 400 : 200, asAnswered(value, base64)];
  }
  if (path !== "/pipeline" && path !== "/multi-exec") return [404, { error: "ERR no such path" }];
  if (!isCommands(body)) return [400, { error: "ERR the body must be an array of commands" }];
  if (path === "/pipeline") return [200, (await redis.send(body.map(asSent))).map((value) => asAnswered(value, base64))];
  const answers = await redis.send([["MULTI"], ...body.map(asSent), ["EXEC"]]);
  const values = answers.at(-1);
  if (values instanceof RedisError) return [400, { error: values.message }];
  return [200, values.map((value) => asAnswered(value, base64))];
}

/** The stand-in for Upstash's REST service: its manner of asking and answering in front of a Redis. */
export function redisBridge({ redis, token }) {
  const expected = Buffer.from(`Bearer ${token}`);
  return createServer(async (request, response) => {
    const reply = (status, body) => {
      response.writeHead(status, { "content-type": "application/json" });
      response.end(JSON.stringify(body));
    };
    const given = Buffer.from(request.headers.authorization ?? "");
    if (given.length !== expected.length || !timingSafeEqual(given, expected)) return reply(401, { error: "WRONGPASS invalid or missing auth token" });
    if (request.method !== "POST") return reply(405, { error: "ERR only POST is served" });
    try {
      const body = await readBody(request);
      reply(...(await answer(redis, new URL(request.url, "http://bridge").pathname, body, request.headers["upstash-encoding"] === "base64")));
    } catch (error) {
      if (error instanceof SyntaxError) reply(400, { error: "ERR the body is not JSON" });
      else reply(error instanceof RedisError ? 400 : 500, { error: error.message });
    }
  });
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const [, , port, socket] = process.argv;
  const server = redisBridge({ redis: new RedisConnection({ path: socket }), token: process.env.UPSTASH_REDIS_REST_TOKEN ?? "" });
  server.keepAliveTimeout = 65_000;
  server.listen(Number(port), "127.0.0.1");
  const stop = () => {
    server.close(() => process.exit(0));
    server.closeAllConnections();
  };
  process.on("SIGTERM", stop);
  process.on("SIGINT", stop);
}
