import "server-only";
import { isIPv4, isIPv6 } from "node:net";

/**
 * Who asks, as far as an address can say. `forwarded` is X-Forwarded-For, `peer` the other end of the connection, `proxies` how
 * many in front of us are believed: each appended the address it saw, so that many entries from the right are true and
 * what stands left of them is whatever the client liked to send.
 */
export function clientAddress({ forwarded, peer, proxies }: { forwarded: string | null; peer: string; proxies: number }): string {
  let nearest = normalAddress(peer) ?? "unknown";
  if (proxies === 0 || forwarded === null) return nearest;
  const hops = forwarded.split(",").slice(-proxies).reverse();
  for (const hop of hops) {
    const address = normalAddress(hop);
    if (address === null) return nearest; // a proxy that hides whom it speaks for stands for all of them
    nearest = address;
  }
  return nearest;
}

/** An IPv4 address as it is, IPv4 in IPv6 as IPv4, any other IPv6 by its /64: the least that one line is given. */
export function normalAddress(text: string): string | null {
  const bare = withoutPort(text.trim());
  if (isIPv4(bare)) return bare;
  const address = bare.split("%", 1)[0] ?? "";
  if (!isIPv6(address)) return null;
  const groups = groupsOf(address);
  const isMapped = groups.slice(0, 5).every((group) => group === 0) && groups[5] === 0xffff;
  if (isMapped) return [groups[6]! >> 8, groups[6]! & 255, groups[7]! >> 8, groups[7]! & 255].join(".");
  return `${groups.slice(0, 4).map((group) => group.toString(16)).join(":")}::/64`;
}

function withoutPort(text: string): string {
  if (text.startsWith("[")) return text.slice(1, text.includes("]") ? text.indexOf("]") : undefined);
  return /^\d+(\.\d+){3}:\d+$/.test(text) ? text.slice(0, text.indexOf(":")) : text;
}

/** The eight groups of a valid IPv6 address. */
function groupsOf(address: string): number[] {
  const plain = address.replace(/(\d+)\.(\d+)\.(\d+)\.(\d+)$/, (_, a, b, c, d) => `${((Number(a) << 8) | Number(b)).toString(16)}:${((Number(c) << 8) | Number(d)).toString(16)}`);
  const [head = "", tail] = plain.split("::");
  const left = head === "" ? [] : head.split(":");
  const right = tail === undefined || tail === "" ? [] : tail.split(":");
  const zeros = tail === undefined ? [] : Array<string>(8 - left.length - right.length).fill("0");
  return [...left, ...zeros, ...right].map((group) => parseInt(group, 16));
}
