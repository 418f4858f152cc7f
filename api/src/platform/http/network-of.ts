import { isIPv6 } from 'node:net';

/** The address itself for IPv4, the /64 for IPv6: one subscriber commonly has that many addresses (RFC 6177). */
export function networkOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address);
  if (mapped) return mapped[1]!;
  if (!isIPv6(address)) return address;
  return `${groupsOf(address).slice(0, 4).join(':')}::/64`;
}

/** The eight groups without leading zeros; `::` stands for as many zeros as are missing. */
function groupsOf(address: string): string[] {
  const [head = '', tail] = address.split('%', 1)[0]!.toLowerCase().split('::');
  const left = head === '' ? [] : head.split(':');
  const right = tail === undefined || tail === '' ? [] : tail.split(':');
  const missing = tail === undefined ? 0 : Math.max(0, 8 - left.length - right.length);
  const groups = [...left, ...Array.from({ length: missing }, () => '0'), ...right];
  return groups.map((group) => group.replace(/^0+(?=.)/, ''));
}
