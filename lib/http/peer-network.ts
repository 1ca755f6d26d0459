import { isIPv6 } from "node:net";

/**
 * What counts as one connection for rate limits: an IPv4 address, or the first half of an IPv6 address, since a
 * household or rented server has the other half (2^64 addresses) to itself.
 */
export function peerNetwork(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address)?.[1];
  if (mapped) return mapped;
  const plain = address.split("%")[0] ?? address;
  if (!isIPv6(plain)) return address;
  const [head = "", tail = ""] = plain.toLowerCase().split("::");
  const groups = head.split(":").filter(Boolean);
  const after = plain.includes("::") ? tail.split(":").filter(Boolean) : [];
  const full = [
    ...groups,
    ...Array.from({ length: Math.max(0, 8 - groups.length - after.length) }, () => "0"),
    ...after,
  ];
  return `${full
    .slice(0, 4)
    .map((group) => Number.parseInt(group, 16).toString(16))
    .join(":")}::/64`;
}
