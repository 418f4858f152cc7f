import { beforeEach, describe, expect, it } from 'vitest';
import { ANNA, ANNAS_LOG, BO, CLUB } from '../../simulation/people.js';
import { makeReception, QuietWorld, type QuietPhone } from '../../simulation/quiet-world.js';
import { SAMPLES } from '../../simulation/sample-fields.js';
import type { SyncAnswer } from '../protocol/messages.js';
import type { LinkAnswer } from './ports.js';
import { sendStateOf } from './stored-record.js';

let world: QuietWorld;
let phone: QuietPhone;
beforeEach(async () => {
  world = new QuietWorld();
  phone = world.phone('phonea01', ANNA);
  await phone.syncAll();
});

const hubFields = (type: string, id: string) =>
  world.hub.clubs.get(CLUB)!.records.get(`${type}/${id}`)?.fields;
const stateOf = (id: string) => sendStateOf(phone.record(CLUB, 'site', id), false);

describe('the first rounds of a phone', () => {
  it('should learn of its clubs', () => {
    expect([...phone.disk.state.clubs.keys()].sort()).toEqual([CLUB, ANNAS_LOG].sort());
    expect(phone.disk.state.clubs.get(CLUB)).toMatchObject({ role: 'organizer', completeAt: world.nowMs });
  });

  it('should send parents first, whatever the order in which they were made', async () => {
    await makeReception(phone);
    expect(await phone.syncAll()).toBe(1);
    const types = world.requests
      .at(-1)!
      .clubs.flatMap(({ changes }) => (changes ?? []).map(({ type }) => type));
    expect(types).toEqual(['site', 'receiver', 'antenna', 'setup', 'reception']);
    expect(phone.records('reception')[0]).toMatchObject({ seq: 5 });
    expect(phone.records('reception')[0]).not.toHaveProperty('debt');
  });

  it('should bring the records to a phone of another member', async () => {
    await makeReception(phone);
    await phone.syncAll();
    const other = world.phone('phoneb01', BO);
    await other.syncAll();
    const strip = (one: QuietPhone) =>
      one.records('reception').map((record) => JSON.stringify(record.fields));
    expect(strip(other)).toEqual(strip(phone));
  });

  it('should send more than a round holds in several, and say so until all is sent', async () => {
    world = new QuietWorld({ changesPerRound: 2, changesPerTransaction: 2, recordsPerPage: 2 });
    phone = world.phone('phonea01', ANNA);
    await phone.syncAll();
    await makeReception(phone);
    const first = await phone.engine.runRound();
    expect(first).toEqual({ kind: 'done', more: true, complete: false });
    expect(await phone.syncAll()).toBe(2);
    expect(phone.records('reception')[0]?.seq).toBe(5);
  });
});

describe('a round that does not come through', () => {
  const SAYINGS: [LinkAnswer, object][] = [
    [{ kind: 'unreachable' }, { kind: 'paused', reason: 'unreachable' }],
    [{ kind: 'unauthorized' }, { kind: 'paused', reason: 'signed-out' }],
    [
      { kind: 'throttled', retryAfterMs: 5000 },
      { kind: 'paused', reason: 'throttled', retryAfterMs: 5000 },
    ],
    [{ kind: 'server-error' }, { kind: 'paused', reason: 'server-error' }],
    [answerWith({ code: 'protocol-too-old' }), { kind: 'paused', reason: 'protocol-too-old' }],
    [answerWith({ code: 'clock-ahead', serverTime: 1_000_000 }), { kind: 'paused', reason: 'server-error' }],
  ];

  it.each(SAYINGS)('should clear and refuse nothing when the link says %j', async (says, outcome) => {
    const id = await phone.make(CLUB, 'site', SAMPLES.site('x'));
    phone.linkSays = says;
    expect(await phone.engine.runRound()).toEqual(outcome);
    expect(stateOf(id)).toBe('only-here');
    phone.linkSays = null;
    await phone.syncAll();
    expect(stateOf(id)).toBe('sent');
  });

  it('should name what is being sent only while it is', async () => {
    const id = await phone.make(CLUB, 'site', SAMPLES.site('x'));
    let during: ReadonlySet<string> = new Set();
    phone.meanwhile = async () => {
      during = phone.engine.inFlight();
    };
    await phone.syncAll();
    expect([...during]).toEqual([`${CLUB}/site/${id}`]);
    expect(phone.engine.inFlight().size).toBe(0);
  });
});

