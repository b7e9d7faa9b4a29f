import { createServer, type Server } from "node:http";
import { type AddressInfo, connect } from "node:net";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { prepareRequests } from "@/lib/http/incoming-requests";

let server: Server;
beforeAll(async () => {
  prepareRequests();
  prepareRequests();
  server = createServer(({ method, url, headers }, response) => response.end(JSON.stringify({ method, url, peer: headers["x-sillwright-peer"], real: headers["x-sillwright-method"] })));
  await new Promise<void>((listening) => server.listen(0, "127.0.0.1", listening));
});
afterAll(() => void server.close());

/** What the server's own handler sees of a request written by hand. */
const seen = (head: string) =>
  new Promise<Record<string, string>>((resolve, reject) => {
    const socket = connect((server.address() as AddressInfo).port, "127.0.0.1", () => socket.write(`${head}\r\nHost: x\r\nConnection: close\r\n\r\n`));
    let text = "";
    socket.on("data", (chunk) => (text += String(chunk))).on("error", reject);
    socket.on("end", () => resolve(JSON.parse(text.split("\r\n\r\n")[1]!) as Record<string, string>));
  });

describe("before Next sees a request", () => {
  test("the address of the connection stands where no client can put another", async () => {
    expect(await seen("GET / HTTP/1.1\r\nX-Sillwright-Peer: 6.6.6.6\r\nX-Forwarded-For: 6.6.6.6")).toMatchObject({ peer: "127.0.0.1" });
    expect(await seen("GET / HTTP/1.1\r\nX-Sillwright-Peer: 6.6.6.6\r\nX-Sillwright-Peer: 7.7.7.7")).toMatchObject({ peer: "127.0.0.1" });
  });

  test.each(["TRACE", "PROPFIND", "MKCOL", "PURGE"])("%s under /api is a question about methods that keeps its name, and is left alone elsewhere", async (method) => {
    expect(await seen(`${method} /api/v1/squareness HTTP/1.1`)).toMatchObject({ method: "OPTIONS", real: method });
    expect(await seen(`${method} /apiary HTTP/1.1`)).toMatchObject({ method });
  });

  test("nobody can have a plain OPTIONS refused for another", async () => {
    const { method, real } = await seen("OPTIONS /api/v1/squareness HTTP/1.1\r\nX-Sillwright-Method: TRACE");
    expect([method, real]).toEqual(["OPTIONS", undefined]);
  });

  test.each([
    ["/api/v1/%zz?a=%zz", "/api/v1/%25zz?a=%zz"],
    ["/%E0%A4%A", "/%25E0%25A4%25A"],
    ["/es/c/%F1?x", "/es/c/%25F1?x"],
    ["/calculators/corner?legs.0=3%204", "/calculators/corner?legs.0=3%204"],
    ["/a%20b%C3%B1", "/a%20b%C3%B1"],
  ])("%s is asked for as %s", async (sent, url) => {
    expect(await seen(`GET ${sent} HTTP/1.1`)).toMatchObject({ url });
  });
});
