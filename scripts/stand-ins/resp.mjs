import { connect } from "node:net";

/** An error Redis answered; in a pipeline it is an answer among others. */
export class RedisError extends Error {}

const command = (args) => {
  const parts = [Buffer.from(`*${args.length}\r\n`)];
  for (const arg of args) {
    const bytes = Buffer.from(String(arg), "utf8");
    parts.push(Buffer.from(`$${bytes.length}\r\n`), bytes, Buffer.from("\r\n"));
  }
  return Buffer.concat(parts);
};

/** Reads one answer of RESP 2 from `bytes` at `at`: `[value, next]`, or undefined when it is not all there yet. */
function readAnswer(bytes, at) {
  const end = bytes.indexOf("\r\n", at);
  if (end < 0) return undefined;
  const line = bytes.toString("utf8", at + 1, end);
  const next = end + 2;
  switch (bytes[at]) {
    case 0x2b: // +
      return [{ status: line }, next];
    case 0x2d: // -
      return [new RedisError(line), next];
    case 0x3a: // :
      return [Number(line), next];
    case 0x24: { // $
      const length = Number(line);
      if (length < 0) return [null, next];
      return bytes.length < next + length + 2 ? undefined : [bytes.toString("utf8", next, next + length), next + length + 2];
    }
    case 0x2a: { // *
      const count = Number(line);
      if (count < 0) return [null, next];
      const values = [];
      let position = next;
      for (let index = 0; index < count; index += 1) {
        const read = readAnswer(bytes, position);
        if (!read) return undefined;
        values.push(read[0]);
        position = read[1];
      }
      return [values, position];
    }
    default:
      throw new RedisError(`not an answer of Redis: ${line}`);
  }
}

/** A connection to Redis that sends commands in order and hands each its answer; opened anew when it was lost. */
export class RedisConnection {
  #address;
  #socket;
  #waiting = [];
  #bytes = Buffer.alloc(0);

  constructor(address) {
    this.#address = address;
  }

  #open() {
    if (this.#socket) return this.#socket;
    const socket = connect(this.#address);
    socket.on("data", (chunk) => {
      this.#bytes = Buffer.concat([this.#bytes, chunk]);
      let read;
      let at = 0;
      while (at < this.#bytes.length && (read = readAnswer(this.#bytes, at))) {
        at = read[1];
        this.#waiting.shift()?.(read[0]);
      }
      this.#bytes = this.#bytes.subarray(at);
    });
    socket.on("error", () => {}); // "close" follows
    socket.on("close", () => {
      if (this.#socket !== socket) return;
      this.#socket = undefined;
      this.#bytes = Buffer.alloc(0);
      for (const answer of this.#waiting.splice(0)) answer(new RedisError("ERR Redis is not reachable"));
    });
    return (this.#socket = socket);
  }

  /** Sends all commands in one write, so that nothing comes between them, and answers when the last is answered. */
  send(commands) {
    const socket = this.#open();
    const answers = commands.map(() => new Promise((resolve) => this.#waiting.push(resolve)));
    socket.write(Buffer.concat(commands.map(command)));
    return Promise.all(answers);
  }

  close() {
    this.#socket?.destroy();
  }
}
