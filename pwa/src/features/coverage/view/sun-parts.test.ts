import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { lightAtHour, sunParts } from './sun-parts';

describe('day and night along the hours', () => {
  it('should have day at noon and night at midnight on the coast in winter', () => {
    const parts = sunParts({ latDeg: 56, lonDeg: 8.2 }, Date.UTC(2026, 11, 31));
    expect(lightAtHour(parts, 12)).toBe('day');
    expect(lightAtHour(parts, 0.1)).toBe('night');
    // Greenwich has sunset at about 16:00 on the last of December (common knowledge, from memory)
    expect(lightAtHour(parts, 16)).toBe('twilight');
  });

  it('should always cover the 24 hours without a gap', () => {
    const position = fc.record({
      latDeg: fc.double({ min: -90, max: 90, noNaN: true }),
      lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
    });
    fc.assert(
      fc.property(position, fc.integer({ min: 7305, max: 40_000 }), (place, day) => {
        const parts = sunParts(place, day * 86_400_000);
        expect(parts[0]?.fromHour).toBe(0);
        expect(parts.at(-1)?.toHour).toBeCloseTo(24);
        parts.slice(1).forEach(({ fromHour, light }, index) => {
          expect(fromHour).toBeCloseTo(parts[index]!.toHour);
          expect(light).not.toBe(parts[index]!.light);
        });
      }),
      { numRuns: 30 },
    );
  });
});