function answerWith(parts: Partial<SyncAnswer>): LinkAnswer {
  return { kind: 'answer', body: { protocol: 1, serverTime: 1, clubs: [], goneClubs: [], ...parts } };
}

describe('an edit while the record is being sent', () => {
  it('should stay owed, and go with the next round against the value that was sent', async () => {
    const id = await phone.make(CLUB, 'site', SAMPLES.site('first'));
    phone.meanwhile = async () => {
      phone.meanwhile = null;
      await phone.edit(CLUB, 'site', id, { name: 'second' });
    };
    expect(await phone.engine.runRound()).toMatchObject({ more: true, complete: false });
    expect(stateOf(id)).toBe('only-here');
    expect(hubFields('site', id)).toMatchObject({ name: 'first' });
    await phone.syncAll();
    expect(hubFields('site', id)).toMatchObject({ name: 'second' });
    expect(world.hub.clubs.get(CLUB)!.history).toMatchObject([
      { replaced: { value: 'first' }, clash: false },
    ]);
  });

  it('should not be refused with what was sent before it', async () => {
    const id = await phone.make(CLUB, 'site', SAMPLES.site('x'.repeat(61)));
    phone.meanwhile = async () => {
      phone.meanwhile = null;
      await phone.edit(CLUB, 'site', id, { name: 'short' });
    };
    await phone.syncAll();
    expect(stateOf(id)).toBe('sent');
  });
});

describe('what the server does not take', () => {
  it('should stay with its reason, go no more, and go again once it is edited', async () => {
    const id = await phone.make(CLUB, 'site', SAMPLES.site('x'.repeat(61)));
    await phone.syncAll();
    expect(stateOf(id)).toBe('needs-attention');
    expect(phone.record(CLUB, 'site', id).debt).toMatchObject({ status: 'refused', code: 'invalid' });
    expect(await phone.engine.runRound()).toEqual({ kind: 'done', more: false, complete: true });
    expect(world.requests.at(-1)!.clubs.every(({ changes }) => changes === undefined)).toBe(true);
    await phone.edit(CLUB, 'site', id, { name: 'short' });
    await phone.syncAll();
    expect(stateOf(id)).toBe('sent');
  });

  it('should be told at once where it is too large to travel', async () => {
    const id = await phone.make(CLUB, 'site', { ...SAMPLES.site('x'), notes: 'x'.repeat(300_000) });
    await phone.syncAll();
    expect(phone.record(CLUB, 'site', id).debt).toMatchObject({ status: 'refused', code: 'too-large' });
  });

  it('should hold a reception whose site was refused, and send both when the site is mended', async () => {
    await makeReception(phone);
    const [site] = phone.records('site');
    await phone.edit(CLUB, 'site', site!.id, { name: 'x'.repeat(61) });
    await phone.syncAll();
    expect(phone.records('reception')[0]?.debt).toMatchObject({ status: 'held', needs: site!.id });
    expect(await phone.engine.runRound()).toEqual({ kind: 'done', more: false, complete: false });
    await phone.edit(CLUB, 'site', site!.id, { name: 'short' });
    await phone.syncAll();
    expect(phone.records('reception')[0]?.debt).toBeUndefined();
  });

  it('should send records whole again, parents too, that a restored server has lost', async () => {
    await makeReception(phone);
    await phone.syncAll();
    world.hub.put({
      ...world.hub.clubs.get(CLUB)!,
      historyId: 'restored',
      seq: 0,
      records: new Map(),
      history: [],
    });
    const [reception] = phone.records('reception');
    await phone.edit(CLUB, 'reception', reception!.id, { remarks: 'after the restore' });
    await phone.syncAll();
    expect(hubFields('reception', reception!.id)).toMatchObject({ remarks: 'after the restore' });
    expect([...phone.disk.state.records.values()].filter(({ debt }) => debt)).toEqual([]);
  });
});

describe('a club that ends for a person', () => {
  it('should leave the phone, but My log never', async () => {
    await phone.make(CLUB, 'site', SAMPLES.site('x'));
    await phone.make(ANNAS_LOG, 'site', SAMPLES.site('mine'));
    for (const clubId of [CLUB, ANNAS_LOG]) {
      world.hub.put({ ...world.hub.clubs.get(clubId)!, members: new Map() });
    }
    await phone.engine.runRound();
    expect([...phone.disk.state.clubs.keys()]).toEqual([ANNAS_LOG]);
    expect(phone.records('site').map(({ fields }) => fields.name)).toEqual(['mine']);
  });
});
