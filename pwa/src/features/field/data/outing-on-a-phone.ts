import { openGuestLog, type OpenLog } from '../../../store/open-log';
import { padAddress } from '../pad-address';
import { padForFrequency } from '../pad-paths';
import { logTap } from './entry-writer';
import { readPadStart } from './pad-start';
import { quickStart, type QuickStart } from './quick-start';
import { readOwnOutings, type StoredOuting } from './running-outing';

const QUICK: QuickStart = {
  siteName: 'Ravnklit dune',
  environment: 'rural',
  place: { kind: 'locator', locator: 'JO46ac', atMs: Date.UTC(2026, 10, 12) },
  receiverName: 'My receiver',
  antennaName: 'Whip',
  antennaKind: 'whip',
  setupId: null,
};

/** For tests: an emptied guest log over a real database, in which a first outing has just been started. */
export async function outingOnAPhone() {
  const log = await openGuestLog();
  const kept = ['clubs', 'settings'];
  const emptied = log.database.tables.filter(({ name }) => !kept.includes(name));
  await Promise.all(emptied.map((table) => table.clear()));
  await quickStart(log, QUICK, Date.now());
  const running = async (): Promise<StoredOuting> => {
    const outings = await readOwnOutings(log, Date.now());
    if (!outings.running) throw new Error('no outing runs');
    return outings.running;
  };
  return { log, outing: await running(), running };
}

/** The pad as its page opens it; an address that leads nowhere fails the test. */
export async function openPad(log: OpenLog, path: string) {
  const start = await readPadStart(log, padAddress(new URL(path, 'http://phone').search));
  if (start.kind !== 'ready') throw new Error(`the pad is ${start.kind}`);
  return start;
}

export function plannedPad(log: OpenLog, atMs = Date.now(), draft = log.writer.newId()): string {
  return padForFrequency({ dialHz: 6_070_000, mode: 'AM', means: 'planned', targetId: null }, atMs, draft);
}

/** One tap on *Nil* for a planned 5 000 kHz; returns the id of the entry. */
export async function nilIn(log: OpenLog, outing: StoredOuting): Promise<string> {
  const subject = { kind: 'frequency', dialHz: 5_000_000, mode: 'AM', basis: 'planned' } as const;
  const tap = { outcome: 'nil', subject, outingId: outing.id, outing: outing.fields } as const;
  return logTap(log, { ...tap, deviceAtMs: Date.now() });
}
