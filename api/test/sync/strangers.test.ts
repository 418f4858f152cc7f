import { v7 } from 'uuid';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { EVENING_MS, stampAt, TestHub } from './hub.js';
import { edit, newRecord, sampleOfEachType, siteFixFields } from './sample-records.js';

const LATER = stampAt(EVENING_MS + 1000, 'phone002');

let hub: TestHub;
beforeAll(async () => {
  hub = await TestHub.open();
});
afterAll(() => hub.close());

async function everythingIn(clubId: string): Promise<unknown> {
  const tables = WRITABLE_TYPES.map((type) => type.replaceAll('-', '_'));
  const parts = [...tables, 'history', 'membership', 'club'].map((table) =>
    hub.rows(`select * from ${table} where club_id = ? order by 1, 2`, [clubId]),
  );
  return Promise.all(parts);
}

/** A club with a record of each type that clubs hold, all of one member. */
async function filledClub() {
  const clubId = await hub.addClub();
  const owner = await hub.newMember(clubId, 'organizer');
  const sample = sampleOfEachType();
  await owner.push(...WRITABLE_TYPES.filter((type) => type !== 'site-fix').map((type) => sample[type]));
  return { clubId, owner, sample };
}

describe('records of another member', () => {
  it('should refuse every change of them with a code and a sentence, whatever the role', async () => {
    const { clubId, sample } = await filledClub();
    for (const role of ['member', 'organizer', 'admin'] as const) {
      const other = await hub.newMember(clubId, role);
      const before = await everythingIn(clubId);
      for (const type of WRITABLE_TYPES) {
        // a draft list with its targets belongs to its maker too
        if (type === 'site-fix') continue;
        const { results } = await other.push(edit(sample[type], { deleted: true }, LATER));
        expect(results).toEqual([
          {
            type,
            id: sample[type].id,
            status: 'refused',
            code: 'forbidden',
            message: expect.stringMatching(/owner/),
          },
        ]);
      }
      expect(await everythingIn(clubId)).toEqual(before);
    }
  });

  it('should refuse a reception sent anew under the id of another member’s', async () => {
    const { clubId, sample } = await filledClub();
    const other = await hub.newMember(clubId);
    const { results } = await other.push({ ...sample.reception, at: LATER });
    expect(results).toMatchObject([{ status: 'refused', code: 'forbidden' }]);
  });
});

