import fs from 'node:fs';
import path from 'node:path';
import { installDebianPackage } from './debian-package.mjs';

/** The path of a Chromium: CHROMIUM, Debian's, else one on the PATH; null when there is none. */
export function findChromium() {
  const onPath = (process.env.PATH ?? '')
    .split(':')
    .flatMap((dir) => ['chromium', 'chromium-browser'].map((n) => path.join(dir, n)));
  return (
    [process.env.CHROMIUM, '/usr/bin/chromium', ...onPath].find((file) => file && fs.existsSync(file)) ?? null
  );
}

/** Finds Chromium, or installs Debian's package as root. */
export function ensureChromium() {
  const sentence =
    'Chromium is missing, which the browser journeys need: install it (on Debian: apt-get install chromium), or set CHROMIUM to its path.';
  if (findChromium() === null) installDebianPackage('chromium', sentence);
  return findChromium();
}
