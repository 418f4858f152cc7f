import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatRst, parseRst, rstMeaning } from './rst.js';

const rst = fc.oneof(
  fc.record({ r: fc.integer({ min: 1, max: 5 }), s: fc.integer({ min: 1, max: 9 }) }),
  fc.record({
    r: fc.integer({ min: 1, max: 5 }),
    s: fc.integer({ min: 1, max: 9 }),
    t: fc.integer({ min: 1, max: 9 }),
  }),
);

// Grades and their limits: ARRL Handbook 1992 as quoted by a club page, and four similar lists.
describe('an RST report', () => {
  it.each(['59', '599', '339', 'RST 599', 'rs 59'])('should read %j', (text) => {
    const report = parseRst(text);
    expect(report && formatRst(report)).toBe(text.replace(/\D/g, ''));
  });

  it.each(['', '5', '69', '50', '095', '5990', '599C', '5 9 9', '5nn'])('should not read %j', (text) => {
    expect(parseRst(text)).toBeUndefined();
  });

  it('should always read back what it writes, without a tone for voice', () => {
    fc.assert(
      fc.property(rst, (report) => {
        expect(parseRst(formatRst(report))).toEqual(report);
      }),
    );
  });
});

describe('the meaning of an RST grade', () => {
  it('should speak the words of the published list', () => {
    expect(rstMeaning('r', 5)).toBe('perfectly readable');
    expect(rstMeaning('s', 1)).toBe('faint, barely perceptible');
    expect(rstMeaning('s', 9)).toBe('extremely strong');
    expect(rstMeaning('t', 9)).toBe('perfect note');
  });

  it('should be null for a grade that the letter does not have', () => {
    expect(rstMeaning('r', 6)).toBeNull();
    expect(rstMeaning('s', 0)).toBeNull();
    expect(rstMeaning('t', 10)).toBeNull();
  });
});
