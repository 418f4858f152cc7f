import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Position } from '../position.js';
import { midpointOf, pathBetween, pointsAlong } from './path.js';

const at = (latDeg: number, lonDeg: number) => ({ latDeg, lonDeg });
const anyPosition = fc.record({
  latDeg: fc.double({ min: -90, max: 90, noNaN: true }),
  lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
});
const dms = (sign: number, degrees: number, minutes: number, seconds: number) =>
  sign * (degrees + minutes / 60 + seconds / 3600);

/** The haversine formula on the sphere of 6 371.009 km. */
function sphereKm(from: Position, to: Position): number {
  const rad = Math.PI / 180;
  const half = (degrees: number) => Math.sin((degrees * rad) / 2) ** 2;
  const cosines = Math.cos(from.latDeg * rad) * Math.cos(to.latDeg * rad);
  const h = half(to.latDeg - from.latDeg) + cosines * half(to.lonDeg - from.lonDeg);
  return 2 * 6371.009 * Math.asin(Math.sqrt(Math.min(1, h)));
}

describe('a path on WGS84', () => {
  // C. F. F. Karney's published test lines, as in his geodtest.c and the GeographicLib test suites.
  it.each([
    [35.60777, -139.44815, -11.17491, -69.95921, 111.09874842956, 129.28927088971, 8935244.56048183],
    [55.52454, 106.05087, 77.03196, 197.18234, 22.0200598809828, 109.11204111067, 4105086.17139244],
    [-41.22777, 122.32875, -7.57291, 130.37946, 14.28511340227574, 10.80530308518737, 3812686.035106021],
  ])('should be Karney\u2019s line from %f, %f to %f, %f', (lat1, lon1, lat2, lon2, azi1, azi2, metres) => {
    const path = pathBetween(at(lat1, lon1), at(lat2, lon2));
    expect(Math.abs(path.distanceKm * 1000 - metres)).toBeLessThan(0.001);
    expect(Math.abs(path.bearingDeg - azi1)).toBeLessThan(1e-9);
    expect(Math.abs(path.backBearingDeg - (azi2 + 180))).toBeLessThan(1e-9);
  });

  it('should be the line of GeographicLib\u2019s test GeodSolve0', () => {
    // The same in its C, Fortran, Java and Rust suites: tolerance 0.5 m and 0.5e-5 degrees.
    const path = pathBetween(at(40.6, -73.8), at(49.01666667, 2.55));
    expect(Math.abs(path.distanceKm * 1000 - 5853226)).toBeLessThan(0.5);
    expect(Math.abs(path.bearingDeg - 53.47022)).toBeLessThan(0.5e-5);
    expect(Math.abs(path.backBearingDeg - 291.59367)).toBeLessThan(0.5e-5);
  });

  it('should be Vincenty\u2019s line from Flinders Peak to Buninyong', () => {
    // Printed by tests of Vincenty's method, original in the GDA technical manual (GRS80): 54 972.271 m,
    // 306° 52′ 05.37″ out and 127° 10′ 25.07″ back.
    const flinders = at(dms(-1, 37, 57, 3.7203), dms(1, 144, 25, 29.5244));
    const buninyong = at(dms(-1, 37, 39, 10.1561), dms(1, 143, 55, 35.3839));
    const path = pathBetween(flinders, buninyong);
    expect(path.distanceKm * 1000).toBeCloseTo(54972.271, 3);
    expect(Math.abs(path.bearingDeg - dms(1, 306, 52, 5.37))).toBeLessThan(0.005 / 3600);
    expect(Math.abs(path.backBearingDeg - dms(1, 127, 10, 25.07))).toBeLessThan(0.005 / 3600);
  });

  it('should be known by formula along the equator and the meridian', () => {
    // a·π/180 exactly; the quarter meridians reproduced by separate calculation.
    const equator = pathBetween(at(0, 0), at(0, 1));
    expect(equator.distanceKm).toBeCloseTo((6378.137 * Math.PI) / 180, 9);
    expect([equator.bearingDeg, equator.backBearingDeg]).toEqual([90, 270]);
    expect(pathBetween(at(0, 0), at(1, 0)).distanceKm).toBeCloseTo(110.574389, 6);
    expect(pathBetween(at(-90, 0), at(90, 0)).distanceKm).toBeCloseTo(20003.931459, 5);
  });

  it('should converge where the points are nearly antipodal', () => {
    // A geodesy library's test named "vincenty antipodal"; the bearings reproduced by separate calculation.
    const path = pathBetween(at(0, 0), at(0.5, 179.5));
    expect(path.distanceKm).toBeCloseTo(19936.288579, 5);
    expect(path.bearingDeg).toBeCloseTo(25.67187, 5);
    expect(path.backBearingDeg).toBeCloseTo(154.32709 + 180, 5);
  });

  it('should differ from the sphere of radio planning by the ellipsoid alone', () => {
    // Report of the ITU-R Study Group 3 reference software (sphere of 6 371.009 km): Luxembourg 174.728941 km,
    // Kranji to Beijing 4 477.003 km with bearings 15.150755 and 199.927243 that belong to 39.95, 116.45.
    const luxembourg = [at(49.6666666667, 6.31666666667), at(51.1166666667, 7.26666666667)] as const;
    const beijing = [at(1.42, 103.73), at(40, 116.4)] as const;
    expect(sphereKm(...luxembourg)).toBeCloseTo(174.728941, 5);
    expect(sphereKm(...beijing)).toBeCloseTo(4477.003, 2);
    expect(pathBetween(...luxembourg).distanceKm).toBeCloseTo(174.86536, 4);
    const antennas = pathBetween(at(1.42, 103.73), at(39.95, 116.45));
    expect(Math.abs(antennas.bearingDeg - 15.150755)).toBeLessThan(0.2);
    expect(Math.abs(antennas.backBearingDeg - 199.927243)).toBeLessThan(0.2);
  });

  it('should always lie within the span of the radii of WGS84 around the sphere', () => {
    // The radii of curvature run from a(1−e²) = 6 335.439 km to a/√(1−e²) = 6 399.594 km: a theorem, no source.
    fc.assert(
      fc.property(anyPosition, anyPosition, (from, to) => {
        const ellipsoidKm = pathBetween(from, to).distanceKm;
        expect(ellipsoidKm).toBeGreaterThanOrEqual((sphereKm(from, to) * 6335.439) / 6371.009 - 1e-3);
        expect(ellipsoidKm).toBeLessThanOrEqual((sphereKm(from, to) * 6399.594) / 6371.009 + 1e-3);
      }),
    );
  });

  it('should go the other way round for the long path', () => {
    const path = pathBetween(at(40.6, -73.8), at(49.01666667, 2.55));
    expect(path.longDistanceKm).toBeCloseTo(40007.863 - 5853.226, 3);
    expect(path.longBearingDeg).toBeCloseTo(233.47022, 5);
  });

  it('should have no length between a point and itself', () => {
    const path = pathBetween(at(55.5, 8.2), at(55.5, 8.2));
    expect(path.distanceKm).toBe(0);
    expect(Number.isFinite(path.bearingDeg)).toBe(true);
  });

  it('should always be equally long both ways, with the bearings exchanged', () => {
    fc.assert(
      fc.property(anyPosition, anyPosition, (from, to) => {
        const out = pathBetween(from, to);
        const back = pathBetween(to, from);
        expect(back.distanceKm).toBeCloseTo(out.distanceKm, 6);
        for (const bearing of [out.bearingDeg, out.backBearingDeg, out.longBearingDeg]) {
          expect(bearing).toBeGreaterThanOrEqual(0);
          expect(bearing).toBeLessThan(360);
        }
        // Between near-antipodes and at the poles there is more than one shortest way.
        fc.pre(
          out.distanceKm > 0.001 &&
            out.distanceKm < 19_900 &&
            Math.abs(from.latDeg) < 89 &&
            Math.abs(to.latDeg) < 89,
        );
        const turn = Math.abs(back.bearingDeg - out.backBearingDeg);
        expect(Math.min(turn, 360 - turn)).toBeLessThan(1e-4);
      }),
    );
  });
});

