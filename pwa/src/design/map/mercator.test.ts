// @vitest-environment jsdom
import fc from 'fast-check';
import { CRS, latLng } from 'leaflet';
import { describe, expect, it } from 'vitest';
import { worldSizePx, worldX, worldY } from './mercator';

describe('the map’s own measure', () => {
  it('should always be where the map library puts the same point', () => {
    const latDeg = fc.double({ min: -85, max: 85, noNaN: true });
    const lonDeg = fc.double({ min: -180, max: 180, noNaN: true });
    fc.assert(
      fc.property(latDeg, lonDeg, fc.integer({ min: 0, max: 12 }), (lat, lon, zoom) => {
        const theirs = CRS.EPSG3857.latLngToPoint(latLng(lat, lon), zoom);
        const px = worldSizePx(zoom);
        expect(worldX(lon) * px).toBeCloseTo(theirs.x, 4);
        expect(worldY(lat) * px).toBeCloseTo(theirs.y, 4);
      }),
    );
  });
});
