import { locatorOf } from '@harkmoor/sync-model/radio/locator/locator';
import { DEMO_ANTENNAS, DEMO_RECEIVERS } from './demo-gear.js';
import { DEMO_PEOPLE, type DemoPerson } from './demo-people.js';
import { DEMO_PLACES, type DemoPlace } from './demo-places.js';
import { DEMO_TARGETS } from './demo-targets.js';
import type { DemoWriter } from './demo-writer.js';

/** What the outings stand on: ids of sites, setups, the list and its targets, in the order of the demo's tables. */
export type DemoGround = {
  readonly siteIds: readonly string[];
  readonly setupId: (person: DemoPerson, antenna: number) => string;
  readonly listId: string;
  readonly targetIds: readonly string[];
};

const FOUNDED_AT = Date.UTC(2026, 6, 20, 10);

export function addDemoGround(writer: DemoWriter): DemoGround {
  const [founder] = DEMO_PEOPLE;
  if (!founder) throw new Error('the demo needs people');
  const siteIds = DEMO_PLACES.map((place, i) => addSite(writer, DEMO_PEOPLE[i % DEMO_PEOPLE.length]!, place));
  const receiverIds = DEMO_RECEIVERS.map(({ hasMeter: _, ...receiver }) =>
    writer.add(founder, 'receiver', FOUNDED_AT, {
      ...receiver,
      bandwidthsHz: [2700, 6000],
      batteryMah: null,
      dialStepHz: 100,
      sharedUse: true,
      replaces: null,
      notes: null,
      retiredAt: null,
    }),
  );
  const antennaIds = DEMO_ANTENNAS.map(({ name, kind, lengthM, heightM }) =>
    writer.add(founder, 'antenna', FOUNDED_AT, {
      name,
      kind,
      lengthM,
      heightM,
      azimuthDeg: null,
      gainDb: null,
      sharedUse: true,
      replaces: null,
      notes: null,
      retiredAt: null,
    }),
  );
  const setups = addSetups(writer, receiverIds, antennaIds);
  const list = addTargets(writer, founder);
  return { siteIds, setupId: (person, antenna) => setups.get(`${person.key}/${antenna}`)!, ...list };
}

function addSite(writer: DemoWriter, owner: DemoPerson, place: DemoPlace): string {
  const isCoarse = place.home === true || place.environment === 'city' || place.environment === 'residential';
  const position = { latDeg: place.latDeg, lonDeg: place.lonDeg };
  const id = writer.add(owner, 'site', FOUNDED_AT, {
    name: place.name,
    place: { locator: locatorOf(position, isCoarse ? 4 : 6) },
    environment: place.environment,
    sharedUse: true,
    notes: null,
    retiredAt: null,
  });
  const fix = { ...position, accuracyM: 8, source: 'averaged' as const, fixedAt: FOUNDED_AT, averagedS: 30 };
  const fields = { fix, elevationM: null, home: place.home === true };
  writer.add(owner, 'site-fix', FOUNDED_AT, fields, { log: 'my-log', id });
  return id;
}

function addSetups(
  writer: DemoWriter,
  receiverIds: readonly string[],
  antennaIds: readonly string[],
): Map<string, string> {
  const setups = new Map<string, string>();
  for (const person of DEMO_PEOPLE) {
    for (const antenna of person.antennas) {
      const id = writer.add(person, 'setup', FOUNDED_AT, {
        receiverId: receiverIds[person.receiver]!,
        antennaId: antennaIds[antenna]!,
        coupling: null,
        attenuationDb: 0,
        preampDb: 0,
        retiredAt: null,
      });
      setups.set(`${person.key}/${antenna}`, id);
    }
  }
  return setups;
}

function addTargets(writer: DemoWriter, founder: DemoPerson): Pick<DemoGround, 'listId' | 'targetIds'> {
  const listId = writer.add(founder, 'target-list', FOUNDED_AT, {
    name: 'Evening list',
    edition: 'Autumn 2026',
    validFrom: null,
    validTo: null,
    publishedAt: FOUNDED_AT,
  });
  const targetIds = DEMO_TARGETS.map(({ name, frequencyHz, mode, schedule, tx, powerKw, language }) =>
    writer.add(founder, 'target', FOUNDED_AT, {
      listId,
      name,
      frequencyHz,
      mode,
      schedule,
      silences: [],
      tx,
      powerKw,
      language,
      note: null,
    }),
  );
  return { listId, targetIds };
}
