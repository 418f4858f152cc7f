import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pickFrequency } from './pick-frequency.js';
import { anObservation, evenings } from './testing/invented-observation.js';
import { wilsonInterval } from './wilson.js';

describe('pickFrequency', () => {
  it('should rank by what the hours have shown at the least, not by the rate', () => {
    const choices = pickFrequency(
      [
        // 3 of 3 shows less than 18 of 20.
        ...evenings(3, 3, { channelKey: '3955000', hourUtc: 14 }),
        ...evenings(20, 18, { channelKey: '5000000', hourUtc: 14 }),
      ],
      [14],
    );
    expect(choices.map(({ channelKey }) => channelKey)).toEqual(['5000000', '3955000']);
    expect(choices[0]!.atLeast).toBe(wilsonInterval(18, 20).low);
    expect(choices[0]!.heard).toMatchObject({ rate: 0.9, n: 20, dates: 20 });
  });

  it('should count an hour without a try as nothing, and print it and the weakest', () => {
    const [choice] = pickFrequency(
      [
        ...evenings(10, 10, { hourUtc: 14 }),
        ...evenings(10, 4, { hourUtc: 15 }),
        anObservation({ hourUtc: 9 }),
      ],
      [14, 15, 16],
    );
    const low = (heard: number) => wilsonInterval(heard, 10).low;
    expect(choice!.atLeast).toBeCloseTo((low(10) + low(4) + 0) / 3, 12);
    expect(choice!.weakestHour).toEqual({ hourUtc: 15, atLeast: low(4) });
    expect(choice!.emptyHoursUtc).toEqual([16]);
    expect(choice!.heard).toMatchObject({ n: 20, rate: 0.7 });
  });

  it('should leave out a channel that was not tried in the hours needed', () => {
    expect(pickFrequency([anObservation({ hourUtc: 9 })], [14])).toEqual([]);
    expect(pickFrequency([anObservation()], [])).toEqual([]);
  });

  const aRow = fc
    .tuple(fc.constantFrom('5000000', '6070000', '7255000'), fc.nat(3), fc.nat(9), fc.boolean())
    .map(([channelKey, hourUtc, day, heard]) =>
      anObservation({ channelKey, hourUtc, dayNumber: 20_769 + day, heard }),
    );

  it('should never promise more than was heard, nor hang on the order of what was logged', () => {
    fc.assert(
      fc.property(
        fc.array(aRow, { maxLength: 40 }),
        fc.uniqueArray(fc.nat(3), { minLength: 1 }),
        (rows, hours) => {
          const choices = pickFrequency(rows, hours);
          expect(pickFrequency([...rows].reverse(), hours)).toEqual(choices);
          choices.forEach((choice, i) => {
            expect(choice.atLeast).toBeLessThanOrEqual(choice.heard.rate! + 1e-12);
            if (i > 0) expect(choice.atLeast).toBeLessThanOrEqual(choices[i - 1]!.atLeast);
          });
        },
      ),
    );
  });

  it('should never rank a channel lower for one more heard in an hour that is needed', () => {
    fc.assert(
      fc.property(fc.array(aRow, { minLength: 1, maxLength: 40 }), (rows) => {
        const [first] = rows;
        const atLeast = (of: typeof rows) =>
          pickFrequency(of, [0, 1, 2, 3]).find(({ channelKey }) => channelKey === first!.channelKey)!.atLeast;
        const more = { ...first!, heard: true, dayNumber: 30_000 };
        expect(atLeast([...rows, more])).toBeGreaterThanOrEqual(atLeast(rows) - 1e-12);
      }),
    );
  });
});
