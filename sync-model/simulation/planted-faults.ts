import type { DevicePorts, LinkAnswer, StoreTransaction } from '../src/device/ports.js';
import type { StoredRecord } from '../src/device/stored-record.js';
import type { HubSnapshot, HubStore, HubWrite } from '../src/hub/ports.js';
import type { ChangeResult, SyncRequest } from '../src/protocol/messages.js';
import { keyOf } from './disk.js';
import type { MemoryHub } from './memory-hub.js';

/**
 * A fault planted by hand between the real code and its ports: what the code would do if it were written
 * wrong. The simulation must find each; one that it does not find is a hole in the simulation.
 */
export type PlantedFault = {
  readonly name: string;
  readonly wrapPorts?: (ports: DevicePorts) => DevicePorts;
  readonly wrapHub?: (hub: MemoryHub) => HubStore;
};

export const PLANTED_FAULTS: readonly PlantedFault[] = [
  { name: 'the cursor is stored before the page', wrapPorts: withCursorFirst },
  { name: 'a debt is cleared when it is sent', wrapPorts: withDebtClearedWhenSent },
  { name: 'a debt is cleared though the field was edited meanwhile', wrapPorts: withDebtClearedAnyhow },
  {
    name: 'a lost value is dropped',
    wrapPorts: onPut(({ debt, ...record }) =>
      debt ? { ...record, debt: { ...debt, lost: undefined } } : record,
    ),
  },
  {
    name: 'a refused record is forgotten',
    wrapPorts: onPut(({ debt, ...record }) =>
      debt && debt.status !== 'refused' ? { ...record, debt } : record,
    ),
  },
  { name: 'a record is written back as it was read before', wrapPorts: withStaleReads },
  { name: 'silence is taken for success', wrapPorts: withSilenceAsSuccess },
  { name: 'the cursor is not kept', wrapPorts: withoutCursor },
  {
    name: 'writes do not lock the club',
    wrapHub: onWrite((tx, hub, clubId) => ({ ...tx, lockClub: async () => hub.clubs.get(clubId)! })),
  },
  {
    name: 'the history is not written',
    wrapHub: onWrite((tx) => ({
      ...tx,
      save: (records, rows, seq) =>
        tx.save(
          records,
          rows.filter(({ clash }) => clash),
          seq,
        ),
    })),
  },
  {
    name: 'a repeat is taken for news',
    wrapHub: onWrite((tx) => ({ ...tx, replacedBefore: async () => [] })),
  },
  {
    name: 'the club keeps its old seq',
    wrapHub: onWrite((tx) => ({ ...tx, save: (records, rows, seq) => tx.save(records, rows, seq - 1) })),
  },
  {
    name: 'nothing is known to be referred to',
    wrapHub: onWrite((tx) => ({ ...tx, referredTo: async () => [] })),
  },
  {
    name: 'deletions are left out of the feed',
    wrapHub: onRead((snapshot) => ({
      ...snapshot,
      page: async (...asked) =>
        (await snapshot.page(...asked)).filter(({ fields }) => fields.deleted !== true),
    })),
  },
  { name: 'the head is newer than the page', wrapHub: withNewerHead },
];

/** Passes every record that the engine stores through `change`. */
function onPut(change: (record: StoredRecord) => StoredRecord) {
  return (ports: DevicePorts): DevicePorts =>
    onTransaction(ports, (tx) => ({ ...tx, putRecords: (records) => tx.putRecords(records.map(change)) }));
}

function onTransaction(ports: DevicePorts, wrap: (tx: StoreTransaction) => StoreTransaction): DevicePorts {
  return { ...ports, store: { transaction: (work) => ports.store.transaction((tx) => work(wrap(tx))) } };
}

function onWrite(wrap: (tx: HubWrite, hub: MemoryHub, clubId: string) => HubWrite) {
  return (hub: MemoryHub): HubStore => ({
    read: (work) => hub.read(work),
    write: (clubId, work) => hub.write(clubId, (tx) => work(wrap(tx, hub, clubId))),
  });
}

