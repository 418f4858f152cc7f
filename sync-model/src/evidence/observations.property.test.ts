import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { filterObservations, rateFor } from './filter.js';
import { heardRate } from './heard-rate.js';
import { observationsOf, type Observation } from './observations.js';
import { squareEvidence } from './summary.js';
import { DAY_MS, HOUR_MS, MINUTE_MS } from './testing/invented-evidence.js';
import { inputOf, recount, type Try } from './testing/invented-history.js';

// Goal: whatever a club has logged, on however many phones and in whatever order it arrived, the count is the one
// that product.md describes.
// Method: random histories in a narrow world, so that hours, targets and channels collide, against a recount that
// is written for plainness: no index, no shared code but the corrected time, which has its own tests.

const FIRST_DAY = Date.UTC(2026, 10, 19);

const aTry = fc.record({
  id: fc.uuid(),
  outcome: fc.constantFrom(
    'heard' as const,
    'heard' as const,
    'nil' as const,
    'nil' as const,
    'skipped' as const,
  ),
  basis: fc.constantFrom(
    'round' as const,
    'round' as const,
    'planned' as const,
    'chance' as const,
    'swap' as const,
    'import' as const,
  ),
  identity: fc.constantFrom('sure' as const, 'sure' as const, 'tentative' as const, 'unknown' as const),
  target: fc.constantFrom('tern' as const, 'plover' as const, 'dunlin' as const, null),
  siteId: fc.constantFrom('dune', 'heath'),
  setupId: fc.constantFrom('bench-wire' as const, 'bench-whip' as const, 'lab-wire' as const),
  // 17:30 to 22:10 on three dates; the second is silent for `tern`.
  deviceAt: fc
    .tuple(fc.nat(2), fc.integer({ min: 35, max: 44 }), fc.constantFrom(0, 1, 2, 3, 9, 10))
    .map(
      ([day, halfHour, minute]) => FIRST_DAY + day * DAY_MS + halfHour * 30 * MINUTE_MS + minute * MINUTE_MS,
    ),
  durationS: fc.constantFrom(null, 5, 10, 60),
  deleted: fc.constantFrom(false, false, false, true),
  deviceId: fc.constantFrom('pebble01', 'moss0002'),
  ownerId: fc.constantFrom('asta', 'birk'),
  o: fc.constantFrom(1 as const, 3 as const, 5 as const, 'X' as const),
});
const aClockCheck = fc.record({
  deleted: fc.constantFrom(false, false, true),
  importId: fc.constant(null),
  deviceId: fc.constantFrom('pebble01', 'moss0002'),
  deviceAt: fc.integer({ min: 0, max: 72 }).map((hours) => FIRST_DAY + hours * HOUR_MS),
  offsetMs: fc.constantFrom(0, 3 * MINUTE_MS, -3 * MINUTE_MS, -HOUR_MS),
  uncertaintyMs: fc.nat(3),
  method: fc.constant('tone' as const),
  pathKm: fc.constant(null),
});

const aHistory = fc.record({
  tries: fc.uniqueArray(aTry, { maxLength: 40, selector: ({ id }) => id }),
  clockChecks: fc.array(aClockCheck, { maxLength: 4 }),
  excludedAt: fc.array(fc.nat(39), { maxLength: 3 }),
});
const rowsOf = (observations: readonly Observation[]) =>
  observations.map(({ receptionId, heard, o, hourUtc, dayNumber }) => [
    receptionId,
    heard,
    o,
    hourUtc,
    dayNumber,
  ]);

