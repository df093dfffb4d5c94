import { isIP, isIPv6 } from 'node:net';

/**
 * What counts as one place in the net: an IPv4 address, or the /64 that an IPv6 address is in, since one household or one
 * rented server has all of it (RFC 6177, RFC 4291 section 2.5.4).
 *
 * @param address - as Node tells it; anything else counts as one place, whoever sends it
 */
export function networkOf(address: string): string {
  if (!isIP(address)) return 'unknown';
  if (!isIPv6(address)) return address;
  const groups = groupsOf(address.split('%')[0] ?? '');
  const isMapped = groups.slice(0, 5).every((group) => group === 0) && groups[5] === 0xffff;
  if (isMapped) return groups.slice(6).flatMap(bytesOf).join('.');
  const network = groups.slice(0, 4).map((group) => group.toString(16));
  return `${network.join(':')}::/64`;
}

const bytesOf = (group: number) => [group >> 8, group & 0xff];

/** The eight groups. `URL` writes every spelling of an address in the same short one (RFC 5952). */
function groupsOf(address: string): number[] {
  const short = new URL(`http://[${address}]/`).hostname.slice(1, -1);
  const [before = [], after = []] = short.split('::').map((part) => part.split(':').filter(Boolean));
  const zeros = Array.from({ length: 8 - before.length - after.length }, () => '0');
  return [...before, ...zeros, ...after].map((group) => parseInt(group, 16));
}
