import { describe, expect, it } from 'vitest';
import { observationsOf } from './observations.js';
import { squaresOf } from './squares.js';
import { anInput, aReception, EVENING, HOUR_MS, MINUTE_MS, SETUPS } from './testing/invented-evidence.js';

const idsOf = (rows: readonly { receptionId: string }[]) => rows.map(({ receptionId }) => receptionId);

describe('observationsOf', () => {
  it('should take the first try of the hour, whoever made it', () => {
    const { channels, targets } = observationsOf(
      anInput([
        aReception('r2', { deviceAt: EVENING + 20 * MINUTE_MS }, { ownerId: 'asta' }),
        aReception('r1', { deviceAt: EVENING + 5 * MINUTE_MS, outcome: 'nil' }, { ownerId: 'birk' }),
      ]),
    );
    expect(idsOf(channels)).toEqual(['r1']);
    expect(idsOf(targets)).toEqual(['r1']);
    expect(channels[0]).toMatchObject({ heard: false, ownerId: 'birk', o: null });
  });

  it('should take the smaller id of two tries at one moment', () => {
    expect(idsOf(observationsOf(anInput([aReception('rb'), aReception('ra')])).channels)).toEqual(['ra']);
  });

  it('should part hours, dates, sites and antennas, but not receivers with one antenna', () => {
    const { channels } = observationsOf(
      anInput([
        aReception('r1'),
        aReception('r2', { deviceAt: EVENING + HOUR_MS }),
        aReception('r3', { deviceAt: EVENING + 24 * HOUR_MS }),
        aReception('r4', { siteId: 'heath' }),
        aReception('r5', { setupId: 'bench-whip' }),
        aReception('r6', { setupId: 'lab-wire' }),
      ]),
    );
    expect(idsOf(channels).sort()).toEqual(['r1', 'r2', 'r3', 'r4', 'r5']);
  });

  it('should place a try in the hour of its corrected time', () => {
    const check = {
      deleted: false,
      importId: null,
      deviceId: 'pebble01',
      deviceAt: EVENING,
      offsetMs: -MINUTE_MS,
      uncertaintyMs: 100,
      method: 'tone' as const,
      pathKm: null,
    };
    const midnight = Date.UTC(2026, 11, 1);
    const tries = [aReception('r1', { deviceAt: midnight + 30_000 })];
    const { channels } = observationsOf(anInput(tries, { clockChecks: [{ ...check, deviceAt: midnight }] }));
    expect(channels[0]).toMatchObject({ hourUtc: 23, monthKey: '2026-11', timeBasis: 'nearest' });
    expect(observationsOf(anInput(tries)).channels[0]).toMatchObject({ hourUtc: 0, monthKey: '2026-12' });
  });

  it('should count two targets on one frequency as one observation of the channel', () => {
    const { channels, targets } = observationsOf(
      anInput([
        aReception('r1', { targetId: 'plover', outcome: 'nil' }),
        aReception('r2', { targetId: 'tern', deviceAt: EVENING + MINUTE_MS }),
      ]),
    );
    expect(idsOf(channels)).toEqual(['r1']);
    expect(idsOf(targets)).toEqual(['r1', 'r2']);
  });

  it('should let an unsure identity stand for the frequency and a later sure one for the target', () => {
    const { channels, targets } = observationsOf(
      anInput([
        aReception('r1', { identity: 'tentative' }),
        aReception('r2', { deviceAt: EVENING + 9 * MINUTE_MS }),
      ]),
    );
    expect(idsOf(channels)).toEqual(['r1']);
    expect(idsOf(targets)).toEqual(['r2']);
  });

  it('should get along with gear, sites and outings that were emptied after the bin', () => {
    const emptied = (fields: Record<string, null>) => fields as never;
    const input = anInput(
      [aReception('r1', { meter: { s: 9, overDb: 0 } }), aReception('r2', { setupId: 'gone' })],
      {
        sites: new Map([['dune', emptied({ place: null })]]),
        receivers: new Map([['bench', emptied({ meterScale: null })]]),
        setups: new Map([
          ['bench-wire', SETUPS['bench-wire']],
          ['gone', emptied({ receiverId: null, antennaId: null })],
        ]),
        outings: [{ fields: emptied({ clockSteps: null }), clockStepsStamp: `${'0'.repeat(16)}pebble01` }],
      },
    );
    const { channels, entries } = observationsOf(input);
    expect(channels).toMatchObject([{ receptionId: 'r1', levelDbm: null }]);
    expect(entries[1]).toMatchObject({ counts: 'left-out', reason: 'setup-missing' });
    expect(squaresOf(channels, input.sites, 6)).toEqual([]);
  });
});
