import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { paths } from '../../../platform/paths';
import { WHOLE_LOG, type LogFilter } from '../index/log-filter';
import { filterQuery, readFilter, readOpenId } from './filter-query';

const text = fc.option(fc.string({ minLength: 1, maxLength: 40 }));
const date = fc.option(
  fc
    .date({ min: new Date('1990-01-01'), max: new Date('2099-12-31'), noInvalidDate: true })
    .map((day) => day.toISOString().slice(0, 10)),
);
const anyFilter: fc.Arbitrary<LogFilter> = fc.record({
  search: fc.string({ maxLength: 40 }),
  band: text,
  outcome: fc.option(fc.constantFrom('heard', 'nil', 'skipped')),
  station: text,
  antennaId: text,
  siteId: text,
  operatorId: text,
  fromDate: date,
  toDate: date,
  state: fc.option(fc.constantFrom('only-here', 'sent', 'needs-attention')),
  bin: fc.boolean(),
});

describe('the filter in the address', () => {
  it('should always read back as it was written', () => {
    fc.assert(
      fc.property(anyFilter, (filter) => {
        const search = paths.logbook(filterQuery(filter)).split('?')[1] ?? '';
        expect(readFilter(search)).toEqual(filter);
      }),
    );
  });

  it('should leave out what narrows nothing', () => {
    expect(paths.logbook(filterQuery(WHOLE_LOG))).toBe('/logbook');
  });

  it('should pass over what it does not understand', () => {
    expect(readFilter('?outcome=maybe&state=verified&from=2026-02-31&to=soon&bin=yes&colour=red')).toEqual(
      WHOLE_LOG,
    );
  });

  it('should keep the reception that stands open beside the list', () => {
    expect(readOpenId('?q=lind&open=abc')).toBe('abc');
    expect(readOpenId('?open=')).toBeNull();
  });
});
