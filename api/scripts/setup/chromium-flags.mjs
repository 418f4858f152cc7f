/** For a Chromium that is driven by scripts: it also runs as root in a container, and fetches nothing of its own. */
export const CHROMIUM_FLAGS = [
  ...['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run'],
  ...['--disable-background-networking', '--disable-component-update', '--disable-sync'],
];
