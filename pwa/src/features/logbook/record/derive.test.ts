// @vitest-environment jsdom
import { LEFT_OUT_WORDS } from '@harkmoor/sync-model/evidence/tries';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { formatStamp } from '@harkmoor/sync-model/stamp/stamp';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { describe, expect, it } from 'vitest';
import { aReception, aSite } from '../../../store/test-log';
import type { HeldReception } from '../data/held-reception';
import { derive } from './derive';
import { pathOf, standpointOf } from './path-figures';
import { evidenceWords, scheduleWords, timeBasisWords } from './reading-words';

const AT = Date.UTC(2026, 10, 12, 18, 43);
const DEVICE = 'aaaaaaaa';

function held(fields: Partial<Reception> = {}, over: Partial<HeldReception> = {}): HeldReception {
  const record = {
    ...{ clubId: 'club', type: 'reception', id: 'r1', ownerId: 'me', seq: 1 },
    at: formatStamp({ wallMs: AT, counter: 0, deviceId: DEVICE }),
    fields: aReception({ deviceAt: AT, ...fields }),
  } as StoredRecord<'reception'>;
  return {
    ...{ record, region: 1, clubId: 'club', ownId: 'me', isOwn: true, site: aSite(), siteFix: null },
    ...{ outing: null, receiver: null, antenna: null, target: null, clockChecks: [], outingsAround: [] },
    ...{ dialChecks: [], clashes: [], names: () => null },
    setup: {
      ...{ deleted: false, importId: null, receiverId: 'rx', antennaId: 'ant', coupling: null },
      ...{ attenuationDb: 10, preampDb: 0, retiredAt: null },
    },
    ...over,
  };
}

const check = {
  ...{ deleted: false, importId: null, deviceId: DEVICE, deviceAt: AT - 3_600_000, uncertaintyMs: 100 },
  ...{ method: 'tone' as const, pathKm: null },
};

describe('what follows from the readings', () => {
  it('should correct the time by a check of that very device, and say so', () => {
    const { time } = derive(held({}, { clockChecks: [{ ...check, offsetMs: -192_000 }] }));
    expect(time).toEqual({ atMs: AT - 192_000, basis: 'nearest', offsetMs: -192_000 });
    expect(timeBasisWords(time)).toBe(
      'By the nearest clock check within 12 h: 3\u202fmin 12\u202fs taken off.',
    );
    const other = derive(held({}, { clockChecks: [{ ...check, deviceId: 'bbbbbbbb', offsetMs: 9000 }] }));
    expect(other.time.basis).toBe('unchecked');
  });

  it('should give levels at the antenna’s end and the signal over the noise', () => {
    const receiver = {
      meterScale: { kind: 's', s9Dbm: -73, dbPerS: 6, calibrated: false },
    } as HeldReception['receiver'];
    const { signalDbm, noiseDbm } = derive(
      held({ meter: { s: 9, overDb: 0 }, noiseMeter: { s: 5, overDb: 0 } }, { receiver }),
    );
    // IARU Region 1 R.1: S9 is −73 dBm and an S-unit 6 dB; the setup's 10 dB of attenuation are added back
    expect([signalDbm, noiseDbm]).toEqual([-63, -87]);
  });

  it('should name channel and band, and say why an entry does not count', () => {
    const { band, channelHz, evidence } = derive(
      held({ basis: 'chance', tuning: { dialHz: 6_071_000, mode: 'AM' } }),
    );
    expect([band, channelHz]).toEqual(['49 m broadcast', 6_070_000]);
    expect(evidenceWords(evidence)).toBe(LEFT_OUT_WORDS.chance);
    expect(evidenceWords(derive(held()).evidence)).toContain('A try');
  });
});

describe('the schedule at that time', () => {
  const slot = { from: '17:00', to: '20:00', days: [1, 2, 3, 4, 5, 6, 7] };

  it('should say until when it is on or off', () => {
    expect(scheduleWords({ schedule: [slot], silences: [] }, AT)).toBe(
      'On the air until 20:00 UTC by its schedule.',
    );
    expect(scheduleWords({ schedule: [slot], silences: [] }, AT + 2 * 3_600_000)).toBe(
      'Off the air until 13 Nov, 17:00 UTC by its schedule.',
    );
    const silences = [{ from: AT - 1, to: AT + 1 }];
    expect(scheduleWords({ schedule: 'always', silences }, AT)).toContain('set a silence');
  });
});

describe('the path', () => {
  const target = { tx: { latDeg: 48, lonDeg: 11 } } as HeldReception['target'];
  const fix = { latDeg: 56.1, lonDeg: 8.1, accuracyM: 12, source: 'live' as const, fixedAt: AT };

  it('should be rounded from the middle of the square where the exact fix is not one’s own', () => {
    const from = { siteFix: null, site: aSite(), target };
    expect(pathOf(from)!.distanceKm % 10).toBe(0);
    expect(standpointOf(from)!.words).toBe('from the middle of square JO46ac');
  });

  it('should be exact for the owner, and say from what', () => {
    const siteFix = { deleted: false, importId: null, fix, elevationM: null, home: false };
    expect(pathOf({ siteFix, site: aSite(), target })!.distanceKm % 10).not.toBe(0);
    expect(standpointOf({ siteFix, site: aSite() })!.words).toContain('your exact fix');
  });
});
