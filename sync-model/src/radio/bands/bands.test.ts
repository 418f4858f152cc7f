import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BAND_TABLE_EDITION } from './band-table.js';
import { bandAt, bandLabel, bandsOf, metreBands } from './bands.js';
import type { ItuRegion } from './region.js';

const REGIONS: ItuRegion[] = [1, 2, 3];
const labelAt = (kHz: number, region: ItuRegion) => {
  const band = bandAt(kHz * 1000, region);
  return band && bandLabel(band);
};

describe('the band of a frequency', () => {
  it('should name the edition that the table follows', () => {
    expect(BAND_TABLE_EDITION).toContain('Radio Regulations Article 5');
  });

  // A Region 1 national table after Article 5 of the Radio Regulations (2026).
  it.each([
    [5900, '49 m broadcast'],
    [6070, '49 m broadcast'],
    [6199.9, '49 m broadcast'],
    [6200, '6 MHz maritime'],
    [9500, '31 m broadcast'],
    [12_095, '25 m broadcast'],
    [13_800, '22 m broadcast'],
    [15_100, '19 m broadcast'],
    [18_950, '15 m broadcast'],
    [26_099, '11 m broadcast'],
    [5000, '5 MHz standard frequency'],
    [10_000, '10 MHz standard frequency'],
    [14_350, null],
    [10_051, '10 MHz aeronautical'],
    [11_253, '11.3 MHz aeronautical'],
    [8414.5, '8 MHz maritime'],
    [2182, '2 MHz maritime'],
    [156_800, 'VHF maritime'],
    [121_500, 'VHF aeronautical'],
    [101_500, 'VHF FM broadcast'],
    [1017, 'MW broadcast'],
    [198, 'LW broadcast'],
    [4000, null],
  ])('should be right for %f kHz in Region 1: %s', (kHz, label) => {
    expect(labelAt(kHz, 1)).toBe(label);
  });

  it.each([
    // 40 m: the national table and a spectrum wiki quoting RR 5.142.
    [7250, ['41 m broadcast', '40 m amateur', '41 m broadcast']],
    [7150, ['40 m amateur', '40 m amateur', '40 m amateur']],
    [7420, ['41 m broadcast', null, '41 m broadcast']],
    // 80 m and 75 m: wiki of IARU Region 1 quoting the Regulations (WRC-15).
    [3850, [null, '80 m amateur', '80 m amateur']],
    [3925, [null, '80 m amateur', '75 m broadcast']],
    [3975, ['75 m broadcast', '80 m amateur', '75 m broadcast']],
    // LW and MW: GE75; a US table for Region 2. LW edges from memory.
    [162, ['LW broadcast', null, null]],
    [1620, [null, 'MW broadcast', null]],
    [530, ['MW broadcast', null, 'MW broadcast']],
    // 2 495 to 2 498 kHz, 2 m and the FM band outside Region 1: from memory.
    [2496, ['120 m broadcast', '2.5 MHz standard frequency', '2.5 MHz standard frequency']],
    [147_000, [null, '2 m amateur', '2 m amateur']],
    [87_700, ['VHF FM broadcast', null, 'VHF FM broadcast']],
  ])('should honour the region at %f kHz', (kHz, labels) => {
    expect(REGIONS.map((region) => labelAt(kHz, region))).toEqual(labels);
  });

  it('should never be two bands at once in a region', () => {
    for (const region of REGIONS) {
      const bands = bandsOf(region);
      bands.slice(1).forEach((band, index) => {
        expect(band.lowHz, `${bandLabel(band)} in Region ${region}`).toBeGreaterThanOrEqual(
          bands[index]!.highHz,
        );
      });
    }
  });

  it('should always hold the frequency that was asked for', () => {
    const frequency = fc.oneof(
      fc.integer({ min: 1000, max: 30_000_000 }),
      fc.integer({ min: 1000, max: 3_000_000_000 }),
    );
    fc.assert(
      fc.property(frequency, fc.constantFrom(...REGIONS), (frequencyHz, region) => {
        const band = bandAt(frequencyHz, region);
        fc.pre(band !== null);
        expect(band!.lowHz).toBeLessThanOrEqual(frequencyHz);
        expect(frequencyHz).toBeLessThan(band!.highHz);
      }),
    );
  });

  it('should have a name near its wavelength where it is named in metres', () => {
    // λ = 299 792.458 / f(kHz); the names are custom, so 12 % is allowed ("75 m" is really 75 to 77 m, "22 m" 21.6 to 22.1 m).
    for (const region of REGIONS) {
      for (const { name, lowHz, highHz } of bandsOf(region)) {
        const metres = Number(/^(\d+) m$/.exec(name)?.[1] ?? Number.NaN);
        if (Number.isNaN(metres)) continue;
        const middleM = 299_792_458 / ((lowHz + highHz) / 2);
        expect(Math.abs(metres / middleM - 1), name).toBeLessThan(0.12);
      }
    }
  });
});

describe('a band called by its metres', () => {
  it('should be found with its edges', () => {
    expect(metreBands(49, 1)).toEqual([
      { name: '49 m', service: 'broadcast', lowHz: 5_900_000, highHz: 6_200_000 },
    ]);
  });

  it('should be all of that name', () => {
    expect(metreBands(60, 2).map(bandLabel)).toEqual(['60 m broadcast', '60 m broadcast', '60 m amateur']);
    expect(metreBands(15, 1).map(bandLabel)).toEqual(['15 m broadcast', '15 m amateur']);
  });

  it('should honour the region, and be none where there is no such band', () => {
    expect(metreBands(75, 2)).toEqual([]);
    expect(metreBands(75, 3)).toHaveLength(1);
    expect(metreBands(77, 1)).toEqual([]);
  });
});
