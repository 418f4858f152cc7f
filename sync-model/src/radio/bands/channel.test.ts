import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { channelKey, channelOf, channelOfKey, formatChannel } from './channel.js';
import type { ItuRegion } from './region.js';

const keyAt = (kHz: number, region: ItuRegion, targetHz: number | null = null) =>
  channelKey(channelOf({ dialHz: Math.round(kHz * 1000), targetHz, region }));
const anyDialHz = fc.oneof(
  fc.integer({ min: 1000, max: 2_000_000 }),
  fc.integer({ min: 1000, max: 30_000_000 }),
  fc.integer({ min: 1000, max: 3_000_000_000 }),
);
const anyRegion = fc.constantFrom<ItuRegion>(1, 2, 3);

describe('the channel of a reception', () => {
  it('should be the target\u2019s frequency as it was at the entry, wherever the dial stood', () => {
    expect(keyAt(6071.3, 1, 6_070_000)).toBe('6070000');
    expect(keyAt(14_100.4, 1, 14_100_000)).toBe('14100000');
  });

  it.each([
    // MW plans: multiples of 9 kHz from 531 to 1 602 in Regions 1 and 3 (GE75; a Japanese note of the change on
    // 23 November 1978), of 10 kHz from 540 to 1 700 in Region 2. 1 017 = 9 × 113 is a channel; 1 000 only of 10 kHz.
    [1017, 1, '1017000'],
    [1018.2, 3, '1017000'],
    [1000, 1, '999000'],
    [1000, 2, '1000000'],
    [1602, 1, '1602000'],
    [1606, 1, '1602000'],
    [526.6, 1, '531000'],
    [1611, 1, '1611000'],
    [536, 2, '540000'],
    [1703, 2, '1700000'],
    // LW, from memory: 153 to 279 kHz by 9.
    [153.4, 1, '153000'],
    [279, 1, '279000'],
    // The other rasters are the product's own; 5 kHz and 100 kHz are common practice, no source.
    [6072.4, 1, '6070000'],
    [6072.5, 1, '6075000'],
    [4765.9, 3, '4765000'],
    [101_549, 1, '101500000'],
    [87_500, 1, '87500000'],
    [5000.4, 1, '5000000'],
    [8414.5, 1, '8415000'],
    [433_920.2, 1, '433920000'],
  ] as const)('should be the nearest step of the raster: %f kHz in Region %i', (kHz, region, key) => {
    expect(keyAt(kHz, region)).toBe(key);
  });

  it('should be the band alone among amateurs, by region', () => {
    expect(keyAt(7074, 1)).toBe('40 m');
    expect(keyAt(7250, 2)).toBe('40 m');
    expect(keyAt(7250.9, 1)).toBe('7250000');
    expect(keyAt(145_500, 1)).toBe('2 m');
  });

  it('should always be near the dial, and the same again when tuned to', () => {
    fc.assert(
      fc.property(anyDialHz, anyRegion, (dialHz, region) => {
        const channel = channelOf({ dialHz, targetHz: null, region });
        fc.pre(channel.kind === 'channel');
        if (channel.kind !== 'channel') return;
        expect(channel.hz).toBeGreaterThanOrEqual(1000);
        expect(Math.abs(channel.hz - dialHz)).toBeLessThanOrEqual(dialHz < 30_000_000 ? 5000 : 50_000);
      }),
      { numRuns: 2000 },
    );
  });

  it('should always come back from its key', () => {
    fc.assert(
      fc.property(anyDialHz, anyRegion, (dialHz, region) => {
        const channel = channelOf({ dialHz, targetHz: null, region });
        expect(channelOfKey(channelKey(channel))).toEqual(channel);
      }),
    );
  });

  it.each(['', '0', '06070000', '6070.5', '40m', 'm', '99999999999', '<b>'])(
    'should not be read from %j',
    (key) => {
      expect(channelOfKey(key)).toBeUndefined();
    },
  );
});

describe('a channel as text', () => {
  it('should say the frequency or the band with its service', () => {
    expect(formatChannel({ kind: 'channel', hz: 6_070_000 })).toBe('6\u2009070\u2009kHz');
    expect(formatChannel({ kind: 'band', name: '40 m' })).toBe('40 m amateur');
  });
});
