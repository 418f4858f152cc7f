/**
 * The token of a mail's link. It stands behind the `#`, which browsers send to no server, so it is in no log on
 * the way.
 */
export function linkToken(hash: string): string | null {
  return new URLSearchParams(hash.replace(/^#/, '')).get('token');
}
