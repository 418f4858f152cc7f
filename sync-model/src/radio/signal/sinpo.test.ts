import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Sinpo } from '../../records/reception.js';
import { formatSinpo, parseSinpo, SINPO_LETTERS, SINPO_MEANINGS, sinpoHint } from './sinpo.js';

const grade = fc.constantFrom<Sinpo['s']>(1, 2, 3, 4, 5, 'X');
const anySinpo = fc.record({ s: grade, i: grade, n: grade, p: grade, o: grade });
const read = (text: string): Sinpo => {
  const sinpo = parseSinpo(text);
  if (!sinpo) throw new Error(`${text} should be readable`);
  return sinpo;
};

describe('a SINPO report', () => {
  it('should be written as five figures in their fixed order', () => {
    expect(formatSinpo({ s: 4, i: 4, n: 3, p: 3, o: 'X' })).toBe('4433X');
  });

  // Rules of Rec. ITU-R SM.1135 as reproduced by a Hungarian radio page on the code ("Vételi értékelés"):
  // the code word, then five digits 1 to 5 in fixed order, X where not rated.
  it.each(['45433', '34X32', 'SINPO 25432', '34x32', 'sinpo 25432', ' 45433 '])('should read %j', (text) => {
    expect(formatSinpo(read(text))).toBe(text.trim().slice(-5).toUpperCase());
  });

  // Same rules: no grade 0 or above 5, not 4, 6 or 7 figures. Eight are a SINPFEMO report, which has no place here.
  it.each(['', '4543', '45603', '0xxxx', '454331', '4543312', '45433354', '454-3', 'SINPO', '٤٥٤٣٣'])(
    'should not read %j',
    (text) => {
      expect(parseSinpo(text)).toBeUndefined();
    },
  );

  it('should always read back what it writes', () => {
    fc.assert(
      fc.property(anySinpo, (sinpo) => {
        expect(parseSinpo(formatSinpo(sinpo))).toEqual(sinpo);
      }),
    );
  });

  it('should never make a report of text with another count of figures', () => {
    fc.assert(
      fc.property(fc.stringMatching(/^[0-9Xx]{0,10}$/), (text) => {
        fc.pre(!/^[1-5Xx]{5}$/.test(text));
        expect(parseSinpo(text)).toBeUndefined();
      }),
    );
  });
});

describe('the meaning of a SINPO grade', () => {
  // The words of the table in Rec. ITU-R SM.1135 (seen in the same Hungarian page); "none" reads "no …" here.
  const scale = { strength: ['barely', 'poor', 'fair', 'good', 'excellent'] };
  const harm = ['extreme', 'severe', 'moderate', 'slight', 'no'];
  const usability = ['unusable', 'poor', 'fair', 'good', 'excellent'];
  const wordsOf = { s: scale.strength, i: harm, n: harm, p: harm, o: usability };

  it.each(SINPO_LETTERS)('should follow the words of the Recommendation for %s', (letter) => {
    for (const figure of [1, 2, 3, 4, 5] as const) {
      expect(SINPO_MEANINGS[letter][figure].split(' ')[0]).toBe(wordsOf[letter][figure - 1]);
    }
    expect(SINPO_MEANINGS[letter].X).toBe('not judged');
  });
});

describe('the hint about the overall score', () => {
  // Practice as told by an encyclopedia article on SINPO: an overall score above all others is a common mistake.
  it.each([
    ['34445', 'strength 3'],
    ['52555', 'interference 2'],
    ['51XX4', 'interference 1'],
    ['X5515', 'propagation 1'],
  ])('should point at the figure that %s stands above', (text, words) => {
    expect(sinpoHint(read(text))).toContain(words);
  });

  it.each(['55555', '11111', '43333', '45433', '53434', '4433X', 'XXXX5', 'XXXXX'])(
    'should be silent at %s',
    (text) => {
      expect(sinpoHint(read(text))).toBeNull();
    },
  );

  it('should never speak where overall is not above the worst figure', () => {
    fc.assert(
      fc.property(anySinpo, (sinpo) => {
        const judged = [sinpo.s, sinpo.i, sinpo.n, sinpo.p].filter((figure) => figure !== 'X');
        fc.pre(sinpo.o !== 'X' && judged.every((figure) => Number(sinpo.o) <= figure));
        expect(sinpoHint(sinpo)).toBeNull();
      }),
    );
  });
});
