import fc from 'fast-check';
import { expect, test } from 'vitest';
import { meanFix, type PositionFix } from './position';

function fix(latitudeDeg: number, longitudeDeg: number, accuracyM: number): PositionFix {
  return { latitudeDeg, longitudeDeg, accuracyM, altitudeM: null, atMs: 0 };
}

test('should have no mean of no readings', () => {
  expect(meanFix([])).toBeNull();
});

test('should weigh a reading by the inverse square of its accuracy', () => {
  // weights 1/10² and 1/20²: the mean lies a fifth of the way to the worse one
  const mean = meanFix([fix(56, 8, 10), fix(57, 8, 20)]);
  expect(mean?.latitudeDeg).toBeCloseTo(56.2, 9);
  expect(mean?.accuracyM).toBe(10);
});

test('should stay beside the 180th meridian', () => {
  const mean = meanFix([fix(0, 179.9, 5), fix(0, -179.9, 5)]);
  expect(Math.abs(mean?.longitudeDeg ?? 0)).toBeCloseTo(180, 9);
});

test('should always lie among its readings', () => {
  const reading = fc.record({
    latitudeDeg: fc.double({ min: 56, max: 56.01, noNaN: true }),
    longitudeDeg: fc.double({ min: 8, max: 8.01, noNaN: true }),
    accuracyM: fc.integer({ min: 1, max: 500 }),
    altitudeM: fc.constant(null),
    atMs: fc.nat(),
  });
  fc.assert(
    fc.property(fc.array(reading, { minLength: 1 }), (fixes) => {
      const mean = meanFix(fixes);
      const latitudes = fixes.map((one) => one.latitudeDeg);
      expect(mean?.latitudeDeg).toBeGreaterThanOrEqual(Math.min(...latitudes) - 1e-9);
      expect(mean?.latitudeDeg).toBeLessThanOrEqual(Math.max(...latitudes) + 1e-9);
    }),
  );
});
