import { BAND_TABLE, type BandRow, type BandService } from './band-table.js';
import type { ItuRegion } from './region.js';

/** A band with its service; the lower edge belongs to it, the upper to the next. */
export type Band = { name: string; service: BandService; lowHz: number; highHz: number };

type RegionalBand = Band & { regions: readonly ItuRegion[] };

const BANDS: readonly RegionalBand[] = BAND_TABLE.map((row: BandRow) => ({
  name: row.name,
  service: row.service,
  lowHz: Math.round(row.lowKhz * 1000),
  highHz: Math.round(row.highKhz * 1000),
  regions: row.regions,
}));

/**
 * The band that holds a frequency in a region, or null. Null is no fault: stations also work outside the
 * bands, and such a reception is as good as any.
 */
export function bandAt(frequencyHz: number, region: ItuRegion): Band | null {
  const found = BANDS.find(
    (band) => band.regions.includes(region) && band.lowHz <= frequencyHz && frequencyHz < band.highHz,
  );
  return found ? plain(found) : null;
}

/** "49 m broadcast". */
export function bandLabel(band: Pick<Band, 'name' | 'service'>): string {
  return `${band.name} ${band.service}`;
}

/**
 * The bands called by so many metres in a region, lowest first; none is an empty list. "60 m" and "15 m" are both
 * a broadcast and an amateur band, and the 60 m broadcast band has two parts.
 */
export function metreBands(metres: number, region: ItuRegion): Band[] {
  return BANDS.filter((band) => band.name === `${metres} m` && band.regions.includes(region))
    .map(plain)
    .sort((a, b) => a.lowHz - b.lowHz);
}

/** All bands of a region, lowest first, for lists and filters. */
export function bandsOf(region: ItuRegion): Band[] {
  return BANDS.filter((band) => band.regions.includes(region))
    .map(plain)
    .sort((a, b) => a.lowHz - b.lowHz);
}

function plain({ name, service, lowHz, highHz }: RegionalBand): Band {
  return { name, service, lowHz, highHz };
}
