/** Where the stack of this run answers; the runner tells it. */
export const APP = told('JOURNEY_APP');
export const MAIL = told('JOURNEY_MAIL');

function told(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing: start the journeys with "node pwa/e2e/run.mjs"`);
  return value;
}
