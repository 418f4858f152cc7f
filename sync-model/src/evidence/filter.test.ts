import { describe, expect, it } from 'vitest';
import { filterObservations, rateFor, type EvidenceFilter } from './filter.js';
import { anInput } from './testing/invented-evidence.js';
import { anObservation, evenings } from './testing/invented-observation.js';

const { sites } = anInput([]);
const channels = [
  anObservation({ receptionId: 'r1' }),
  anObservation({ receptionId: 'r2', channelKey: '7050000', bandKey: '40 m amateur', hourUtc: 20 }),
  anObservation({ receptionId: 'r3', siteId: 'heath', antennaId: 'whip', setupId: 'bench-whip' }),
  anObservation({ receptionId: 'r4', siteId: 'island', ownerId: 'birk', monthKey: '2026-12' }),
];
const targets = [
  anObservation({ receptionId: 't1', targetId: 'plover' }),
  anObservation({ receptionId: 't2', targetId: 'tern' }),
];
const idsFor = (filter: EvidenceFilter) =>
  filterObservations({ channels, targets }, filter, sites)
    .map(({ receptionId }) => receptionId)
    .join(' ');

describe('filterObservations', () => {
  it('should narrow by each thing that is asked for and by all together', () => {
    expect(idsFor({})).toBe('r1 r2 r3 r4');
    expect(idsFor({ channelKey: '6070000' })).toBe('r1 r3 r4');
    expect(idsFor({ bandKey: '40 m amateur' })).toBe('r2');
    expect(idsFor({ hoursUtc: [19, 21] })).toBe('r1 r3 r4');
    expect(idsFor({ monthKeys: ['2026-12'] })).toBe('r4');
    expect(idsFor({ antennaIds: ['whip'] })).toBe('r3');
    expect(idsFor({ setupIds: ['bench-wire'] })).toBe('r1 r2 r4');
    expect(idsFor({ ownerIds: ['birk', null] })).toBe('r4');
    expect(idsFor({ siteIds: ['dune'] })).toBe('r1 r2');
    expect(idsFor({ siteIds: ['dune'], hoursUtc: [20] })).toBe('r2');
    expect(idsFor({ hoursUtc: [] })).toBe('');
  });

  it('should take the stream of targets when one is named', () => {
    expect(idsFor({ targetId: 'tern' })).toBe('t2');
  });

  it('should take a square as it is drawn: with the coarse sites only where all are drawn so', () => {
    expect(idsFor({ square: { locator: 'JO46', characters: 6 } })).toBe('r3');
    expect(idsFor({ square: { locator: 'JO46', characters: 4 } })).toBe('r1 r2 r3');
    expect(idsFor({ square: { locator: 'JO46ac', characters: 6 } })).toBe('r1 r2');
  });
});

describe('rateFor', () => {
  it('should be of the channel where one is asked for, and of channels where a band is', () => {
    const observations = evenings(10, 5);
    expect(rateFor(observations, { channelKey: '6070000' }).rate).toBe(0.5);
    expect(rateFor(observations, { bandKey: '49 m broadcast' })).toMatchObject({
      rate: null,
      reason: 'too-few-channels',
    });
    expect(rateFor(observations, {})).toMatchObject({ rate: null, reason: 'too-few-channels' });
  });

  it('should be of the band itself where the band is logged as a whole', () => {
    const observations = evenings(10, 4, { channelKey: '40 m', bandKey: '40 m amateur', isWholeBand: true });
    expect(rateFor(observations, { bandKey: '40 m amateur' }).rate).toBeCloseTo(0.4, 12);
  });
});
