export default async function globalTeardown() {
  await globalThis.harkmoorTestPostgres?.stop();
}
