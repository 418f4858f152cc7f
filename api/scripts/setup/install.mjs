import fs from 'node:fs';
import path from 'node:path';

/** Runs `npm ci` when what is installed is not what package-lock.json says. `run` starts a command and resolves at its end. */
export async function installPackages(root, run) {
  if (isInstalled(root)) return;
  console.log('Installing packages (npm ci) …');
  const npmCli = process.env.npm_execpath?.endsWith('npm-cli.js')
    ? [process.execPath, process.env.npm_execpath]
    : ['npm'];
  // --include=dev: with NODE_ENV=production in the environment, npm would leave the build's tools out
  await run([...npmCli, 'ci', '--include=dev', '--no-audit', '--no-fund'], 'npm ci');
}

/** Whether each package of the lock is installed in its version, read from the list that npm keeps in node_modules. */
export function isInstalled(root) {
  const listPath = path.join(root, 'node_modules/.package-lock.json');
  if (!fs.existsSync(listPath)) return false;
  const wanted = JSON.parse(fs.readFileSync(path.join(root, 'package-lock.json'), 'utf8')).packages;
  const installed = JSON.parse(fs.readFileSync(listPath, 'utf8')).packages;
  return Object.entries(wanted).every(([place, entry]) => {
    if (!place.includes('node_modules/') || entry.optional || entry.devOptional) return true;
    return installed[place]?.version === entry.version && installed[place]?.link === entry.link;
  });
}
