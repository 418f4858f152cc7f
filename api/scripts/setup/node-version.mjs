// Imported first by each script: an old Node.js gets one sentence instead of a syntax error further down.
const [major, minor] = process.versions.node.split('.').map(Number);

if (major < 20 || (major === 20 && minor < 19)) {
  console.error(`Harkmoor needs Node.js 20.19 or newer; this is ${process.version}.`);
  process.exit(1);
}
