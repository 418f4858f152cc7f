import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CanvasView } from './canvas-view';
import { landRing } from './land';
import { traceRing } from './paint-land';
import { worldSizePx } from './mercator';

type Pixel = { x: number; y: number };
const VIEW: CanvasView = {
  zoom: 6,
  worldPx: worldSizePx(6),
  originX: 8100,
  originY: 5000,
  widthPx: 400,
  heightPx: 300,
};

function isInside(outline: readonly Pixel[], { x, y }: Pixel): boolean {
  let inside = false;
  outline.forEach((a, index) => {
    const b = outline[(index + 1) % outline.length]!;
    if (a.y > y !== b.y > y && x < ((b.x - a.x) * (y - a.y)) / (b.y - a.y) + a.x) inside = !inside;
  });
  return inside;
}

describe('the outline of land, cut to what is in view', () => {
  it('should always fill the same points of the view as the whole outline', () => {
    // corners of a star around the view: near and far, so that runs of them lie beyond one side
    const star = fc.array(fc.double({ min: 20, max: 3000, noNaN: true }), { minLength: 5, maxLength: 60 });
    const seen = fc.record({
      x: fc.double({ min: 1, max: 399, noNaN: true }),
      y: fc.double({ min: 1, max: 299, noNaN: true }),
    });
    let dropped = 0;
    fc.assert(
      fc.property(star, fc.array(seen, { minLength: 20, maxLength: 20 }), (radii, points) => {
        const whole = radii.map((radius, index): Pixel => {
          const angle = (2 * Math.PI * index) / radii.length;
          return { x: 150 + radius * Math.cos(angle), y: 120 + radius * Math.sin(angle) };
        });
        const ring = landRing([]);
        const world = Float64Array.from(
          whole.flatMap(({ x, y }) => [(x + VIEW.originX) / VIEW.worldPx, (y + VIEW.originY) / VIEW.worldPx]),
        );
        const traced: Pixel[] = [];
        const pen = {
          moveTo: (x: number, y: number) => traced.push({ x, y }),
          lineTo: (x: number, y: number) => traced.push({ x, y }),
          closePath: () => undefined,
        };
        traceRing(pen, { ...ring, points: world }, VIEW, 0);
        dropped += whole.length - traced.length;
        for (const point of points) expect(isInside(traced, point)).toBe(isInside(whole, point));
      }),
      { numRuns: 400 },
    );
    expect(dropped).toBeGreaterThan(0);
  });
});