describe('records of another club', () => {
  it('should answer a club that is not the caller’s as gone, and change nothing in it', async () => {
    const { clubId, sample } = await filledClub();
    const stranger = await hub.newMember(await hub.addClub(), 'admin');
    const before = await everythingIn(clubId);
    Object.assign(stranger, { clubId });
    const changes = WRITABLE_TYPES.map((type) => edit(sample[type], { deleted: true }, LATER));
    const answer = await stranger.round([
      ...changes,
      newRecord('antenna', { name: 'X', kind: 'whip', sharedUse: false }),
    ]);
    expect(answer.goneClubs).toEqual([clubId]);
    expect(JSON.stringify(answer)).not.toContain(sample.site.id);
    expect(await everythingIn(clubId)).toEqual(before);
  });

  it('should answer the same for a club that does not exist', async () => {
    const { clubId } = await filledClub();
    const stranger = await hub.newMember(await hub.addClub());
    const home = stranger.clubId;
    const answers = [];
    for (const asked of [clubId, v7()]) {
      Object.assign(stranger, { clubId: asked });
      const { clubs, goneClubs } = await stranger.round([
        newRecord('antenna', { name: 'X', kind: 'whip', sharedUse: false }),
      ]);
      answers.push({ clubs, gone: goneClubs.map((id) => id === asked) });
    }
    expect(answers[0]).toEqual(answers[1]);
    expect(answers[0]!.clubs.map((club) => club.clubId)).toEqual([home]);
  });

  it('should hold a record whose parent is another club’s exactly as one whose parent nobody knows', async () => {
    const { sample } = await filledClub();
    const phone = await hub.newMember(await hub.addClub());
    const site = newRecord('site', {
      name: 'Heath',
      place: { locator: 'JO45' },
      environment: 'rural',
      sharedUse: false,
    });
    await phone.push(site);
    for (const parent of [sample.setup.id, v7()]) {
      const reading = newRecord('noise-reading', {
        siteId: site.id,
        setupId: parent,
        at: EVENING_MS,
        dialHz: 7_000_000,
        bandwidthHz: 2500,
        meter: { dbm: -100 },
      });
      const { results } = await phone.push(reading);
      expect(results).toEqual([{ type: 'noise-reading', id: reading.id, status: 'held', needs: parent }]);
    }
  });

  it('should keep the same ids in two clubs apart', async () => {
    const { clubId, owner, sample } = await filledClub();
    const second = await hub.addClub();
    await hub.addMember(second, owner.accountId);
    const before = await everythingIn(clubId);
    Object.assign(owner, { clubId: second, cursor: 0 });
    const { results } = await owner.push({
      ...sample.site,
      at: LATER,
      fields: { ...sample.site.fields, name: 'Copy' },
    });
    expect(results).toMatchObject([{ status: 'applied' }]);
    expect(await everythingIn(clubId)).toEqual(before);
  });

  it('should refuse a former member at once and say that the club is gone', async () => {
    const { clubId, owner, sample } = await filledClub();
    await hub.rows('update membership set left_at = 1 where club_id = ? and account_id = ?', [
      clubId,
      owner.accountId,
    ]);
    const answer = await owner.round([edit(sample.site, { name: 'Too late' }, LATER)]);
    expect(answer).toMatchObject({ clubs: [], goneClubs: [clubId] });
  });
});

describe('an exact fix', () => {
  /** A site with an exact fix in its owner's My log, as another member of the club receives it. */
  async function feedForOthers(
    latDeg: number,
    lonDeg: number,
    ids: { site: string; club: string; owner: string },
  ) {
    const myLog = await hub.addClub('my-log');
    await hub.addMember(myLog, ids.owner);
    const owner = Object.assign(Object.create(await hub.newMember(ids.club)), { accountId: ids.owner });
    const fix = newRecord('site-fix', siteFixFields(latDeg, lonDeg), stampAt(EVENING_MS), ids.site);
    const site = newRecord(
      'site',
      { name: 'Ravnklit dune', place: { locator: 'JO45fk' }, environment: 'rural', sharedUse: true },
      stampAt(EVENING_MS),
      ids.site,
    );
    Object.assign(owner, { clubId: myLog, cursor: 0 });
    expect((await owner.push(fix)).results).toMatchObject([{ status: 'applied' }]);
    Object.assign(owner, { clubId: ids.club, cursor: 0 });
    await owner.push(site);
    const reader = await hub.newMember(ids.club);
    const records = await reader.pull();
    return JSON.stringify(
      records.filter(({ type }) => type !== 'member').map((record) => ({ ...record, seq: 0 })),
    );
  }

  it('should leave the bytes of another member’s feed as they are, wherever in the square it lies', async () => {
    const owner = await hub.addAccount('Somebody');
    const site = v7();
    const feeds = [];
    for (const [latDeg, lonDeg] of [
      [55.4375, 8.4167],
      [55.458, 8.4999],
    ] as const) {
      const club = await hub.addClub();
      await hub.addMember(club, owner);
      feeds.push(await feedForOthers(latDeg, lonDeg, { site, club, owner }));
    }
    expect(feeds[0]).toContain('JO45fk');
    expect(feeds[1]).toBe(feeds[0]);
  });

  it('should be refused in a club', async () => {
    const phone = await hub.newMember(await hub.addClub());
    const { results } = await phone.push(newRecord('site-fix', siteFixFields(55.4, 8.4)));
    expect(results).toMatchObject([{ status: 'refused', code: 'forbidden' }]);
  });
});
