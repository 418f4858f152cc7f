import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bandRate, heardRate } from './heard-rate.js';
import { wilsonInterval } from './wilson.js';

/** "hour day heard" in short: 19 UTC, day 0 and so on. */
const one = (hourUtc: number, dayNumber: number, heard: boolean, channelKey = '6070000') => ({
  hourUtc,
  dayNumber,
  heard,
  channelKey,
});
const many = (n: number, heard: number, hourUtc = 19, channelKey?: string) =>
  Array.from({ length: n }, (_, i) => one(hourUtc, i, i < heard, channelKey));

describe('heardRate', () => {
  it('should be heard of n with the Wilson interval within one hour', () => {
    // The drawing of a square: 58 of 70, 83 %, 95 % 72–90.
    const { rate, interval, n, heard } = heardRate(many(70, 58));
    expect([n, heard]).toEqual([70, 58]);
    expect(rate).toBeCloseTo(0.83, 2);
    expect(interval!.low).toBeCloseTo(0.72, 2);
    expect(interval!.high).toBeCloseTo(0.9, 2);
  });

  it('should be the mean of the hours, with dates for n, over several', () => {
    const observations = [...many(10, 10, 18), ...many(5, 0, 19)];
    const figure = heardRate(observations);
    expect(figure).toMatchObject({ n: 15, heard: 10, dates: 10, hours: 2, rate: 0.5 });
    expect(figure.interval).toEqual(wilsonInterval(5, 10));
  });

  it('should take a mean that is no whole number of dates as it is', () => {
    const observations = [...many(3, 1, 18), ...many(2, 1, 19)];
    const { rate, interval } = heardRate(observations);
    expect(rate).toBeCloseTo(5 / 12, 12);
    expect(interval).toEqual(wilsonInterval((rate ?? 0) * 3, 3));
  });

  it('should look thin under five observations or three dates', () => {
    expect(heardRate(many(5, 2)).isThin).toBe(false);
    expect(heardRate(many(4, 2)).isThin).toBe(true);
    const twoDates = [0, 0, 0, 1, 1, 1].map((day) => one(19, day, true));
    expect(heardRate(twoDates)).toMatchObject({ n: 6, dates: 2, isThin: true });
  });

  it('should have no rate, and say why, where nothing was tried', () => {
    expect(heardRate([])).toMatchObject({
      n: 0,
      rate: null,
      interval: null,
      reason: 'nothing-tried',
      isThin: true,
    });
  });

  it('should never be moved by the order of the observations, and always lie in its interval', () => {
    const anObservation = fc
      .tuple(fc.nat(23), fc.nat(9), fc.boolean())
      .map(([hour, day, heard]) => one(hour, day, heard));
    fc.assert(
      fc.property(fc.array(anObservation, { minLength: 1, maxLength: 60 }), (observations) => {
        const figure = heardRate(observations);
        expect(heardRate([...observations].reverse())).toEqual(figure);
        expect(figure.interval!.low).toBeLessThanOrEqual(figure.rate!);
        expect(figure.interval!.high).toBeGreaterThanOrEqual(figure.rate!);
      }),
    );
  });
});

describe('bandRate', () => {
  it('should be the mean of the channels, however often each was tried', () => {
    const observations = [
      ...many(50, 50, 19, '5900000'),
      ...many(5, 0, 19, '6000000'),
      ...many(10, 5, 19, '6070000'),
    ];
    const figure = bandRate(observations);
    expect(figure).toMatchObject({ rate: 0.5, n: 65, heard: 55, channels: 3, channelsLeftOut: 0, dates: 50 });
    expect(figure.interval).toEqual(wilsonInterval(25, 50));
  });

  it('should leave channels of under five observations out of the mean', () => {
    const observations = [
      ...many(5, 5, 19, '5900000'),
      ...many(5, 5, 19, '6000000'),
      ...many(5, 5, 19, '6070000'),
      ...many(4, 0, 19, '6100000'),
    ];
    expect(bandRate(observations)).toMatchObject({ rate: 1, channels: 3, channelsLeftOut: 1, n: 19 });
  });

  it('should be no rate from two channels, and say why', () => {
    const observations = [
      ...many(9, 5, 19, '5900000'),
      ...many(9, 5, 19, '6000000'),
      ...many(4, 4, 19, '6070000'),
    ];
    expect(bandRate(observations)).toMatchObject({ rate: null, interval: null, reason: 'too-few-channels' });
    expect(bandRate([])).toMatchObject({ rate: null, reason: 'nothing-tried' });
  });
});
