import fs from 'node:fs';
import { spawnSync } from 'node:child_process';
import { PlainFailure } from './plain-failure.mjs';

/** Installs Debian's package as root; otherwise fails with the one sentence that says what to do. */
export function installDebianPackage(packageName, sentence) {
  if (process.getuid?.() !== 0 || !fs.existsSync('/usr/bin/apt-get')) throw new PlainFailure(sentence);
  console.log(`Installing Debian's package ${packageName} (apt-get) …`);
  aptGet(['update', '-qq']);
  aptGet(['install', '-qq', '-y', '--no-install-recommends', packageName]);
}

function aptGet(args) {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const { status, error, stdout } = spawnSync('apt-get', args, {
    env,
    encoding: 'utf8',
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  if (error || status !== 0)
    throw new PlainFailure(
      `apt-get ${args.join(' ')} failed (${error?.message ?? status}).\n${stdout ?? ''}`,
    );
}
