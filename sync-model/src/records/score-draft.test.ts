import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SINPO_LETTERS } from '../radio/signal/sinpo.js';
import { NO_OUTLINES, scoresToSave, touchedSinpo } from './score-draft.js';

const old = {
  sinpo: { s: 4, i: 4, n: 3, p: 3, o: 3 },
  rst: null,
  meter: { s: 7, overDb: 0 },
  noiseMeter: null,
} as const;

describe('the scores that a pad saves', () => {
  it('should be X where nothing was touched beside a touched figure', () => {
    expect(scoresToSave({ sinpo: { s: 4, i: 4, n: 3, p: 3 } }, NO_OUTLINES).sinpo).toEqual({
      s: 4,
      i: 4,
      n: 3,
      p: 3,
      o: 'X',
    });
  });

  it('should be none where no figure was touched, or all were taken back', () => {
    expect(scoresToSave({ sinpo: {} }, NO_OUTLINES)).toEqual({
      sinpo: null,
      rst: null,
      meter: null,
      noiseMeter: null,
      carried: null,
    });
    expect(touchedSinpo({ s: 'X', o: 'X' })).toBeNull();
  });

  it('should name what was carried over and not touched', () => {
    expect(scoresToSave({ sinpo: {} }, old)).toEqual({ ...old, carried: ['sinpo', 'meter'] });
    expect(scoresToSave({ sinpo: { s: 5 }, meter: null }, old)).toEqual({
      sinpo: { s: 5, i: 'X', n: 'X', p: 'X', o: 'X' },
      rst: null,
      meter: null,
      noiseMeter: null,
      carried: null,
    });
  });

  it('should never let an untouched figure of an old score count', () => {
    const grade = fc.constantFrom(1 as const, 2 as const, 3 as const, 4 as const, 5 as const);
    const figures = fc.record({ s: grade, i: grade, n: grade, p: grade, o: grade }, { requiredKeys: [] });
    fc.assert(
      fc.property(figures, (touched) => {
        const saved = scoresToSave({ sinpo: touched }, old);
        if (Object.keys(touched).length === 0) {
          expect(saved.carried).toContain('sinpo');
          return;
        }
        expect(saved.carried ?? []).not.toContain('sinpo');
        for (const letter of SINPO_LETTERS) expect(saved.sinpo?.[letter]).toBe(touched[letter] ?? 'X');
      }),
    );
  });
});
