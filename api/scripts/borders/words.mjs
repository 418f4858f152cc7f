import { createHash } from 'node:crypto';

// assembled, because this file too must not name such an address
const HOSTS = [
  ['npm', 'js', '.', '(org|com)'],
  ['yarn', 'pkg', '.com'],
  ['npm', 'mirror', '.com'],
  ['pypi', '.org'],
  ['deb', '.debian', '.org'],
  ['security', '.debian', '.org'],
  ['docker', '.io'],
  ['proxy', '.golang', '.org'],
  ['crates', '.io'],
].map((parts) => parts.join('').replaceAll('.', '\\.'));
const REGISTRY = new RegExp(
  `\\b(${HOSTS.join('|')})\\b|https?://[^/\\s"']*\\b(registry|artifactory|nexus)\\b`,
  'i',
);
const RESOLVED = /"resolved": ?"https?:/;

/** Words that have no place in the project, as the first 12 hex digits of their SHA-256, so that a search finds none here. */
const FINGERPRINTS = new Set([
  ...['0004355934c9', '053ea4804ef1', '1dc5212d528c', '2396eb63c978', '26ef49b150ee', '3205003e2755'],
  ...['3ea125d0bff3', '487b91042c7c', '48a6baa7890b', '49dfe46afa34', '517ae5bdfe1d', '57de4cf40144'],
  ...['5c9c4ad64963', '602e181755e7', '60965168ce76', '7d3194f79e64', '925f684ddc25', '94a168d2da57'],
  ...['b301b870578c', 'bccb8ebe06c4', 'c53113a56fc7', 'c70eca6b0f88', 'c857d09db23e', 'd298391b0743'],
  ...['d59c91c18df3', 'de2187af3fb0', 'eaa5a4778676', 'ed7588280dde'],
]);
const FOREIGN_PLACE = new RegExp(['(^|[^\\w.])/wo', 'rk/\\w'].join(''));

export const noRegistryHost = {
  why: 'no file names the host of a package registry: each machine has its own',
  breaches(files) {
    return lines(files, (line) => REGISTRY.exec(line)?.[0] ?? RESOLVED.exec(line)?.[0]);
  },
};

export const ownWords = {
  why: 'the project speaks of itself alone, in words of its own',
  breaches(files) {
    const isBanned = rememberEach((word) => FINGERPRINTS.has(fingerprintOf(word)));
    const own = files.filter(({ path }) => path !== 'package-lock.json');
    return lines(own, (line) => {
      const word = line
        .toLowerCase()
        .match(/[a-z0-9]+/g)
        ?.find(isBanned);
      return word ?? FOREIGN_PLACE.exec(line)?.[0];
    });
  },
};

export function fingerprintOf(word) {
  return createHash('sha256').update(word).digest('hex').slice(0, 12);
}

function lines(files, find) {
  return files.flatMap(({ path, text }) =>
    text.split('\n').flatMap((line, index) => {
      const hit = find(line);
      return hit ? [`${path}:${index + 1} has ${hit.trim()}`] : [];
    }),
  );
}

function rememberEach(decide) {
  const known = new Map();
  return (word) => {
    if (!known.has(word)) known.set(word, decide(word));
    return known.get(word);
  };
}
