import { isIPv6 } from "node:net";

const MAPPED = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i;

/** The eight groups of an IPv6 address, "::" written out. */
function groupsOf(address: string): string[] {
  const [head = "", tail] = address.split("::");
  const before = head === "" ? [] : head.split(":");
  const after = tail === undefined || tail === "" ? [] : tail.split(":");
  const missing = tail === undefined ? 0 : 8 - before.length - after.length;
  return [...before, ...Array<string>(Math.max(missing, 0)).fill("0"), ...after];
}

/**
 * Where attempts from an address are counted: an IPv4 address by itself, an IPv6 address with its whole /64,
 * which one household or one rented server has to itself (RFC 6177) and can change within at will.
 */
export function networkOf(address: string): string {
  const mapped = MAPPED.exec(address)?.[1];
  if (mapped) return mapped;
  const bare = address.split("%")[0] ?? address;
  if (!isIPv6(bare)) return address;
  const network = groupsOf(bare).slice(0, 4);
  return `${network.map((group) => Number.parseInt(group, 16).toString(16)).join(":")}::/64`;
}
