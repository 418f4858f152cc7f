import { describe, expect, it } from 'vitest';
import { squareEvidence } from './summary.js';
import {
  anInput,
  aReception,
  DAY_MS,
  EVENING,
  HOUR_MS,
  MINUTE_MS,
  scored,
} from './testing/invented-evidence.js';

const SQUARE = { locator: 'JO46ac', characters: 6 as const };

describe('squareEvidence', () => {
  it('should give the rate of a square with all that stands behind it and beside it', () => {
    const tries = [0, 1, 2, 3, 4].map((day) =>
      aReception(`try${day}`, {
        deviceAt: EVENING + day * DAY_MS,
        outcome: day < 3 ? 'heard' : 'nil',
        meter: day < 3 ? { s: 9, overDb: day * 10 } : null,
      }),
    );
    const beside = [
      aReception('by chance', { basis: 'chance', targetId: null, sinpo: scored(5) }),
      aReception('again', { deviceAt: EVENING + MINUTE_MS, outcome: 'nil' }),
      aReception('thrown away', { deleted: true }),
      aReception('elsewhere', { siteId: 'heath' }),
      aReception('coarse', { deviceAt: EVENING + HOUR_MS, outcome: 'nil', durationS: 4 }),
    ];
    const filter = { square: SQUARE, channelKey: '6070000' };
    const evidence = squareEvidence(
      anInput([...beside, ...tries], { inReviewIds: new Set(['try4', 'again']) }),
      filter,
    );
    expect(evidence.rate).toMatchObject({ n: 5, heard: 3, dates: 5, rate: 0.6, isThin: false });
    expect(evidence.score).toMatchObject({ median: 4, n: 3 });
    expect(evidence.scoresBeside).toMatchObject({ median: 5, n: 1 });
    expect(evidence.levels[0]).toMatchObject({
      receiverId: 'bench',
      level: { kind: 'level', medianDbm: -73 },
    });
    expect(evidence.inReview).toBe(1);
    expect(evidence.uncheckedTimes).toBe(5);
    expect(evidence.observations.map(({ receptionId }) => receptionId)).toEqual(tries.map(({ id }) => id));
    expect(evidence.leftOut.map(({ reason, receptionIds }) => [reason, receptionIds])).toEqual([
      ['deleted', ['thrown away']],
      ['chance', ['by chance']],
      ['short-nil', ['coarse']],
      ['later-in-hour', ['again']],
    ]);
  });

  it('should leave an unsure identity out of the station and keep it for the frequency', () => {
    const input = anInput([aReception('r1', { identity: 'tentative' })]);
    expect(squareEvidence(input, { channelKey: '6070000' })).toMatchObject({ rate: { n: 1 }, leftOut: [] });
    expect(squareEvidence(input, { targetId: 'plover' })).toMatchObject({
      rate: { n: 0, rate: null },
      leftOut: [{ reason: 'unsure-identity', count: 1, receptionIds: ['r1'] }],
    });
  });
});
