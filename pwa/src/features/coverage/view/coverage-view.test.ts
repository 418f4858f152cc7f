import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { paths } from '../../../platform/paths';
import { ANTENNA_KIND_WORDS, type AntennaKindName } from './antenna-kinds';
import { readView, viewQuery, widened, WIDEST_VIEW, type CoverageView } from './coverage-view';
import { ALL_HOURS } from './hour-range';

const id = fc.uuid();
const key = fc.oneof(fc.integer({ min: 1000, max: 30_000_000 }).map(String), fc.constant('40 m'));
const kinds = Object.keys(ANTENNA_KIND_WORDS) as AntennaKindName[];
const monthKey = fc
  .tuple(fc.integer({ min: 1990, max: 2099 }), fc.integer({ min: 1, max: 12 }))
  .map(([year, month]) => `${year}-${String(month).padStart(2, '0')}`);
const hours = fc.oneof(
  fc.constant(ALL_HOURS),
  fc.record({ fromUtc: fc.integer({ min: 0, max: 23 }), lengthH: fc.integer({ min: 1, max: 23 }) }),
);
const anyView: fc.Arbitrary<CoverageView> = fc.record({
  subject: fc.oneof(
    fc.constant({ kind: 'most-tried' as const }),
    fc.constant({ kind: 'any' as const }),
    fc.record({ kind: fc.constantFrom('channel' as const, 'band' as const), key }),
  ),
  measure: fc.constantFrom('rate' as const, 'score' as const, 'count' as const),
  hours,
  monthKeys: fc.uniqueArray(monthKey, { maxLength: 6 }).map((keys) => keys.sort()),
  antenna: fc.oneof(
    fc.constant({ kind: 'any' as const }),
    fc.record({ kind: fc.constant('kind' as const), antennaKind: fc.constantFrom(...kinds) }),
    fc.record({ kind: fc.constant('one' as const), antennaId: id }),
  ),
  setupId: fc.option(id),
  operatorId: fc.option(id),
  square: fc.option(fc.constantFrom('JO', 'JO46', 'JO46ac')),
});
const searchOf = (view: CoverageView) => paths.coverage(viewQuery(view)).split('?')[1] ?? '';

describe('the view in the address', () => {
  it('should always come back as it was, over a reload or a link', () => {
    fc.assert(
      fc.property(anyView, (view) => {
        expect(readView(searchOf(view))).toEqual(view);
      }),
    );
  });

  it('should leave an address without a query where nothing narrows', () => {
    expect(searchOf(WIDEST_VIEW)).toBe('');
  });

  it('should never fail on an address that somebody typed', () => {
    fc.assert(
      fc.property(fc.string(), (search) => {
        const view = readView(search);
        expect(readView(searchOf(view))).toEqual(view);
      }),
    );
  });

  it('should pass over what it does not understand', () => {
    expect(readView('shows=noise&hours=31&months=2026-13,x&antenna-kind=toString&square=ZZ99')).toEqual(
      WIDEST_VIEW,
    );
  });

  it('should keep frequency and measure when it is widened', () => {
    const view = readView('channel=6070000&shows=score&hours=3&months=2026-11&antenna=a&operator=b');
    expect(searchOf(widened(view))).toBe('channel=6070000&shows=score');
  });
});
