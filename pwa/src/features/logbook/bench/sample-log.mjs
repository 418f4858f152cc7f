/*
 * Runs in the page: fills the guest's log with invented receptions in the very shapes that the store keeps
 * (StoredRecord with all fields, null where empty), by bare IndexedDB, which is quicker than a million stamps.
 */
export async function fillLog({ receptionCount, perOuting }) {
  const hex = (value, width) => value.toString(16).padStart(width, '0');
  let made = 0;
  const idAt = (ms) => {
    made += 1;
    const time = hex(ms, 12);
    return `${time.slice(0, 8)}-${time.slice(8)}-7${hex(made & 0xfff, 3)}-8${hex((made >> 12) & 0xfff, 3)}-${hex(made, 12)}`;
  };
  const stampAt = (ms) => `${hex(ms, 12)}0000benchlog`;
  const database = await new Promise((resolve, reject) => {
    const request = indexedDB.open('harkmoor-guest');
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });
  const done = (transaction) =>
    new Promise((resolve, reject) => {
      transaction.oncomplete = resolve;
      transaction.onabort = () => reject(transaction.error);
    });
  const reading = database.transaction('settings');
  const clubId = await new Promise((resolve) => {
    reading.objectStore('settings').get('clubId').onsuccess = (event) => resolve(event.target.result.value);
  });
  const startMs = Date.UTC(2023, 0, 1);
  const record = (type, ms, fields) => ({
    ...{ clubId, type, id: idAt(ms), ownerId: null, seq: 1, at: stampAt(ms) },
    fields: { deleted: false, importId: null, ...fields },
  });
  const FIRST = ['Radio', 'Voice of', 'Tone service', 'Coast', 'Valley', 'Harbour', 'Island', 'Northern'];
  const SECOND = [
    'Lindholt',
    'Estavera',
    'Skovtop',
    'Tessel',
    'Ravnklit',
    'Orre',
    'Morland',
    'Vestmark',
    'Halden',
  ];
  const WORDS =
    'faint clear fading music talk carrier heterodyne news hum splash steady weak gone drifting'.split(' ');
  const word = (at) => WORDS[(at * 7919) % WORDS.length];
  const gear = [];
  const sites = Array.from({ length: 30 }, (_, at) =>
    record('site', startMs, {
      ...{ name: `Bench site ${at}`, place: { locator: 'JO46ac' }, environment: 'rural' },
      ...{ sharedUse: false, notes: null, retiredAt: null },
    }),
  );
  const antennas = Array.from({ length: 8 }, (_, at) =>
    record('antenna', startMs, {
      ...{ name: `Wire ${at}`, kind: 'wire', lengthM: 20, heightM: 4, azimuthDeg: null, gainDb: null },
      ...{ sharedUse: false, replaces: null, notes: null, retiredAt: null },
    }),
  );
  const setups = antennas.map(({ id }) =>
    record('setup', startMs, {
      ...{ receiverId: id, antennaId: id, coupling: null, attenuationDb: 0, preampDb: 0, retiredAt: null },
    }),
  );
  const targets = Array.from({ length: 200 }, (_, at) =>
    record('target', startMs, {
      ...{
        listId: antennas[0].id,
        name: `${FIRST[at % 8]} ${SECOND[at % 9]} ${at}`,
        frequencyHz: 5_900_000 + at * 5000,
      },
      ...{
        mode: 'AM',
        schedule: 'always',
        silences: [],
        tx: null,
        powerKw: null,
        language: null,
        note: null,
      },
    }),
  );
  gear.push(...sites, ...antennas, ...setups, ...targets);
  const kinds = ['site', 'antenna', 'setup', 'target', 'outing', 'reception'];
  let transaction = database.transaction(kinds, 'readwrite', { durability: 'relaxed' });
  for (const one of gear) transaction.objectStore(one.type).put(one);
  let outing;
  for (let at = 0; at < receptionCount; at += 1) {
    const outingNo = Math.floor(at / perOuting);
    const atMs = startMs + outingNo * 14 * 3_600_000 + (at % perOuting) * 150_000;
    const setupId = setups[at % 8].id;
    if (at % perOuting === 0) {
      const siteId = sites[outingNo % 30].id;
      outing = record('outing', atMs, {
        ...{
          siteId,
          startedAt: atMs,
          ended: { at: atMs + 3_600_000, by: 'hand' },
          targetListId: null,
          eventId: null,
        },
        ...{ setupIds: [setupId], currentSetupId: setupId, clockSteps: [], notes: null },
      });
      transaction.objectStore('outing').put(outing);
    }
    const target = targets[(at * 31) % 200];
    const isHeard = at % 3 !== 0;
    transaction.objectStore('reception').put(
      record('reception', atMs, {
        ...{ outingId: outing.id, siteId: outing.fields.siteId, setupId, targetId: target.id },
        ...{ targetHz: target.fields.frequencyHz, eventId: null, swap: null, roundNo: 1 },
        ...{ outcome: isHeard ? 'heard' : 'nil', basis: 'round', identity: 'sure', nilReason: null },
        ...{ deviceAt: atMs, durationS: 20, tuning: { dialHz: target.fields.frequencyHz, mode: 'AM' } },
        ...{
          bandwidthHz: null,
          attenuationDb: null,
          rst: null,
          meter: { s: 7, overDb: 0 },
          noiseMeter: null,
        },
        sinpo: isHeard ? { s: 4, i: 4, n: 3, p: 3, o: 3 } : null,
        ...{ carried: null, programme: null, stationName: null, heardBy: null },
        remarks: at % 3 === 1 ? `${word(at)} ${word(at + 1)} ${word(at + 5)} entry ${at}` : null,
      }),
    );
    if (at % 5000 === 4999) {
      await done(transaction);
      transaction = database.transaction(kinds, 'readwrite', { durability: 'relaxed' });
    }
  }
  await done(transaction);
  database.close();
}
