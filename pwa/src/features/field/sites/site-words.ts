import { squareOf } from '@harkmoor/sync-model/radio/locator/locator';
import { pathBetween } from '@harkmoor/sync-model/radio/path/path';
import type { Place, Site } from '@harkmoor/sync-model/records/site';
import type { SiteFix } from '@harkmoor/sync-model/records/site-fix';
import { agoWords } from '../../../platform/utc-text';

export const ENVIRONMENT_WORDS: Record<Site['environment'], string> = {
  city: 'City',
  residential: 'Residential',
  rural: 'Rural',
  'quiet-rural': 'Quiet rural',
};

const SOURCE_WORDS: Record<SiteFix['fix']['source'], string> = {
  live: 'one reading',
  averaged: 'mean of readings',
  map: 'set on the map',
  locator: 'typed locator',
};

/** What all others get of a place: 'JO46ac' or the point. */
export function placeText(place: Place): string {
  return 'locator' in place ? place.locator : `${place.latDeg.toFixed(5)}, ${place.lonDeg.toFixed(5)}`;
}

/** 'JO46ac, a square of about 5 by 5 km'. */
export function placeSizeText(place: Place): string {
  if (!('locator' in place)) return `${placeText(place)}, the exact point`;
  const { southDeg, westDeg, northDeg, eastDeg } = squareOf(place.locator);
  const high = pathBetween(
    { latDeg: southDeg, lonDeg: westDeg },
    { latDeg: northDeg, lonDeg: westDeg },
  ).distanceKm;
  const wide = pathBetween(
    { latDeg: southDeg, lonDeg: westDeg },
    { latDeg: southDeg, lonDeg: eastDeg },
  ).distanceKm;
  return `${place.locator}, a square of about ${figure(wide)} by ${figure(high)}\u202fkm`;
}

/** 'good to 8 m, one reading, 3 min ago'. */
export function fixText(fix: SiteFix['fix'], nowMs: number): string {
  const averaged = fix.averagedS === undefined ? '' : ` over ${Math.round(fix.averagedS)}\u202fs`;
  return `good to ${metres(fix.accuracyM)}, ${SOURCE_WORDS[fix.source]}${averaged}, ${agoWords(fix.fixedAt, nowMs)}`;
}

function metres(m: number): string {
  return m >= 2000 ? `${figure(m / 1000)}\u202fkm` : `${Math.round(m)}\u202fm`;
}

function figure(value: number): string {
  return value >= 10 ? String(Math.round(value)) : value.toFixed(1);
}
