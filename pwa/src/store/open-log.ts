import type { ClubState } from '@harkmoor/sync-model/device/ports';
import type { Role } from '@harkmoor/sync-model/records/member';
import type { ClubCard } from '@harkmoor/sync-model/protocol/messages';
import { v7 as uuidv7 } from 'uuid';
import { accountDatabaseName, GUEST_DATABASE_NAME, HarkmoorDatabase } from './database';
import { createLogWriter, type LogWriter } from './log-writer';
import { thisDeviceId } from './this-device';

/** The person as this phone knows them, offline too. */
export type KnownAccount = { id: string; name: string; email: string; confirmed: boolean };
export type KnownClub = { clubId: string; role: Role; card: ClubCard };

/** The log that the screens read and write: a database, and the club in it that is being looked at. */
export type OpenLog = {
  readonly database: HarkmoorDatabase;
  readonly deviceId: string;
  /** Null for the guest: a log on this phone before there is an account. */
  readonly account: KnownAccount | null;
  readonly myLogId: string;
  readonly clubId: string;
  readonly role: Role;
  readonly card: ClubCard;
  readonly writer: LogWriter;
  /** The same log with account, role and club as the database now tells them. */
  reload(): Promise<OpenLog>;
};

export const SETTING = {
  account: 'account',
  myLogId: 'myLogId',
  clubId: 'clubId',
  clockOffsetMs: 'clockOffsetMs',
} as const;

const GUEST_CARD: ClubCard = { name: 'My log', kind: 'my-log', ituRegion: 1, demo: false };

/** Opens the guest's log, made here and now where there is none. Needs no network. */
export async function openGuestLog(): Promise<OpenLog> {
  const database = new HarkmoorDatabase(GUEST_DATABASE_NAME);
  if (!(await readSetting<string>(database, SETTING.myLogId))) {
    const clubId = uuidv7();
    await database.transaction('rw', [database.clubs, database.settings], async () => {
      await database.clubs.put(newClubState({ clubId, role: 'admin', card: GUEST_CARD }));
      await database.settings.bulkPut([
        { name: SETTING.myLogId, value: clubId },
        { name: SETTING.clubId, value: clubId },
      ]);
    });
  }
  return openFrom(database, null);
}

/**
 * Opens an account's log. `told` is what a sign-in answered; without it the phone opens what it knows, which is
 * null for an account that never signed in here.
 */
export async function openAccountLog(
  accountId: string,
  told?: { account: KnownAccount; clubs: readonly KnownClub[] },
): Promise<OpenLog | null> {
  const database = new HarkmoorDatabase(accountDatabaseName(accountId));
  if (told) await rememberAccount(database, told);
  const account = await readSetting<KnownAccount>(database, SETTING.account);
  if (!account) {
    database.close();
    return null;
  }
  return openFrom(database, account);
}

async function rememberAccount(
  database: HarkmoorDatabase,
  { account, clubs }: { account: KnownAccount; clubs: readonly KnownClub[] },
): Promise<void> {
  const myLog = clubs.find((club) => club.card.kind === 'my-log');
  if (!myLog) throw new Error('a sign-in answer must name the account’s My log');
  await database.transaction('rw', [database.clubs, database.settings], async () => {
    await database.settings.put({ name: SETTING.account, value: account });
    await database.settings.put({ name: SETTING.myLogId, value: myLog.clubId });
    if (!(await database.settings.get(SETTING.clubId))) {
      const shown = clubs.find((club) => club.card.kind === 'club') ?? myLog;
      await database.settings.put({ name: SETTING.clubId, value: shown.clubId });
    }
    for (const club of clubs) {
      const known = await database.clubs.get(club.clubId);
      await database.clubs.put({ ...(known ?? newClubState(club)), role: club.role, card: club.card });
    }
  });
}

export function newClubState(club: KnownClub): ClubState {
  return { ...club, historyId: null, cursor: 0, completeAt: null };
}

async function openFrom(database: HarkmoorDatabase, account: KnownAccount | null): Promise<OpenLog> {
  const shown = { clubId: '' };
  const deviceId = thisDeviceId();
  const writer = createLogWriter({
    database,
    deviceId,
    ownerId: account?.id ?? null,
    clubId: () => shown.clubId,
    deviceNowMs: () => Date.now(),
    clockOffsetMs: await watchClockOffset(database),
  });
  let last: { log: OpenLog; view: string } | undefined;
  const read = async (): Promise<OpenLog> => {
    const view = await readView(database);
    const told = JSON.stringify(view);
    // the same object while nothing has changed, so that screens are not drawn again after each round
    if (last?.view === told) return last.log;
    shown.clubId = view.clubId;
    last = { view: told, log: { ...view, database, deviceId, writer, reload: read } };
    return last.log;
  };
  return read();
}

type View = Pick<OpenLog, 'account' | 'myLogId' | 'clubId' | 'role' | 'card'>;

/** Which club is shown, and as whom: the chosen one, or My log once the chosen one is gone. */
async function readView(database: HarkmoorDatabase): Promise<View> {
  const account = (await readSetting<KnownAccount>(database, SETTING.account)) ?? null;
  const myLogId = await readSetting<string>(database, SETTING.myLogId);
  if (!myLogId) throw new Error('an opened log must know its My log');
  const chosen = (await readSetting<string>(database, SETTING.clubId)) ?? myLogId;
  const club = (await database.clubs.get(chosen)) ?? (await database.clubs.get(myLogId));
  if (!club) throw new Error('an opened log must hold at least My log');
  return { account, myLogId, clubId: club.clubId, role: club.role, card: club.card };
}

/** A round may learn the offset while the log is open; the next stamp must already use it. */
async function watchClockOffset(database: HarkmoorDatabase): Promise<() => number> {
  let offsetMs = (await readSetting<number>(database, SETTING.clockOffsetMs)) ?? 0;
  database.settings.hook('updating', (changes, key) => {
    const { value } = changes as { value?: number };
    if (key === SETTING.clockOffsetMs && value !== undefined) offsetMs = value;
  });
  database.settings.hook('creating', (key, row) => {
    if (key === SETTING.clockOffsetMs) offsetMs = row.value as number;
  });
  return () => offsetMs;
}

export async function readSetting<T>(database: HarkmoorDatabase, name: string): Promise<T | undefined> {
  return (await database.settings.get(name))?.value as T | undefined;
}
