/** A short fingerprint of texts by name, whatever their order: cyrb53, 53 bits. It guards against slips, not against people. */
export function hashOf(texts: Readonly<Record<string, string>>, more = ""): string {
  const text = JSON.stringify([Object.entries(texts).filter(([, value]) => value !== "").sort(([a], [b]) => (a < b ? -1 : 1)), more]);
  let high = 0xdeadbeef;
  let low = 0x41c6ce57;
  for (let index = 0; index < text.length; index += 1) {
    const code = text.charCodeAt(index);
    high = Math.imul(high ^ code, 2_654_435_761);
    low = Math.imul(low ^ code, 1_597_334_677);
  }
  high = Math.imul(high ^ (high >>> 16), 2_246_822_507) ^ Math.imul(low ^ (low >>> 13), 3_266_489_909);
  low = Math.imul(low ^ (low >>> 16), 2_246_822_507) ^ Math.imul(high ^ (high >>> 13), 3_266_489_909);
  return (4_294_967_296 * (2_097_151 & low) + (high >>> 0)).toString(36);
}
