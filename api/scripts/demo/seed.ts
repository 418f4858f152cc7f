import 'reflect-metadata';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { MikroORM, PostgreSqlDriver } from '@mikro-orm/postgresql';
import { Club } from '../../src/clubs/club.entity.js';
import { loadConfiguration } from '../../src/platform/configuration/configuration.js';
import { DEMO_CLUB_NAME, DEMO_PASSWORD, DEMO_PEOPLE } from './demo-people.js';

const TRUTH_FILE = 'demo-truth.json';
const SIGN_INS_FILE = 'demo-sign-ins.json';

/** Makes the demo club where there is none; finishes one that was cut off; leaves a whole one alone. */
async function seed(): Promise<void> {
  const { databaseUrl } = loadConfiguration(process.env);
  const dataFolder = process.env.HARKMOOR_DATA;
  if (!dataFolder) throw new Error('HARKMOOR_DATA must name the data folder');
  const stored = await storedSeq(databaseUrl);
  const whole = wholeSeq(dataFolder);
  if (whole !== null && stored >= whole) return;
  // the generator and the server's modules are only loaded where there is something to do: a start takes seconds
  const { fillDemoClub } = await import('./fill-demo-club.js');
  const { demoTruth } = await import('./demo-truth.js');
  const signIns = DEMO_PEOPLE.slice(0, 3).map(({ role, email, name }) => ({
    role,
    email,
    name,
    password: DEMO_PASSWORD,
  }));
  const filledSeq = await fillDemoClub();
  writeFileSync(path.join(dataFolder, SIGN_INS_FILE), JSON.stringify(signIns, null, 1));
  writeFileSync(path.join(dataFolder, TRUTH_FILE), JSON.stringify({ filledSeq, ...demoTruth() }, null, 1));
}

/** The feed position of a demo that was made whole from this data folder; null before. */
function wholeSeq(dataFolder: string): number | null {
  const file = path.join(dataFolder, TRUTH_FILE);
  if (!existsSync(file)) return null;
  const { filledSeq } = JSON.parse(readFileSync(file, 'utf8')) as { filledSeq?: number };
  return filledSeq ?? null;
}

/** How far the demo club's feed is; 0 where there is no demo club. */
async function storedSeq(databaseUrl: string): Promise<number> {
  const orm = await MikroORM.init({ driver: PostgreSqlDriver, clientUrl: databaseUrl, entities: [Club] });
  try {
    return (await orm.em.fork().findOne(Club, { name: DEMO_CLUB_NAME, demo: true }))?.seq ?? 0;
  } finally {
    await orm.close();
  }
}

await seed();
