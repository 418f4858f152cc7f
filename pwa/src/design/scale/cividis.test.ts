import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { channelsOf, contrastRatio } from '../theme/contrast';
import { cividis, redRamp, textOnRamp } from './cividis';

// whole thousandths: fast-check's doubles crowd around zero
const share = fc.integer({ min: 0, max: 1000 }).map((thousandths) => thousandths / 1000);

describe('the colour ramps', () => {
  test('should start dark blue and end bright yellow', () => {
    // the ends of d3-scale-chromatic's interpolateCividis, from memory
    expect([cividis(0), cividis(1)]).toEqual(['rgb(0, 32, 81)', 'rgb(253, 234, 69)']);
  });

  test('should always grow brighter with the share, so that grey alone tells it', () => {
    fc.assert(
      fc.property(share, share, (a, b) => {
        fc.pre(Math.abs(a - b) > 0.02);
        const [low, high] = a < b ? [a, b] : [b, a];
        const white = '#FFFFFF';
        expect(contrastRatio(cividis(low), white)).toBeGreaterThan(contrastRatio(cividis(high), white));
        expect(contrastRatio(redRamp(low), white)).toBeGreaterThan(contrastRatio(redRamp(high), white));
      }),
    );
  });

  test('should never leave the red channel in red night', () => {
    fc.assert(
      fc.property(share, (value) => {
        for (const colour of [redRamp(value), textOnRamp(value, 'red-night')]) {
          const [, green, blue] = channelsOf(colour);
          expect(Math.max(green, blue)).toBeLessThanOrEqual(8);
        }
      }),
    );
  });

  test('should always carry a text that can be read', () => {
    fc.assert(
      fc.property(share, (value) => {
        expect(contrastRatio(cividis(value), textOnRamp(value, 'day'))).toBeGreaterThanOrEqual(4);
        expect(contrastRatio(redRamp(value), textOnRamp(value, 'red-night'))).toBeGreaterThanOrEqual(2);
      }),
    );
  });
});
