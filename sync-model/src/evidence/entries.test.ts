import { describe, expect, it } from 'vitest';
import { observationsOf } from './observations.js';
import { anInput, aReception, EVENING, HOUR_MS, MINUTE_MS, scored } from './testing/invented-evidence.js';

describe('what an entry derives from its reception', () => {
  it('should name the channel by the frequency of the target as it was at the entry', () => {
    const moved = aReception('r1', { targetHz: 6_075_000, tuning: { dialHz: 6_070_400, mode: 'AM' } });
    const free = aReception('r2', {
      targetId: null,
      targetHz: null,
      tuning: { dialHz: 6_071_900, mode: 'AM' },
    });
    const { channels } = observationsOf(anInput([moved, free]));
    expect(channels.map(({ channelKey, bandKey }) => [channelKey, bandKey])).toEqual([
      ['6075000', '49 m broadcast'],
      ['6070000', '49 m broadcast'],
    ]);
  });

  it('should keep two targets apart that were heard at one mark of the dial', () => {
    const { channels } = observationsOf(
      anInput([
        aReception('r1', { targetHz: 6_070_000 }),
        aReception('r2', { targetHz: 6_075_000 }),
        aReception('r3', { targetId: null, targetHz: null, tuning: { dialHz: 5_000_000, mode: 'AM' } }),
      ]),
    );
    expect(channels.map(({ channelKey }) => channelKey)).toEqual(['6070000', '6075000', '5000000']);
  });

  it('should take the error of the dial off before it looks for the raster', () => {
    // 500 ppm high at 6 070 kHz is 3 kHz: the dial shows 6 073, nearer to 6 075.
    const off = aReception('r1', {
      targetId: null,
      targetHz: null,
      tuning: { dialHz: 6_073_035, mode: 'AM' },
    });
    const dialCheck = {
      deleted: false,
      importId: null,
      receiverId: 'bench',
      at: EVENING,
      referenceHz: 5_000_000,
      dialHz: 5_002_500,
      errorPpm: 500,
      uncertaintyPpm: 5,
      method: 'zero-beat' as const,
      temperatureC: null,
    };
    expect(observationsOf(anInput([off])).channels[0]?.channelKey).toBe('6075000');
    expect(observationsOf(anInput([off], { dialChecks: [dialCheck] })).channels[0]?.channelKey).toBe(
      '6070000',
    );
  });

  it('should count amateur signals by the band', () => {
    const met = { targetId: null, targetHz: null, basis: 'planned' as const };
    const { channels } = observationsOf(
      anInput([
        aReception('r1', { ...met, tuning: { dialHz: 7_032_000, mode: 'CW' } }),
        aReception('r2', { ...met, tuning: { dialHz: 7_090_000, mode: 'LSB' } }),
      ]),
    );
    expect(channels).toHaveLength(1);
    expect(channels[0]).toMatchObject({ channelKey: '40 m', bandKey: '40 m amateur', isWholeBand: true });
  });

  it('should not reach across a step of the clock that an outing has seen', () => {
    const check = {
      deleted: false,
      importId: null,
      deviceId: 'pebble01',
      deviceAt: EVENING - HOUR_MS,
      offsetMs: 5000,
      uncertaintyMs: 100,
      method: 'tone' as const,
      pathKm: null,
    };
    const steps = (deviceId: string) => [
      {
        fields: { clockSteps: [{ at: EVENING - MINUTE_MS, stepMs: 60_000 }] },
        clockStepsStamp: `${'0'.repeat(16)}${deviceId}`,
      },
    ];
    const basisWith = (deviceId: string) =>
      observationsOf(anInput([aReception('r1')], { clockChecks: [check], outings: steps(deviceId) }))
        .channels[0]?.timeBasis;
    expect(basisWith('pebble01')).toBe('unchecked');
    expect(basisWith('moss0002')).toBe('nearest');
  });

  it('should take the attenuator and the preamplifier off the level', () => {
    const { channels } = observationsOf(
      anInput([aReception('r1', { setupId: 'hot', meter: { s: 9, overDb: 10 }, attenuationDb: 20 })], {
        setups: new Map([
          ['hot', { receiverId: 'bench', antennaId: 'wire', attenuationDb: 6, preampDb: 12 }],
        ]),
      }),
    );
    expect(channels[0]?.levelDbm).toBe(-73 + 10 + 20 - 12);
  });

  it('should count no score or reading that was only carried over from the entry before', () => {
    const carried = {
      sinpo: scored(5),
      meter: { s: 7, overDb: 0 },
      carried: ['sinpo' as const, 'meter' as const],
    };
    const { channels } = observationsOf(anInput([aReception('r1', carried)]));
    expect(channels[0]).toMatchObject({ heard: true, o: null, levelDbm: null });
  });
});