describe('any history', () => {
  it('should give the observations of a plain recount', () => {
    fc.assert(
      fc.property(aHistory, (history) => {
        const counted = observationsOf(inputOf(history));
        for (const stream of ['channels', 'targets'] as const) {
          const ids = counted[stream].map(({ receptionId }) => receptionId);
          expect(ids.sort()).toEqual([...recount(history, stream).values()].sort());
        }
      }),
      { numRuns: 400 },
    );
  });

  it('should count the same in whatever order it arrived', () => {
    fc.assert(
      fc.property(aHistory, fc.infiniteStream(fc.nat()), (history, picks) => {
        const input = inputOf(history);
        const shuffled = [...input.receptions];
        for (let i = shuffled.length - 1; i > 0; i--) {
          const j = picks.next().value! % (i + 1);
          [shuffled[i], shuffled[j]] = [shuffled[j]!, shuffled[i]!];
        }
        const clockChecks = [...input.clockChecks].reverse();
        const again = { ...input, receptions: shuffled, clockChecks };
        expect(observationsOf(again).channels).toEqual(observationsOf(input).channels);
        expect(observationsOf(again).targets).toEqual(observationsOf(input).targets);
        expect(squareEvidence(again, {})).toEqual(squareEvidence(input, {}));
      }),
    );
  });

  it('should keep its rates when a chance find, a swap, an import or a skip is added', () => {
    fc.assert(
      fc.property(
        aHistory,
        aTry,
        fc.constantFrom({ basis: 'chance' }, { basis: 'swap' }, { basis: 'import' }, { outcome: 'skipped' }),
        (history, one, kind) => {
          const found = { ...one, ...kind, id: 'found' } as Try;
          const before = observationsOf(inputOf(history));
          const after = observationsOf(inputOf({ ...history, tries: [...history.tries, found] }));
          expect(rowsOf(after.channels)).toEqual(rowsOf(before.channels));
          expect(rowsOf(after.targets)).toEqual(rowsOf(before.targets));
        },
      ),
    );
  });

  it('should never get more observations from a second try in the same hour', () => {
    fc.assert(
      fc.property(aHistory, fc.nat(), fc.nat({ max: 5 }), (history, pick, minutes) => {
        const { channels } = observationsOf(inputOf({ ...history, clockChecks: [] }));
        fc.pre(channels.length > 0);
        const first = channels[pick % channels.length]!;
        const origin = history.tries.find(({ id }) => id === first.receptionId)!;
        const hourEnd = (Math.floor(first.atMs / HOUR_MS) + 1) * HOUR_MS - 1;
        const deviceAt = Math.min(hourEnd, origin.deviceAt + minutes * MINUTE_MS);
        const again = { ...origin, id: `${origin.id} again`, deviceAt, outcome: 'nil' as const };
        const tries = [...history.tries, again];
        const after = observationsOf(inputOf({ ...history, tries, clockChecks: [] }));
        expect(rowsOf(after.channels)).toEqual(rowsOf(channels));
      }),
    );
  });

  it('should give rates within 0..1 that their intervals hold', () => {
    fc.assert(
      fc.property(aHistory, fc.constantFrom('tern', 'plover', undefined), (history, targetId) => {
        const input = inputOf(history);
        const filter = targetId === undefined ? {} : { targetId };
        const observations = filterObservations(observationsOf(input), filter, input.sites);
        for (const figure of [heardRate(observations), rateFor(observations, filter)]) {
          if (figure.rate === null) continue;
          expect(figure.rate).toBeGreaterThanOrEqual(0);
          expect(figure.rate).toBeLessThanOrEqual(1);
          expect(figure.interval.low).toBeLessThanOrEqual(figure.rate);
          expect(figure.interval.high).toBeGreaterThanOrEqual(figure.rate);
          expect(figure.dates).toBeLessThanOrEqual(figure.n);
        }
      }),
    );
  });

  it('should account for every reception: behind the figure or left out with a reason', () => {
    fc.assert(
      fc.property(aHistory, fc.constantFrom('tern', undefined), (history, targetId) => {
        const input = inputOf(history);
        const evidence = squareEvidence(input, targetId === undefined ? {} : { targetId });
        const ids = [
          ...evidence.observations.map(({ receptionId }) => receptionId),
          ...evidence.leftOut.flatMap(({ receptionIds }) => receptionIds),
        ];
        const asked = history.tries.filter(({ target }) => targetId === undefined || target === targetId);
        expect(ids.sort()).toEqual(asked.map(({ id }) => id).sort());
      }),
    );
  });
});