describe('the middle of a path', () => {
  it('should be the point that the solver\u2019s author gives for a known line', () => {
    // GeographicLib line 40.6, −73.8 to 49.01666667, 2.55, reproduced with the library.
    const middle = midpointOf(at(40.6, -73.8), at(49.01666667, 2.55));
    expect(middle.latDeg).toBeCloseTo(51.61824, 5);
    expect(middle.lonDeg).toBeCloseTo(-38.903776, 5);
  });

  it('should always be as far from one end as from the other', () => {
    fc.assert(
      fc.property(anyPosition, anyPosition, (from, to) => {
        const middle = midpointOf(from, to);
        const half = pathBetween(from, to).distanceKm / 2;
        expect(pathBetween(from, middle).distanceKm).toBeCloseTo(half, 6);
        expect(pathBetween(middle, to).distanceKm).toBeCloseTo(half, 6);
      }),
    );
  });
});

describe('points along a path', () => {
  it('should begin and end with its ends and keep equal legs', () => {
    const points = pointsAlong(at(40, 170), at(30, -170), 4);
    expect(points).toHaveLength(5);
    expect(points[0]?.lonDeg).toBeCloseTo(170, 9);
    expect(points[4]?.lonDeg).toBeCloseTo(-170, 9);
    const legs = points.slice(1).map((point, index) => pathBetween(points[index]!, point).distanceKm);
    for (const leg of legs) expect(leg).toBeCloseTo(legs[0]!, 6);
  });

  it('should refuse a path without a leg', () => {
    expect(() => pointsAlong(at(0, 0), at(1, 1), 0)).toThrow('at least one leg');
  });
});
