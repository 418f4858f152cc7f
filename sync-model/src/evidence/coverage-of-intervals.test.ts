import { describe, expect, it } from 'vitest';
import { heardRate } from './heard-rate.js';
import { typicalScore } from './typical-score.js';

// Goal: an interval that says 95 % holds the truth in about 95 of 100 clubs.
// Method: many invented clubs whose truth is known, from one fixed seed; the share of intervals that hold it.
// A share of 4 000 has a standard error of 0.34 % at 95 %, so the borders below are wide of chance.

const CLUBS = 4000;

/** Mulberry32, public domain (Tommy Ettinger 2017): small, and good enough to draw evenings. */
function randomOf(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

function shareHeld(seed: number, isHeld: (random: () => number) => boolean): number {
  const random = randomOf(seed);
  let held = 0;
  for (let club = 0; club < CLUBS; club++) if (isHeld(random)) held++;
  return held / CLUBS;
}

const HOURS = [17, 18, 19, 20];

describe('the 95 % interval of a heard rate', () => {
  it('should hold the truth of one hour at about its rate, over the truths that a band takes', () => {
    for (const n of [5, 12, 30, 70]) {
      const share = shareHeld(n, (random) => {
        const truth = 0.02 + 0.96 * random();
        const evenings = Array.from({ length: n }, (_, dayNumber) => ({
          hourUtc: 19,
          dayNumber,
          heard: random() < truth,
        }));
        const { interval } = heardRate(evenings);
        return interval!.low <= truth && truth <= interval!.high;
      });
      expect(share).toBeGreaterThan(0.93);
      expect(share).toBeLessThan(0.975);
    }
  });

  it('should hold the mean of several hours when the hours of one evening rise and fall together', () => {
    // The worst case that dates for n is meant for: one evening is all open or all shut.
    const share = shareHeld(2026, (random) => {
      const truth = 0.1 + 0.8 * random();
      const tries = Array.from({ length: 20 }, (_, dayNumber) => {
        const heard = random() < truth;
        return HOURS.map((hourUtc) => ({ hourUtc, dayNumber, heard }));
      }).flat();
      const { interval } = heardRate(tries);
      return interval!.low <= truth && truth <= interval!.high;
    });
    expect(share).toBeGreaterThan(0.93);
    expect(share).toBeLessThan(0.975);
  });

  it('should be wider than needed, never narrower, when the hours are independent', () => {
    const share = shareHeld(7, (random) => {
      const truths = HOURS.map(() => random());
      const truth = truths.reduce((sum, one) => sum + one, 0) / truths.length;
      const tries = Array.from({ length: 20 }, (_, dayNumber) =>
        HOURS.map((hourUtc, i) => ({ hourUtc, dayNumber, heard: random() < truths[i]! })),
      ).flat();
      const { interval } = heardRate(tries);
      return interval!.low <= truth && truth <= interval!.high;
    });
    expect(share).toBeGreaterThan(0.95);
  });
});

describe('the 95 % interval of a typical score', () => {
  it('should hold the median at least at its rate', () => {
    // Scores 1 to 5 with chances 5, 15, 40, 30, 10 %: the median is 3.
    const upTo = [0.05, 0.2, 0.6, 0.9, 1];
    const share = shareHeld(41, (random) => {
      const scores = Array.from({ length: 15 }, () => {
        const drawn = random();
        return { heard: true, o: 1 + upTo.findIndex((border) => drawn < border) };
      });
      const { interval } = typicalScore(scores);
      return interval!.low <= 3 && 3 <= interval!.high;
    });
    expect(share).toBeGreaterThan(0.95);
  });
});