function onRead(wrap: (snapshot: HubSnapshot) => HubSnapshot) {
  return (hub: MemoryHub): HubStore => ({
    read: (work) => hub.read((snapshot) => work(wrap(snapshot))),
    write: (clubId, work) => hub.write(clubId, work),
  });
}

function withCursorFirst(ports: DevicePorts): DevicePorts {
  const transaction: DevicePorts['store']['transaction'] = async (work) => {
    const late: StoredRecord[] = [];
    const result = await ports.store.transaction((tx) =>
      work({
        ...tx,
        putRecords: async (records) => {
          late.push(...records);
        },
      }),
    );
    if (late.length > 0) await ports.store.transaction((tx) => tx.putRecords(late));
    return result;
  };
  return { ...ports, store: { transaction } };
}

function withDebtClearedWhenSent(ports: DevicePorts): DevicePorts {
  const exchange = async (request: SyncRequest) => {
    await ports.store.transaction(async (tx) => {
      const keys = request.clubs.flatMap(({ clubId, changes }) =>
        (changes ?? []).map(({ type, id }) => ({ clubId, type, id })),
      );
      const records = (await tx.records(keys)).filter((record) => record !== undefined);
      await tx.putRecords(records.map(({ debt: _debt, ...record }) => record));
    });
    return ports.link.exchange(request);
  };
  return { ...ports, link: { exchange } };
}

function withDebtClearedAnyhow(ports: DevicePorts): DevicePorts {
  const applied = new Set<string>();
  const exchange = async (request: SyncRequest) => {
    const answer = await ports.link.exchange(request);
    applied.clear();
    if (answer.kind !== 'answer') return answer;
    for (const { clubId, results } of answer.body.clubs) {
      for (const result of results)
        if (result.status === 'applied') applied.add(keyOf({ clubId, ...result }));
    }
    return answer;
  };
  const clear = onPut(({ debt, ...record }) =>
    debt && !applied.has(keyOf(record)) ? { ...record, debt } : record,
  );
  return { ...clear(ports), link: { exchange } };
}

function withStaleReads(ports: DevicePorts): DevicePorts {
  const seen = new Map<string, StoredRecord>();
  return onTransaction(ports, (tx) => ({
    ...tx,
    owed: async (clubId) => {
      const records = await tx.owed(clubId);
      for (const record of records) seen.set(keyOf(record), record);
      return records;
    },
    records: async (keys) => {
      const records = await tx.records(keys);
      return records.map((record, index) => seen.get(keyOf(keys[index]!)) ?? record);
    },
  }));
}

function withSilenceAsSuccess(ports: DevicePorts): DevicePorts {
  const cards = new Map<string, Extract<LinkAnswer, { kind: 'answer' }>['body']['clubs'][number]>();
  const exchange = async (request: SyncRequest): Promise<LinkAnswer> => {
    const answer = await ports.link.exchange(request);
    if (answer.kind === 'answer') for (const club of answer.body.clubs) cards.set(club.clubId, club);
    if (answer.kind !== 'unreachable') return answer;
    const clubs = request.clubs.flatMap(({ clubId, cursor, changes = [] }) => {
      const results = changes.map(({ type, id }): ChangeResult => ({ type, id, status: 'applied', seq: 1 }));
      const card = cards.get(clubId);
      return card ? [{ ...card, results, records: [], cursor, more: false }] : [];
    });
    const { protocol, sentAt: serverTime } = request;
    return { kind: 'answer', body: { protocol, serverTime, clubs, goneClubs: [] } };
  };
  return { ...ports, link: { exchange } };
}

function withoutCursor(ports: DevicePorts): DevicePorts {
  return onTransaction(ports, (tx) => ({ ...tx, putClub: (club) => tx.putClub({ ...club, cursor: 0 }) }));
}

function withNewerHead(hub: MemoryHub): HubStore {
  return onRead((snapshot) => ({
    ...snapshot,
    memberships: async (accountId) =>
      (await snapshot.memberships(accountId)).map((one) => ({ ...one, club: hub.clubs.get(one.clubId)! })),
  }))(hub);
}
