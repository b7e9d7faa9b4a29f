import { createServer, type Server, type Socket } from "node:net";
import fc from "fast-check";
import { afterEach, expect, test } from "vitest";
import { RedisConnection, RedisError } from "@/scripts/stand-ins/resp.mjs";
import { runs } from "../setup/runs";

let server: Server | undefined;
afterEach(() => server?.close());

/** A server that answers any command with `bytes`, in pieces of the given sizes. */
async function answering(bytes: Buffer, sizes: number[]) {
  server = createServer((socket: Socket) => {
    socket.setNoDelay(true);
    socket.once("data", async () => {
      for (let at = 0, turn = 0; at < bytes.length; turn += 1) {
        const size = sizes[turn % sizes.length] ?? 1;
        socket.write(bytes.subarray(at, at + size));
        at += size;
        await new Promise(setImmediate);
      }
    });
  });
  await new Promise<void>((resolve) => server?.listen(0, "127.0.0.1", resolve));
  return new RedisConnection({ port: (server.address() as { port: number }).port, host: "127.0.0.1" });
}

type Answer = string | number | null | Answer[];
const { answer } = fc.letrec<{ answer: Answer }>((tie) => ({
  answer: fc.oneof({ depthSize: "small" }, fc.string({ unit: "grapheme" }), fc.integer(), fc.constant(null), fc.array(tie("answer"), { maxLength: 4 })),
}));

/** The encoding as the Redis serialization protocol 2 describes it. */
function encode(value: Answer): string {
  if (value === null) return "$-1\r\n";
  if (typeof value === "number") return `:${value}\r\n`;
  if (typeof value === "string") return `$${Buffer.byteLength(value)}\r\n${value}\r\n`;
  return `*${value.length}\r\n${value.map(encode).join("")}`;
}

test("answers of Redis are read whole, however the network cuts them", async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(answer, { minLength: 1, maxLength: 4 }), fc.array(fc.integer({ min: 1, max: 40 }), { minLength: 1 }), async (values, sizes) => {
      const connection = await answering(Buffer.from(values.map(encode).join("")), sizes);
      expect(await connection.send(values.map(() => ["PING"]))).toEqual(values);
      connection.close();
      server?.close();
    }),
    { numRuns: runs(60) },
  );
});

test("statuses and errors are told apart from texts", async () => {
  const connection = await answering(Buffer.from("+OK\r\n-NOSCRIPT none\r\n$2\r\nOK\r\n"), [3]);
  expect(await connection.send([["A"], ["B"], ["C"]])).toEqual([{ status: "OK" }, new RedisError("NOSCRIPT none"), "OK"]);
  connection.close();
});

test("what waits for a Redis that is gone is answered with an error, and the next command tries anew", async () => {
  const connection = await answering(Buffer.from("+OK\r\n"), [5]);
  await new Promise((resolve) => server?.close(resolve));
  expect((await connection.send([["PING"]]))[0]).toBeInstanceOf(RedisError);
  expect((await connection.send([["PING"]]))[0]).toBeInstanceOf(RedisError);
});
