import { describe, expect, test } from "vitest";
import { clientAddress, normalAddress } from "@/lib/http/client-address";

describe("an address, for counting by it", () => {
  // The IPv6 spellings are those of RFC 4291, section 2.2, and RFC 5952.
  test.each([
    ["192.0.2.7", "192.0.2.7"],
    [" 192.0.2.7 ", "192.0.2.7"],
    ["192.0.2.7:4711", "192.0.2.7"],
    ["::ffff:192.0.2.7", "192.0.2.7"],
    ["::FFFF:c000:207", "192.0.2.7"],
    ["2001:db8:1:2:3:4:5:6", "2001:db8:1:2::/64"],
    ["2001:db8:1:2:ffff::1", "2001:db8:1:2::/64"],
    ["2001:0DB8:0001:0002::", "2001:db8:1:2::/64"],
    ["[2001:db8:1:2::9]:443", "2001:db8:1:2::/64"],
    ["fe80::1%eth0", "fe80:0:0:0::/64"],
    ["::1", "0:0:0:0::/64"],
    ["64:ff9b::192.0.2.33", "64:ff9b:0:0::/64"],
  ])("%s is %s", (text, normal) => {
    expect(normalAddress(text)).toBe(normal);
  });

  test.each(["", "unknown", "_hidden", "999.1.1.1", "1.2.3", "2001:db8", "192.0.2.7, 1.1.1.1", "localhost"])("%j is none", (text) => {
    expect(normalAddress(text)).toBeNull();
  });
});

describe("who asks", () => {
  const peer = "198.51.100.1";
  test("without a proxy is the other end of the connection, whatever the header says", () => {
    expect(clientAddress({ forwarded: "192.0.2.7", peer, proxies: 0 })).toBe(peer);
    expect(clientAddress({ forwarded: null, peer, proxies: 0 })).toBe(peer);
  });

  test("behind one proxy is the last entry, and nothing the client put before it", () => {
    expect(clientAddress({ forwarded: "1.1.1.1, 2.2.2.2, 192.0.2.7", peer, proxies: 1 })).toBe("192.0.2.7");
    expect(clientAddress({ forwarded: "192.0.2.7", peer, proxies: 1 })).toBe("192.0.2.7");
    expect(clientAddress({ forwarded: null, peer, proxies: 1 })).toBe(peer);
  });

  test("behind two is the last but one", () => {
    expect(clientAddress({ forwarded: "6.6.6.6, 192.0.2.7, 10.0.0.2", peer, proxies: 2 })).toBe("192.0.2.7");
  });

  test("that came past the first proxy is the one the second saw", () => {
    expect(clientAddress({ forwarded: "192.0.2.7", peer, proxies: 2 })).toBe("192.0.2.7");
  });

  test("that a proxy hides is the proxy", () => {
    expect(clientAddress({ forwarded: "6.6.6.6, unknown", peer, proxies: 1 })).toBe(peer);
    expect(clientAddress({ forwarded: "unknown, 10.0.0.2", peer, proxies: 2 })).toBe("10.0.0.2");
  });

  test("with no address at all is one stranger for all", () => {
    expect(clientAddress({ forwarded: null, peer: "", proxies: 0 })).toBe("unknown");
  });
});
